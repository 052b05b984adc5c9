import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import type { FakeServer } from '../../server/services/fake-server'
import { fakeAccount, startFakeFileServer } from '../../server/services/files/fake-file-server'
import { createFileStore, type FileStore } from '../../server/services/files/file-store'
import { startFakeMailServer } from '../../server/services/mail/fake-mail-server'
import { listMessages, type ReceivedLetter } from '../../server/services/mail/mailroom'

function createFolder(): { readonly folder: string; readonly remove: () => void } {
  const folder = mkdtempSync(join(tmpdir(), 'stillfits-fakes-'))
  return { folder, remove: () => rmSync(folder, { recursive: true, force: true }) }
}

export interface TestFiles {
  readonly store: FileStore
  /** Where the objects lie on disk. */
  readonly folder: string
  readonly listKeys: () => Promise<string[]>
  /** As when the store is away. */
  readonly pause: () => Promise<void>
  readonly resume: () => Promise<void>
  readonly stop: () => Promise<void>
}

export async function startTestFiles(): Promise<TestFiles> {
  const { folder, remove } = createFolder()
  const first = await startFakeFileServer(folder, 'stillfits')
  let server: FakeServer | null = first
  const pause = async () => {
    await server?.stop()
    server = null
  }
  const endpoint = `http://127.0.0.1:${first.port}`
  const options = { endpoint, region: 'us-east-1', bucket: 'stillfits', ...fakeAccount }
  const store = createFileStore(options)
  return {
    store,
    folder,
    async listKeys() {
      const keys: string[] = []
      for await (const { key } of store.list()) keys.push(key)
      return keys.sort()
    },
    pause,
    async resume() {
      server ??= await startFakeFileServer(folder, 'stillfits', first.port)
    },
    async stop() {
      store.close()
      await pause()
      remove()
    },
  }
}

export interface TestMail {
  readonly url: string
  readonly folder: string
  /** Newest first. */
  readonly list: () => Promise<ReceivedLetter[]>
  /** As when the mail server is away. */
  readonly pause: () => Promise<void>
  readonly resume: () => Promise<void>
  readonly stop: () => Promise<void>
}

export async function startTestMail(): Promise<TestMail> {
  const { folder, remove } = createFolder()
  const first = await startFakeMailServer(folder)
  let server: FakeServer | null = first
  const pause = async () => {
    await server?.stop()
    server = null
  }
  return {
    url: `smtp://127.0.0.1:${first.port}`,
    folder,
    list: () => listMessages(folder),
    pause,
    async resume() {
      server ??= await startFakeMailServer(folder, first.port)
    },
    async stop() {
      await pause()
      remove()
    },
  }
}
