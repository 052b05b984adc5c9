import { existsSync } from 'node:fs'
import type { Server } from 'node:http'
import { fileURLToPath } from 'node:url'
import { createApp } from './app'
import { EnvError, readEnv, type Env } from './config/env'
import { createDatabaseClient } from './db/client'
import { drain } from './http/drain'
import { createLifecycle } from './http/lifecycle'
import { loadPages } from './http/render'
import { createLogger } from './lib/logger'
import { refreshSearchTexts } from './modules/gear/gear-search.service'

function readEnvOrExit(): Env {
  try {
    return readEnv(process.env)
  } catch (error) {
    if (!(error instanceof EnvError)) throw error
    process.stderr.write(`${error.message}\n`)
    process.exit(2)
  }
}

/** The built server lies in the build; run from its sources, the build lies beside it. */
function findDistFolder(): string {
  const built = fileURLToPath(new URL('..', import.meta.url))
  return existsSync(`${built}/ssr`) ? built : fileURLToPath(new URL('../dist', import.meta.url))
}

const env = readEnvOrExit()
const logger = createLogger(env.LOG_LEVEL)
const lifecycle = createLifecycle()
const database = createDatabaseClient(env.DATABASE_URL, {
  onError: (error) => logger.warn({ err: error }, 'an idle database connection was lost'),
})
const pages = await loadPages(findDistFolder())
if (pages === null) logger.warn('there is no build of the client: the API answers alone')

const app = createApp({ db: database.db, env, logger, lifecycle, pages })
const server: Server = app.listen(env.PORT, env.HOST)
server.requestTimeout = 30_000
server.headersTimeout = 15_000
server.keepAliveTimeout = 10_000

server.once('listening', () => {
  logger.info({ address: server.address() }, 'listening')
  refreshSearchTexts(database.db).catch((error: unknown) =>
    logger.warn({ err: error }, 'search texts stay as they were'),
  )
})
server.once('error', (error: NodeJS.ErrnoException) => {
  const taken = `Port ${env.PORT} on ${env.HOST} is taken: stop what uses it, or set PORT to another.`
  process.stderr.write(`${error.code === 'EADDRINUSE' ? taken : error.message}\n`)
  process.exit(1)
})

let isStopping = false

async function stop(signal: NodeJS.Signals): Promise<void> {
  // Asked twice, somebody is in a hurry.
  if (isStopping) process.exit(1)
  isStopping = true
  logger.info({ signal }, 'draining')
  await drain(server, lifecycle)
  await database.close()
  process.exit(0)
}

process.on('SIGINT', (signal) => void stop(signal))
process.on('SIGTERM', (signal) => void stop(signal))
