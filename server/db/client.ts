import { drizzle, type NodePgDatabase } from 'drizzle-orm/node-postgres'
import pg from 'pg'

export interface PoolOptions {
  readonly max?: number
  readonly connectionTimeoutMs?: number
  readonly statementTimeoutMs?: number
  readonly onError?: (error: Error) => void
}

export type Database = NodePgDatabase & { $client: pg.Pool }

export interface DatabaseClient {
  readonly db: Database
  readonly pool: pg.Pool
  readonly close: () => Promise<void>
}

/**
 * One pool for one process. Every wait has an end: for a free connection, a statement, a lock, and an idle
 * transaction; pg's own defaults wait for ever.
 */
export function createDatabaseClient(databaseUrl: string, options: PoolOptions = {}): DatabaseClient {
  const pool = new pg.Pool({
    connectionString: databaseUrl,
    application_name: 'stillfits',
    max: options.max ?? 10,
    connectionTimeoutMillis: options.connectionTimeoutMs ?? 3_000,
    idleTimeoutMillis: 30_000,
    keepAlive: true,
    statement_timeout: options.statementTimeoutMs ?? 10_000,
    query_timeout: (options.statementTimeoutMs ?? 10_000) + 2_000,
    lock_timeout: 3_000,
    idle_in_transaction_session_timeout: 10_000,
  })
  // Without a listener an idle connection's loss (a PostgreSQL restart) ends the process.
  pool.on('error', (error: Error & { client?: unknown }) => {
    // The driver hangs the whole connection on it, its secret key included: nothing for a log.
    delete error.client
    options.onError?.(error)
  })
  // So does that of a connection which a transaction holds between two statements; its next statement then rejects.
  pool.on('connect', (client) => client.on('error', () => undefined))
  return { db: drizzle(pool), pool, close: () => pool.end() }
}
