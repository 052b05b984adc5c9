import { once } from 'node:events'
import { connect, createServer, type AddressInfo, type Server, type Socket } from 'node:net'
import pg from 'pg'
import request from 'supertest'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { startApp, type TestApp } from '../support/app'
import { createApp } from '../../server/app'
import { readEnv } from '../../server/config/env'
import { createDatabaseClient, type DatabaseClient } from '../../server/db/client'
import { createLogger } from '../../server/lib/logger'
import { pingDatabase } from '../../server/modules/system/system.queries'
import { expectProblem } from './problems'
import { addHeaters, rearChamberSetup as setup } from './records'

/** A wire to the database that can be cut and mended, as a restart of PostgreSQL looks from here. */
class Wire {
  readonly #server: Server
  readonly #sockets = new Set<Socket>()
  #isCut = false

  constructor(target: { readonly host: string; readonly port: number }) {
    this.#server = createServer((near) => {
      if (this.#isCut) return near.destroy()
      const far = connect(target)
      for (const socket of [near, far]) {
        this.#sockets.add(socket)
        socket.on('error', () => undefined).on('close', () => this.#sockets.delete(socket))
      }
      return near.pipe(far).pipe(near)
    })
  }

  async listen(): Promise<number> {
    this.#server.listen(0, '127.0.0.1')
    await once(this.#server, 'listening')
    return (this.#server.address() as AddressInfo).port
  }

  cut(): void {
    this.#isCut = true
    for (const socket of this.#sockets) socket.destroy()
  }

  mend(): void {
    this.#isCut = false
  }

  close(): void {
    this.cut()
    this.#server.close()
  }
}

let app: TestApp
let wire: Wire
let client: DatabaseClient
let url: string
let stop: () => void

beforeAll(async () => {
  app = await startApp()
  await addHeaters(app.client.db)
  const target = new URL(app.database.databaseUrl)
  wire = new Wire({ host: target.hostname, port: Number(target.port) })
  target.port = String(await wire.listen())
  const env = readEnv({ NODE_ENV: 'test', DATABASE_URL: target.href })
  client = createDatabaseClient(env.DATABASE_URL, { connectionTimeoutMs: 1000, statementTimeoutMs: 1000, max: 2 })
  const server = createApp({ db: client.db, env, logger: createLogger('silent') }).listen(0, '127.0.0.1')
  await once(server, 'listening')
  url = `http://127.0.0.1:${(server.address() as AddressInfo).port}`
  stop = () => {
    server.closeAllConnections()
    server.close()
  }
})

afterAll(async () => {
  stop()
  await client.close()
  wire.close()
  await app.stop()
})

const fit = () => request(url).post('/api/v1/fit').send({ setup, kind: 'heater' })
const readings: [string, () => request.Test][] = [
  ['a list', () => request(url).get('/api/v1/gear')],
  ['a piece', () => request(url).get('/api/v1/gear/quillmoor-testworks-rod-a')],
  ['its history', () => request(url).get('/api/v1/gear/quillmoor-testworks-rod-a/revisions')],
  ['a calculation', fit],
]

describe('while the database is away', () => {
  it('answers 503 with Retry-After, stays alive, and recovers by itself', async () => {
    for (const [, read] of readings) await read().expect(200)
    wire.cut()
    // The copy of the catalogue is believed for two seconds.
    await new Promise((resolve) => setTimeout(resolve, 2100))
    for (const [, read] of [...readings, ['readiness', () => request(url).get('/ready')] as const]) {
      const response = await read()
      expectProblem(response, 503)
      expect(Number(response.headers['retry-after'])).toBeGreaterThan(0)
    }
    await request(url).get('/health').expect(200)
    await request(url).get('/api/v1/kinds').expect(200)
    wire.mend()
    for (const [, read] of readings) await read().expect(200)
    await request(url).get('/ready').expect(200)
  })

  it('survives connections that PostgreSQL ends', async () => {
    await request(url).get('/api/v1/gear').expect(200)
    await app.database.cutConnections()
    await expect.poll(async () => (await request(url).get('/api/v1/gear')).status, { timeout: 5000 }).toBe(200)
  })

  it('survives the loss of a connection between two statements of a transaction', async () => {
    const lost = client.db.transaction(async (tx) => {
      await pingDatabase(tx)
      await app.database.cutConnections()
      await new Promise((resolve) => setTimeout(resolve, 100))
      await pingDatabase(tx)
    })
    await expect(lost).rejects.toThrow()
    await expect.poll(async () => (await request(url).get('/ready')).status, { timeout: 5000 }).toBe(200)
  })

  it('answers 503 rather than wait when every connection is taken', async () => {
    const hold = () => client.pool.query('select pg_sleep(0.9)').catch(() => undefined)
    const holders = [hold(), hold(), hold(), hold(), hold(), hold()]
    const response = await request(url).get('/api/v1/gear')
    expectProblem(response, 503)
    await Promise.all(holders)
    await request(url).get('/api/v1/gear').expect(200)
  })

  it('answers 503 when a statement takes too long', async () => {
    const owner = new pg.Client({ connectionString: app.database.ownerUrl })
    await owner.connect()
    try {
      await owner.query('BEGIN; LOCK TABLE gear IN ACCESS EXCLUSIVE MODE')
      expectProblem(await request(url).get('/api/v1/gear'), 503)
      await owner.query('ROLLBACK')
    } finally {
      await owner.end()
    }
    await request(url).get('/api/v1/gear').expect(200)
  })
})

describe('what nobody foresaw', () => {
  it('is a bare 500 that is logged with its request id and tells nothing', async () => {
    const lines: string[] = []
    const logger = createLogger('info', { write: (line) => void lines.push(line) })
    const broken = await startApp({ app: { logger } })
    const owner = new pg.Client({ connectionString: broken.database.ownerUrl })
    await owner.connect()
    try {
      await owner.query('ALTER TABLE gear RENAME COLUMN brand TO marque')
      const response = await request(broken.url).get('/api/v1/gear')
      const problem = expectProblem(response, 500)
      expect(response.text).not.toMatch(/marque|brand|select/i)
      const record = JSON.parse(lines.find((line) => line.includes(problem.requestId)) ?? '{}') as Record<
        string,
        unknown
      >
      expect(record).toMatchObject({ level: 50, res: { status: 500 } })
      expect(JSON.stringify(record.err)).toMatch(/brand/)
    } finally {
      await owner.end()
      await broken.stop()
    }
  })
})
