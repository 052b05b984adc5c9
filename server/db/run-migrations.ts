import { fileURLToPath } from 'node:url'
import { drizzle } from 'drizzle-orm/node-postgres'
import { migrate } from 'drizzle-orm/node-postgres/migrator'
import pg from 'pg'
import { installQueues } from './install-queues'

/** Any constant that no other user of the database takes: "stillfits" on a telephone's keys, cut to fit. */
const migrationLockKey = 784_553_487

/** Beside this file in the sources; the build lays a copy beside the bundle. */
const migrationsFolder = fileURLToPath(new URL('./migrations', import.meta.url))

export interface MigrationOptions {
  /** How long to wait while another process migrates. */
  readonly waitMs?: number
  /** How long one statement may wait for a table that is in use, while everybody else queues behind it. */
  readonly lockTimeoutMs?: number
}

/** Runs what is pending. Drizzle takes no lock of its own, so two starts at once would run the same file twice. */
export async function runMigrations(databaseUrl: string, options: MigrationOptions = {}): Promise<void> {
  const client = new pg.Client({
    connectionString: databaseUrl,
    application_name: 'stillfits-migrate',
    connectionTimeoutMillis: 10_000,
  })
  // The rejection of the running query tells of a lost connection; an unheard event would end the process first.
  client.on('error', () => undefined)
  await client.connect()
  try {
    await client.query(`SET lock_timeout = ${options.waitMs ?? 60_000}`)
    await client.query('SELECT pg_advisory_lock($1)', [migrationLockKey])
    await client.query(`SET lock_timeout = ${options.lockTimeoutMs ?? 5_000}`)
    await migrate(drizzle(client), { migrationsFolder })
    await installQueues(client)
  } finally {
    // Closing the session frees the advisory lock, also when the migration failed halfway.
    await client.end()
  }
}
