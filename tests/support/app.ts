import { once } from 'node:events'
import type { AddressInfo } from 'node:net'
import pino from 'pino'
import { createApp, type AppDependencies } from '../../server/app'
import { readEnv, type Env } from '../../server/config/env'
import { createDatabaseClient, type DatabaseClient, type PoolOptions } from '../../server/db/client'
import { createTestDatabase, type TestDatabase } from './test-database'

export interface TestApp {
  /** Where the app listens, such as `http://127.0.0.1:41234`; supertest and fetch both take it. */
  readonly url: string
  readonly client: DatabaseClient
  readonly database: TestDatabase
  readonly stop: () => Promise<void>
}

export interface TestAppOptions {
  readonly env?: Partial<Record<keyof Env, string>>
  readonly pool?: PoolOptions
  /** Anything else that the app is made of: rate limits, built pages, a logger that listens. */
  readonly app?: Partial<Omit<AppDependencies, 'db' | 'env'>>
}

/** The real app on a port of its own, with a database of its own. Call `stop` in `afterAll`. */
export async function startApp(options: TestAppOptions = {}): Promise<TestApp> {
  const database = await createTestDatabase()
  const env = readEnv({ NODE_ENV: 'test', PORT: '0', DATABASE_URL: database.databaseUrl, ...options.env })
  const client = createDatabaseClient(env.DATABASE_URL, options.pool)
  const logger = pino({ level: 'silent' })
  const server = createApp({ db: client.db, env, logger, ...options.app }).listen(env.PORT, env.HOST)
  await once(server, 'listening')
  return {
    url: `http://${env.HOST}:${(server.address() as AddressInfo).port}`,
    client,
    database,
    async stop() {
      server.closeAllConnections()
      await new Promise((resolve) => server.close(resolve))
      await client.close()
      await database.drop()
    },
  }
}
