import pg from 'pg'
import { afterAll, beforeAll, describe, expect, test } from 'vitest'
import { createDatabaseClient } from '../../server/db/client'
import { runMigrations } from '../../server/db/run-migrations'
import { createTestDatabase, type TestDatabase } from '../support/test-database'

let database: TestDatabase
let owner: pg.Client

beforeAll(async () => {
  database = await createTestDatabase()
  owner = new pg.Client({ connectionString: database.ownerUrl })
  await owner.connect()
})

afterAll(async () => {
  await owner.end()
  await database.drop()
})

async function countMigrations(): Promise<number> {
  const { rows } = await owner.query<{ count: number }>(
    'SELECT count(*)::int AS count FROM drizzle.__drizzle_migrations',
  )
  return rows[0]?.count ?? NaN
}

describe('migrations', () => {
  test('run once when four processes start at the same time on an empty database', async () => {
    const expected = await countMigrations()
    await owner.query('DROP SCHEMA drizzle CASCADE')
    await owner.query('DROP SCHEMA public CASCADE')
    await owner.query('CREATE SCHEMA public')
    await Promise.all([1, 2, 3, 4].map(() => runMigrations(database.ownerUrl)))
    expect(expected).toBeGreaterThan(0)
    expect(await countMigrations()).toBe(expected)
  })

  test('give up when another process holds the lock for too long', async () => {
    await owner.query('SELECT pg_advisory_lock(784553487)')
    // PostgreSQL's manual, appendix A: 55P03 is lock_not_available.
    await expect(runMigrations(database.ownerUrl, { waitMs: 100 })).rejects.toMatchObject({ code: '55P03' })
    await owner.query('SELECT pg_advisory_unlock_all()')
  })
})

describe('the database client', () => {
  test('ends a statement that takes too long', async () => {
    const { pool, close } = createDatabaseClient(database.databaseUrl, { statementTimeoutMs: 100 })
    // 57014 is query_canceled.
    await expect(pool.query('SELECT pg_sleep(5)')).rejects.toMatchObject({ code: '57014' })
    await close()
  })

  test('says soon that every connection is in use', async () => {
    const { pool, close } = createDatabaseClient(database.databaseUrl, { max: 1, connectionTimeoutMs: 1_500 })
    const held = await pool.connect()
    await expect(pool.query('SELECT 1')).rejects.toThrow('timeout exceeded when trying to connect')
    held.release()
    await close()
  })

  test('outlives the loss of its connections, and answers again', async () => {
    const fresh = await createTestDatabase()
    const lost: Error[] = []
    const { pool, close } = createDatabaseClient(fresh.databaseUrl, { onError: (error) => lost.push(error) })
    await pool.query('SELECT 1')
    await fresh.cutConnections()
    await expect.poll(() => lost.length).toBeGreaterThan(0)
    expect((await pool.query('SELECT 2 AS two')).rows).toEqual([{ two: 2 }])
    await close()
    await fresh.drop()
  })
})

describe("the application's role", () => {
  test('can neither empty nor alter what the owner keeps', async () => {
    const fresh = await createTestDatabase()
    const { pool, close } = createDatabaseClient(fresh.databaseUrl)
    // 42501 is insufficient_privilege.
    for (const sql of [
      'TRUNCATE gear_revisions CASCADE',
      'ALTER TABLE gear_revisions DISABLE TRIGGER ALL',
      'DROP TABLE gear_values',
      'CREATE TABLE public.mine (id int)',
    ]) {
      await expect(pool.query(sql), sql).rejects.toMatchObject({ code: '42501' })
    }
    await close()
    await fresh.drop()
  })
})
