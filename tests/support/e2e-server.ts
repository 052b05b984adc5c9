import { spawn } from 'node:child_process'
import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { startFakes } from '../../scripts/lib/fakes.mjs'
import { findFreePort } from '../../scripts/lib/ports.mjs'
import { startTestCluster } from '../../scripts/lib/test-cluster.mjs'
import { createTestDatabase } from './test-database'

export const e2eOriginVariable = 'STILLFITS_E2E_ORIGIN'

async function waitUntilReady(origin: string, hasEnded: () => boolean): Promise<void> {
  const deadline = Date.now() + 30_000
  for (;;) {
    const isReady = await fetch(`${origin}/ready`).then(
      (response) => response.ok,
      () => false,
    )
    if (isReady) return
    if (hasEnded() || Date.now() > deadline) throw new Error('The built server did not become ready.')
    await new Promise((resolve) => setTimeout(resolve, 100))
  }
}

/** Playwright's global setup: the built server, as it is run in production, on a copied database. */
export default async function setUpServer(): Promise<() => Promise<void>> {
  const undos: (() => unknown)[] = []
  const tearDown = async () => {
    for (const undo of undos.reverse()) await undo()
  }
  try {
    await startTestCluster((undo) => undos.push(undo))
    const database = await createTestDatabase()
    undos.push(database.drop)
    const folder = mkdtempSync(join(tmpdir(), 'stillfits-e2e-'))
    undos.push(() => rmSync(folder, { recursive: true, force: true }))
    let isEnding = false
    const life = { defer: (undo: () => unknown) => void undos.push(undo), isEnding: () => isEnding }
    const services = await startFakes(life, { isBuilt: true, folder }, {})
    const port = await findFreePort()
    const origin = `http://127.0.0.1:${port}`
    const server = spawn('setpriv', ['--pdeathsig=TERM', '--', process.execPath, 'dist/server/index.js'], {
      stdio: ['ignore', 'inherit', 'inherit'],
      env: {
        ...process.env,
        NODE_ENV: 'production',
        LOG_LEVEL: 'warn',
        HOST: '127.0.0.1',
        PORT: String(port),
        DATABASE_URL: database.databaseUrl,
        ...services,
      },
    })
    const ended = new Promise((resolve) => server.once('exit', resolve))
    undos.push(async () => {
      isEnding = true
      server.kill('SIGTERM')
      await ended
    })
    await waitUntilReady(origin, () => server.exitCode !== null)
    process.env[e2eOriginVariable] = origin
  } catch (error) {
    await tearDown()
    throw error
  }
  return tearDown
}
