import { join } from 'node:path'
import { checkout } from './lib/checkout.mjs'
import { databaseEnv, prepareDatabase, readGivenDatabase, startOwnDatabase } from './lib/database.mjs'
import { ensureDependencies } from './lib/dependencies.mjs'
import { startFakes } from './lib/fakes.mjs'
import { live } from './lib/lifecycle.mjs'
import { findFreePort, formatOrigin, readAddress, requirePort } from './lib/ports.mjs'
import { requireSetpriv, startChild, stopChild } from './lib/processes.mjs'
import { ensureRequirements, requireNode } from './lib/requirements.mjs'
import { takeRunLock } from './lib/run-lock.mjs'
import { say } from './lib/say.mjs'

/** The client from its sources with hot reload, the server restarted when its sources change. */
await live(
  async (life) => {
    requireNode()
    requireSetpriv()
    const { host, port } = await readAddress()
    const lock = await takeRunLock()
    life.defer(lock.release)
    await requirePort(port, host)
    const given = readGivenDatabase()
    if (!given) await ensureRequirements(['postgresql'])
    await ensureDependencies()
    const urls = given ?? (await startOwnDatabase(life))
    await prepareDatabase(urls, { isBuilt: false })
    const services = await startFakes(life, { isBuilt: false })

    const apiPort = await findFreePort()
    const origin = formatOrigin(host, port)
    const env = {
      NODE_ENV: 'development',
      HOST: '127.0.0.1',
      PORT: String(apiPort),
      // Pages are visited by way of Vite: links in letters lead there.
      PUBLIC_ORIGIN: origin,
      ...databaseEnv(urls),
      ...services,
    }
    const vite = join(checkout, 'node_modules/vite/bin/vite.js')
    const children = [
      startChild(process.execPath, ['--watch', '--watch-preserve-output', '--import', 'tsx', 'server/index.ts'], {
        cwd: checkout,
        env,
      }),
      startChild(process.execPath, [vite, '--host', host, '--port', String(port), '--clearScreen', 'false'], {
        cwd: checkout,
        env: { NODE_ENV: 'development', API_ORIGIN: `http://127.0.0.1:${apiPort}` },
      }),
    ]
    life.defer(() => Promise.all(children.map((child) => stopChild(child, 5_000))))
    for (const child of children) child.once('exit', () => void life.end(1))
    lock.tell(origin)
    say(`Developing at ${origin}`)
    return null
  },
  { onStopping: () => say('Stopping …') },
)
