import request from 'supertest'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { startApp, type TestApp } from '../support/app'
import { expectProblem, listPointers } from './problems'

let app: TestApp

beforeAll(async () => {
  app = await startApp()
})

afterAll(() => app.stop())

async function findPointers(path: string, body: object) {
  const response = await request(app.url).post(`/api/v1${path}`).send(body)
  return listPointers(expectProblem(response, 422))
}

const tank = { outerLengthMm: 600, outerWidthMm: 400, outerHeightMm: 400, wallMm: 8 }

describe('one answer names all that is wrong', () => {
  const items = [
    { id: 'a', kind: 'heater', gear: 'no-such-heater' },
    { id: 'b', kind: 'heater', specs: { lengthMm: -3 } },
  ]

  it.each([
    ['/setups/report', {}],
    ['/replacements', { itemId: 'a' }],
    ['/fit', { kind: 'heater' }],
    ['/fit/check', { piece: { kind: 'heater', specs: {} } }],
  ])('%s: an absurd number and gear that nobody knows', async (path, more) => {
    expect(await findPointers(path, { setup: { units: 'metric', tank, items }, ...more })).toEqual([
      '#/setup/items/0/gear',
      '#/setup/items/1/specs/lengthMm',
    ])
  })

  it('/fit/check: a wrong field, an unknown tank and an unknown piece', async () => {
    const setup = { units: 'metric', tank: { gear: 'no-such-tank' }, items: [] }
    const body = { setup, piece: { gear: 'no-such-heater' }, quantity: 0 }
    expect(await findPointers('/fit/check', body)).toEqual(['#/piece/gear', '#/quantity', '#/setup/tank/gear'])
  })

  it('/fit: a wrong limit, and a tank whose walls are thicker than it is', async () => {
    const setup = { units: 'metric', tank: { ...tank, outerWidthMm: 60, wallMm: 35 }, items: [] }
    const pointers = await findPointers('/fit', { setup, kind: 'heater', limit: 0 })
    expect(pointers).toContain('#/limit')
    expect(pointers).toContain('#/setup/tank/wallMm')
  })

  it.each([[null], [[]], ['text'], [{ setup: { items: 'none', tank: [] } }]])(
    'the body %j is refused, not stumbled over',
    async (body) => {
      const response = await request(app.url)
        .post('/api/v1/fit')
        .set('Content-Type', 'application/json')
        .send(JSON.stringify(body))
      expectProblem(response, 422)
    },
  )
})
