import { EnvError, readEnv } from '../config/env'
import { runMigrations } from './run-migrations'

const exitCodes = { failed: 1, environment: 2, tryAgain: 75 } as const

/** lock_not_available, and every connection exception (SQLSTATE class 08, refused or cut off): worth another try. */
function isTransient(error: unknown): boolean {
  if (typeof error !== 'object' || error === null) return false
  const { code, cause } = error as { code?: unknown; cause?: unknown }
  if (typeof code === 'string' && /^(55P03|08...|57P0[123]|ECONNREFUSED|ECONNRESET|ETIMEDOUT)$/.test(code)) return true
  return isTransient(cause)
}

function describe(error: unknown): string {
  if (!(error instanceof Error)) return String(error)
  const cause = error.cause instanceof Error ? `\n  because: ${error.cause.message}` : ''
  const first = error.message || ('code' in error ? String(error.code) : error.name)
  return `${first}${cause}`
}

try {
  const env = readEnv(process.env)
  await runMigrations(env.DATABASE_OWNER_URL ?? env.DATABASE_URL)
} catch (error) {
  const isEnvironment = error instanceof EnvError
  process.stderr.write(isEnvironment ? `${error.message}\n` : `Migrating failed: ${describe(error)}\n`)
  process.exitCode = isEnvironment ? exitCodes.environment : isTransient(error) ? exitCodes.tryAgain : exitCodes.failed
}
