import request from 'supertest'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { replacementsSchema } from '../../shared/schemas/replacements'
import { importPieces } from '../../server/modules/gear/gear-writes.service'
import { startApp, type TestApp } from '../support/app'
import { expectProblem, listPointers } from './problems'
import { addHeaters, describePiece, rearChamberSetup, wholeHeater } from './records'

let app: TestApp

const slugOf = (name: string) => `quillmoor-testworks-${name}`

beforeAll(async () => {
  app = await startApp()
  await addHeaters(app.client.db)
  await importPieces(app.client.db, [describePiece('Rod D', { ...wholeHeater, thermostat: 'external-needed' })])
})

afterAll(() => app.stop())

const post = (body: unknown) =>
  request(app.url)
    .post('/api/v1/replacements')
    .send(body as object)

const meter = { id: 'meter', kind: 'salinity-meter', specs: { method: 'refractometer' } }
const setup = {
  ...rearChamberSetup,
  goals: { coral: [] },
  items: [{ id: 'heater', gear: slugOf('rod-a'), state: 'gone' }, meter],
}

/** Everything, however many pieces the catalogue holds. */
async function findAll(body: Record<string, unknown> = {}, limit = 50) {
  const answers = []
  let cursor: string | null = null
  do {
    const sent = { setup, itemId: 'heater', limit, ...body, ...(cursor !== null && { cursor }) }
    const result = replacementsSchema.parse((await post(sent).expect(200)).body)
    answers.push(...result.answers)
    cursor = result.next
  } while (cursor !== null)
  return answers
}

describe('POST /api/v1/replacements', () => {
  it('says what is gone, and judges every other piece of its kind once', async () => {
    const response = await post({ setup, itemId: 'heater', limit: 1 }).expect(200)
    const { gone, counts, total } = replacementsSchema.parse(response.body)
    expect(gone).toMatchObject({ id: 'heater', kind: 'heater', quantity: 1, gear: { slug: slugOf('rod-a') } })
    expect(response.headers['cache-control']).toBe('private, no-store')
    const slugs = (await findAll()).map(({ gear }) => gear?.slug)
    expect(slugs).toEqual(expect.arrayContaining(['rod-b', 'rod-c', 'rod-d'].map(slugOf)))
    expect(slugs).not.toContain(slugOf('rod-a'))
    expect(new Set(slugs).size).toBe(total)
    expect(counts.fits + counts.changes + counts.no + counts.unknown).toBe(total)
  })

  it('pages through the same answers in the same order', async () => {
    const slugs = async (limit: number) => (await findAll({}, limit)).map(({ gear }) => gear?.slug)
    expect(await slugs(1)).toEqual(await slugs(50))
  })

  it('names what a replacement needs beside itself, and what it is not like', async () => {
    const bare = (await findAll()).find(({ gear }) => gear?.slug === slugOf('rod-d'))
    expect(bare).toMatchObject({ verdict: 'changes' })
    expect(bare?.knockOns).toContainEqual(expect.objectContaining({ kind: 'need', subject: 'temperature-control' }))
    const addOn = bare?.addOns.find(({ need }) => need === 'temperature-control')
    expect(addOn?.options.length).toBeGreaterThan(0)
    expect(addOn?.options.every(([first, ...more]) => first?.quantity === 1 && more.length === 0)).toBe(true)
    expect(bare?.differences.map(({ key, from, to, sense }) => [key, from, to, sense])).toEqual([
      ['thermostat', 'built-in', 'external-needed', 'different'],
    ])
  })

  it('answers for an item that is still there as for one that is gone', async () => {
    const [gone, there] = await Promise.all(
      ['gone', 'have'].map(async (state) => {
        const items = [{ id: 'heater', gear: slugOf('rod-a'), state }, meter]
        const { body } = await post({ setup: { ...setup, items }, itemId: 'heater' }).expect(200)
        return replacementsSchema.omit({ next: true }).parse(body)
      }),
    )
    expect(there).toEqual(gone)
  })

  it('answers for the tank, which is no item, by the id tank', async () => {
    const { body } = await post({ setup, itemId: 'tank' }).expect(200)
    expect(replacementsSchema.parse(body).gone).toMatchObject({ id: 'tank', kind: 'tank', gear: null, quantity: 1 })
  })

  it('shows only the answers of one verdict, or those that one check decides', async () => {
    expect((await findAll({ verdict: 'no' })).map(({ verdict }) => verdict)).not.toContain('fits')
    const long = await findAll({ check: 'heater.space' })
    expect(long.map(({ gear }) => gear?.slug)).toContain(slugOf('rod-b'))
    expect(long.every(({ verdict }) => verdict === 'no' || verdict === 'unknown')).toBe(true)
  })

  it.each([
    ['#/itemId', { itemId: 'no-such-item' }],
    ['#/itemId', { itemId: '' }],
    ['#/itemId', { itemId: 7 }],
    ['#/itemId', { itemId: undefined }],
    ['#/limit', { limit: 0 }],
    ['#/limit', { limit: 51 }],
    ['#/limit', { limit: 'many' }],
    ['#/verdict', { verdict: 'perhaps' }],
    ['#/check', { check: 'space' }],
    ['#/cursor', { cursor: 'made-up' }],
    ['#/wish', { wish: 'a pony' }],
    ['#/setup', { setup: undefined }],
    ['#/setup/tank', { setup: { ...setup, tank: {} } }],
    ['#/setup/items/0/gear', { setup: { ...setup, items: [{ id: 'heater', gear: 'no-such-heater' }] } }],
    [
      '#/setup/tank/chambers/0/lengthMm',
      { setup: { ...setup, tank: { ...setup.tank, chambers: [{ id: 'a', lengthMm: 900 }] } } },
    ],
  ])('names what is wrong at %s', async (pointer, body) => {
    expect(listPointers(expectProblem(await post({ setup, itemId: 'heater', ...body }), 422))).toEqual([pointer])
  })

  it('names an unknown item and an unknown slug in one answer', async () => {
    const body = { setup: { ...setup, items: [{ id: 'heater', gear: 'nothing' }] }, itemId: 'other' }
    expect(listPointers(expectProblem(await post(body), 422))).toEqual(['#/itemId', '#/setup/items/0/gear'])
  })

  it('refuses the cursor of another question', async () => {
    const { next } = replacementsSchema.parse((await post({ setup, itemId: 'heater', limit: 1 })).body)
    expect(next).not.toBeNull()
    const other = await post({ setup, itemId: 'meter', limit: 1, cursor: next })
    expect(listPointers(expectProblem(other, 422))).toEqual(['#/cursor'])
  })

  it.each([[null], ['text'], [42], [[]], [{}]])('answers 422 to the body %j', async (body) => {
    const response = await request(app.url).post('/api/v1/replacements').type('json').send(JSON.stringify(body))
    expect(listPointers(expectProblem(response, 422)).length).toBeGreaterThan(0)
  })

  it('answers 400 to what is no JSON, 415 to another type, and 405 to another method', async () => {
    const url = '/api/v1/replacements'
    expectProblem(await request(app.url).post(url).type('json').send('{'), 400)
    expectProblem(await request(app.url).post(url).type('form').send('a=1'), 415)
    expect((await request(app.url).get(url)).status).toBe(405)
  })
})
