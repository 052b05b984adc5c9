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
import { createFileStoreFrom, createMailerFrom } from './services/from-env'
import { startWorkers } from './workers'

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

const mailer = createMailerFrom(env)
if (mailer === null) logger.warn('SMTP_URL is not set: letters wait in the outbox')
const files = createFileStoreFrom(env)
if (files === null) logger.warn('S3_ENDPOINT is not set: no photo or document can be added')

const app = createApp({ db: database.db, env, logger, lifecycle, pages, files })
const server: Server = app.listen(env.PORT, env.HOST)
// Long enough for the largest photo on a slow line; headers have to come soon all the same.
server.requestTimeout = 300_000
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

// Connections of their own: a burst of requests holds up no letter, nor letters a request.
const jobDatabase = createDatabaseClient(env.DATABASE_URL, {
  max: 3,
  onError: (error) => logger.warn({ err: error }, 'an idle database connection of the jobs was lost'),
})
const workers = startWorkers({
  db: jobDatabase.db,
  env,
  logger,
  mailer,
  files,
  executeSql: (text, values) => jobDatabase.pool.query(text, values),
})

let isStopping = false

async function stop(signal: NodeJS.Signals): Promise<void> {
  // Asked twice, somebody is in a hurry.
  if (isStopping) process.exit(1)
  isStopping = true
  logger.info({ signal }, 'draining')
  await Promise.all([drain(server, lifecycle), workers.stop()])
  mailer?.close()
  files?.close()
  await Promise.all([database.close(), jobDatabase.close()])
  process.exit(0)
}

process.on('SIGINT', (signal) => void stop(signal))
process.on('SIGTERM', (signal) => void stop(signal))
