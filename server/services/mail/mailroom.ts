import { readdir, readFile, rename, rm, writeFile } from 'node:fs/promises'
import { join } from 'node:path'
import { readMessage, type ReadMessage } from './read-message'

const mostKept = 200
const suffix = '.eml'

export interface ReceivedLetter extends ReadMessage {
  readonly receivedAt: string
}

async function listFiles(folder: string): Promise<string[]> {
  const names = await readdir(folder).catch(() => [])
  return names.filter((name) => name.endsWith(suffix)).sort()
}

/** Named by the moment, so that the order of names is that of arrival. */
export async function keepMessage(folder: string, raw: Buffer, at: Date, id: string): Promise<void> {
  const name = `${at.toISOString().replaceAll(':', '-')}_${id}`
  const part = join(folder, `${name}.part`)
  await writeFile(part, raw)
  // Renamed when whole: nobody reads half a letter.
  await rename(part, join(folder, `${name}${suffix}`))
  const names = await listFiles(folder)
  const old = names.slice(0, Math.max(0, names.length - mostKept))
  await Promise.all(old.map((oldName) => rm(join(folder, oldName), { force: true })))
}

/** What the local stand-in for the mail server received, newest first. */
export async function listMessages(folder: string): Promise<ReceivedLetter[]> {
  const names = await listFiles(folder)
  return Promise.all(
    names.reverse().map(async (name) => {
      const [moment = ''] = name.split('_', 1)
      const [day, time = ''] = moment.split('T', 2)
      const raw = await readFile(join(folder, name), 'latin1')
      return { receivedAt: `${day}T${time.replaceAll('-', ':')}`, ...readMessage(raw) }
    }),
  )
}
