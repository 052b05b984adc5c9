import { afterAll, beforeAll, expect, it } from 'vitest'
import request from 'supertest'
import { seedPieces } from '../../seeds/gear/index'
import { importPieces } from '../../server/modules/gear/gear-writes.service'
import { startApp, type TestApp } from '../support/app'

let app: TestApp

beforeAll(async () => {
  app = await startApp()
})

afterAll(() => app.stop())

it('serves every piece of the demo catalogue, and a second load changes nothing', async () => {
  await importPieces(app.client.db, seedPieces)
  const before = await request(app.url).get('/api/v1/gear').expect(200)
  expect((before.body as { total: number }).total).toBeGreaterThanOrEqual(seedPieces.length)
  const counts = await importPieces(app.client.db, seedPieces)
  expect(counts).toEqual({ created: 0, extended: 0, unchanged: seedPieces.length })
  const after = await request(app.url).get('/api/v1/gear').expect(200)
  expect(after.body).toEqual(before.body)
})
