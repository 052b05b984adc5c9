import { join } from 'node:path'
import { ensureBuild } from './lib/build.mjs'
import { checkout } from './lib/checkout.mjs'
import { databaseEnv, isDemo, prepareDatabase, readGivenDatabase, startOwnDatabase } from './lib/database.mjs'
import { ensureDependencies } from './lib/dependencies.mjs'
import { startFakes } from './lib/fakes.mjs'
import { live } from './lib/lifecycle.mjs'
import { takeRunLock } from './lib/run-lock.mjs'
import { formatOrigin, readAddress, requirePort } from './lib/ports.mjs'
import { delay, hasEnded, requireSetpriv, runStep, startChild, stopChild } from './lib/processes.mjs'
import { ensureRequirements, requireNode } from './lib/requirements.mjs'
import { say, Trouble } from './lib/say.mjs'

/** @typedef {import('./lib/processes.mjs').ChildProcess} ChildProcess */

async function isReady(/** @type {string} */ origin) {
  try {
    return (await fetch(`${origin}/ready`, { signal: AbortSignal.timeout(2_000) })).ok
  } catch {
    return false
  }
}

async function waitUntilReady(/** @type {ChildProcess} */ server, /** @type {string} */ origin) {
  const deadline = Date.now() + 60_000
  while (!(await isReady(origin))) {
    if (hasEnded(server)) throw new Trouble('The server ended before it was ready.')
    if (Date.now() > deadline) throw new Trouble('The server was not ready within a minute.')
    await delay(100)
  }
}

await live(
  async (life) => {
    requireNode()
    requireSetpriv()
    const { host, port } = await readAddress()
    const origin = formatOrigin(host, port)
    const lock = await takeRunLock()
    life.defer(lock.release)
    await requirePort(port, host)

    const given = readGivenDatabase()
    if (!given) await ensureRequirements(['postgresql'])
    await ensureDependencies()
    await ensureBuild()
    const urls = given ?? (await startOwnDatabase(life))
    await prepareDatabase(urls, { isBuilt: true })
    const services = await startFakes(life, { isBuilt: true })

    const server = startChild(process.execPath, [join(checkout, 'dist/server/index.js')], {
      cwd: checkout,
      stdio: ['ignore', 'inherit', 'inherit'],
      env: {
        NODE_ENV: process.env.NODE_ENV || 'production',
        // The lines of this script are for a person; a log line per request would bury them.
        LOG_LEVEL: process.env.LOG_LEVEL || 'warn',
        HOST: host,
        PORT: String(port),
        ...databaseEnv(urls),
        ...services,
      },
    })
    life.defer(() => stopChild(server, 15_000))
    await waitUntilReady(server, origin)
    server.once('exit', (code) => {
      if (life.isEnding()) return
      say(`The server ended unexpectedly (${code ?? 'killed'}).`)
      void life.end(1)
    })
    lock.tell(origin)
    say(`Stillfits is ready at ${origin}`)
    // The people of the demo data are for trying things out; elsewhere there are none.
    if (isDemo()) await runStep(process.execPath, [join(checkout, 'dist/server/sign-ins.js')], { cwd: checkout })
    if ('MAILROOM_FOLDER' in services) say(`No e-mail leaves this machine: letters arrive at ${origin}/mailroom`)
    return null
  },
  { onStopping: () => say('Stopping …') },
)
