import { once } from 'node:events'
import type { Server } from 'node:http'
import type { AddressInfo } from 'node:net'
import express from 'express'
import request from 'supertest'
import { afterAll, beforeAll, beforeEach, expect, it } from 'vitest'
import { createDatabaseClient, type DatabaseClient } from '../../../server/db/client'
import { createIdempotency } from '../../../server/http/idempotency'
import { createProblemHandler } from '../../../server/http/problem-handler'
import { readJsonBody } from '../../../server/http/requests'
import { AppError } from '../../../server/lib/errors'
import { createTestDatabase, type TestDatabase } from '../../support/test-database'

let database: TestDatabase
let client: DatabaseClient
let server: Server
let url = ''
let done = 0
let hold: Promise<unknown> = Promise.resolve()

beforeAll(async () => {
  database = await createTestDatabase()
  client = createDatabaseClient(database.databaseUrl)
  const { rows } = await client.pool.query<{ id: number }>('SELECT id FROM people LIMIT 1')
  const app = express()
  app.use((_req, res, next) => {
    res.locals.actor = { id: rows[0]?.id }
    next()
  })
  app.post('/things', ...readJsonBody, createIdempotency(client.db), async (req, res) => {
    const { name } = req.body as { name: string }
    if (name === '') throw new AppError('invalid', 'The name is missing.')
    done += 1
    const number = done
    await hold
    res.status(201).set('Location', `/things/${number}`).json({ name, number })
  })
  app.use(createProblemHandler(() => ''))
  server = app.listen(0, '127.0.0.1')
  await once(server, 'listening')
  url = `http://127.0.0.1:${(server.address() as AddressInfo).port}`
})

afterAll(async () => {
  server.closeAllConnections()
  await new Promise((resolve) => server.close(resolve))
  await client.close()
  await database.drop()
})

beforeEach(() => {
  done = 0
  hold = Promise.resolve()
})

const add = (key: string, body: object) => request(url).post('/things').set('Idempotency-Key', key).send(body)

it('does a POST once that is sent twenty times, and answers each time the same', async () => {
  const first = await add('twenty-times', { name: 'rod' }).expect(201)
  for (let time = 1; time < 20; time += 1) {
    const again = await add('twenty-times', { name: 'rod' }).expect(201)
    expect(again.body).toEqual(first.body)
    expect(again.headers.location).toBe('/things/1')
    expect(again.headers['idempotency-replayed']).toBe('true')
  }
  expect(done).toBe(1)
})

it('answers 409 while the first is on its way, also to many at once, and its answer afterwards', async () => {
  let letGo: (value?: unknown) => void = () => undefined
  hold = new Promise((resolve) => (letGo = resolve))
  const first = add('in-flight-key', { name: 'rod' }).then((response) => response)
  await expect.poll(() => done).toBe(1)
  const others = await Promise.all(Array.from({ length: 8 }, () => add('in-flight-key', { name: 'rod' })))
  expect(others.map(({ status }) => status)).toEqual(Array.from({ length: 8 }, () => 409))
  letGo()
  expect((await first).status).toBe(201)
  expect((await add('in-flight-key', { name: 'rod' })).body).toEqual({ name: 'rod', number: 1 })
  expect(done).toBe(1)
})

it('keeps the answer for somebody who hung up before it came', async () => {
  let letGo: (value?: unknown) => void = () => undefined
  hold = new Promise((resolve) => (letGo = resolve))
  const hangUp = new AbortController()
  const first = fetch(`${url}/things`, {
    method: 'POST',
    headers: { 'Content-Type': 'application/json', 'Idempotency-Key': 'hung-up-key' },
    body: JSON.stringify({ name: 'rod' }),
    signal: hangUp.signal,
  }).catch((error: unknown) => error)
  await expect.poll(() => done).toBe(1)
  hangUp.abort()
  await first
  letGo()
  await expect.poll(async () => (await add('hung-up-key', { name: 'rod' })).status).toBe(201)
  expect(done).toBe(1)
})

it('refuses a key that came with another body, and asks for a key where there is none', async () => {
  await add('used-already', { name: 'rod' }).expect(201)
  await add('used-already', { name: 'lamp' }).expect(422)
  await request(url).post('/things').send({ name: 'rod' }).expect(400)
  await add('short', { name: 'rod' }).expect(400)
  expect(done).toBe(1)
})

it('lets go of a key whose request was refused, so that it can be sent again, mended', async () => {
  await add('mended-later', { name: '' }).expect(422)
  await add('mended-later', { name: 'rod' }).expect(201)
})

it('gives a key to the next who asks when the process that had it died a minute ago', async () => {
  await add('abandoned-key', { name: 'rod' }).expect(201)
  await client.pool.query(
    `UPDATE idempotency_keys SET status = NULL, created_at = now() - interval '61 seconds' WHERE key = 'abandoned-key'`,
  )
  const several = await Promise.all(Array.from({ length: 5 }, () => add('abandoned-key', { name: 'rod' })))
  expect(done).toBe(2)
  expect(several.filter(({ status }) => status === 201).length).toBeGreaterThanOrEqual(1)
})
