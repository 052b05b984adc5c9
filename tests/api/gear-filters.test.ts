import request from 'supertest'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { importPieces } from '../../server/modules/gear/gear-writes.service'
import { gearListSchema, type Facet, type GearList } from '../../shared/schemas/gear'
import { startApp, type TestApp } from '../support/app'
import { expectProblem, listPointers } from './problems'
import { describePiece, testBrand, wholeHeater } from './records'

let app: TestApp

const { lengthMm: _, ...lengthless } = wholeHeater

beforeAll(async () => {
  app = await startApp()
  await importPieces(app.client.db, [
    describePiece('Row A', { ...wholeHeater, powerW: 50, lengthMm: 200, form: 'glass-rod' }),
    describePiece('Row B', { ...wholeHeater, powerW: 100, lengthMm: 240, form: 'glass-rod', volts: [120, 230] }),
    describePiece('Row C', { ...wholeHeater, powerW: 150, lengthMm: 254, form: 'titanium-rod' }),
    describePiece('Row D', { ...lengthless, powerW: 200, form: 'titanium-rod' }, { status: 'discontinued' }),
    describePiece('Row E', { powerW: 300, form: 'polymer-rod' }),
    describePiece('Wet pump', { powerW: 100, submersible: true }, { kind: 'return-pump' }),
    describePiece('Dry pump', { powerW: 120, submersible: false }, { kind: 'return-pump' }),
  ])
})

afterAll(() => app.stop())

const ask = (query: Record<string, string>) => request(app.url).get('/api/v1/gear').query(query)

async function list(query: Record<string, string>, kind = 'heater'): Promise<GearList> {
  const response = await ask({ kind, brand: testBrand, ...query }).expect(200)
  return gearListSchema.strict().parse(response.body)
}

const modelsOf = ({ items }: GearList) => items.map(({ model }) => model)

function countsOf(facet: Facet | undefined): Record<string, number> {
  if (facet?.type !== 'options') throw new Error('These are no options.')
  return Object.fromEntries(facet.counts.map(({ value, count }) => [String(value), count]))
}

describe('narrowing the list of a kind', () => {
  it.each([
    ['powerW', '100..200', ['Row B', 'Row C', 'Row D']],
    ['powerW', '150..', ['Row C', 'Row D', 'Row E']],
    ['powerW', '..100', ['Row A', 'Row B']],
    ['powerW', '100', ['Row B']],
    ['lengthMm', 'unknown', ['Row D', 'Row E']],
    ['lengthMm', '..1000', ['Row A', 'Row B', 'Row C']],
    ['form', 'glass-rod', ['Row A', 'Row B']],
    ['form', 'glass-rod,polymer-rod', ['Row A', 'Row B', 'Row E']],
    ['volts', '230', ['Row B']],
    ['volts', 'unknown', ['Row E']],
    ['status', 'discontinued', ['Row D']],
  ])('keeps to %s=%s', async (key, value, models) => {
    expect(modelsOf(await list({ [key]: value }))).toEqual(models)
  })

  it('keeps to yes and no', async () => {
    expect(modelsOf(await list({ submersible: 'true' }, 'return-pump'))).toEqual(['Wet pump'])
    expect(modelsOf(await list({ submersible: 'false' }, 'return-pump'))).toEqual(['Dry pump'])
  })

  it('joins filters, a text and an order', async () => {
    const both = await list({ powerW: '50..200', form: 'titanium-rod,glass-rod', q: 'row', sort: '-powerW' })
    expect(modelsOf(both)).toEqual(['Row D', 'Row C', 'Row B', 'Row A'])
    expect(both.total).toBe(4)
  })

  it('reads brands whatever their case, accents and spaces', async () => {
    expect((await list({ brand: 'QUILLMOOR  téstworks' })).total).toBe(5)
  })

  it.each([
    ['lengthMm', ['Row A', 'Row B', 'Row C', 'Row D', 'Row E']],
    ['-lengthMm', ['Row C', 'Row B', 'Row A', 'Row D', 'Row E']],
    ['-name', ['Row E', 'Row D', 'Row C', 'Row B', 'Row A']],
    ['updated', ['Row A', 'Row B', 'Row C', 'Row D', 'Row E']],
  ])('orders by %s, what nobody knows last', async (sort, models) => {
    expect(modelsOf(await list({ sort }))).toEqual(models)
  })

  it('pages through an order of its own', async () => {
    const first = await list({ sort: '-powerW', limit: '3' })
    const second = await list({ sort: '-powerW', limit: '3', cursor: first.next ?? '' })
    expect([...modelsOf(first), ...modelsOf(second)]).toEqual(['Row E', 'Row D', 'Row C', 'Row B', 'Row A'])
    expect(second.next).toBeNull()
    const other = await ask({ kind: 'heater', brand: testBrand, sort: 'powerW', limit: '3', cursor: first.next ?? '' })
    expect(listPointers(expectProblem(other, 422))).toEqual(['#/cursor'])
  })
})

describe('facets', () => {
  it('count each value, how many are known, and the ends of numbers', async () => {
    const { facets } = await list({})
    expect(facets.powerW).toEqual({
      type: 'measure',
      label: 'power',
      unit: 'W',
      min: 50,
      max: 300,
      known: 5,
      unknown: 0,
    })
    expect(facets.lengthMm).toMatchObject({ min: 200, max: 254, known: 3, unknown: 2 })
    expect(countsOf(facets.form)).toMatchObject({ 'glass-rod': 2, 'titanium-rod': 2, 'polymer-rod': 1, inline: 0 })
    expect(countsOf(facets.volts)).toEqual({ 100: 0, 120: 4, 230: 1 })
    expect(countsOf(facets.status)).toEqual({ current: 4, discontinued: 1, unknown: 0 })
  })

  it('leave their own filter aside and keep to the others', async () => {
    const { facets, total } = await list({ form: 'glass-rod', powerW: '100..' })
    expect(total).toBe(1)
    expect(countsOf(facets.form)).toMatchObject({ 'glass-rod': 1, 'titanium-rod': 2, 'polymer-rod': 1 })
    expect(facets.powerW).toMatchObject({ min: 50, max: 100, known: 2 })
    expect(countsOf(facets.status)).toEqual({ current: 1, discontinued: 0, unknown: 0 })
  })

  it('tell the kinds apart where none is chosen', async () => {
    const response = await ask({ brand: testBrand }).expect(200)
    const { facets, total } = gearListSchema.parse(response.body)
    expect(total).toBe(7)
    expect(countsOf(facets.kind)).toMatchObject({ heater: 5, 'return-pump': 2, net: 0 })
    expect(facets.powerW).toBeUndefined()
  })

  it('add up to the whole where nothing narrows the list', async () => {
    const { total, facets } = gearListSchema.parse((await ask({ kind: 'tank' }).expect(200)).body)
    const statuses = Object.values(countsOf(facets.status)).reduce((sum, count) => sum + count, 0)
    expect(statuses).toBe(total)
    const volume = facets.nominalVolumeL
    expect(volume?.type === 'measure' && volume.known + volume.unknown).toBe(total)
  })
})

describe('filters that cannot be answered', () => {
  it('are named all at once, with what the kind does have', async () => {
    const response = await ask({
      kind: 'heater',
      colour: 'red',
      flowLph: '5',
      powerW: 'lots',
      form: 'wood',
      volts: '12',
    })
    const problem = expectProblem(response, 422)
    expect(listPointers(problem)).toEqual(['#/colour', '#/flowLph', '#/form', '#/powerW', '#/volts'])
    expect(problem.errors?.find(({ pointer }) => pointer === '#/colour')?.detail).toMatch(/lengthMm.*powerW/)
    expect(problem.errors?.find(({ pointer }) => pointer === '#/form')?.detail).toContain('titanium-rod')
  })

  it('say that a kind is needed', async () => {
    const problem = expectProblem(await ask({ powerW: '100' }), 422)
    expect(problem.errors?.[0]?.detail).toContain('without a kind')
  })

  it.each(['', '..', '1..2..3', 'NaN', '1e3', '-', '5..1', "1' or '1'='1", '__proto__', '9'.repeat(400)])(
    'refuse powerW=%.20s',
    async (powerW) => {
      expect(listPointers(expectProblem(await ask({ kind: 'heater', powerW }), 422))).toEqual(['#/powerW'])
    },
  )

  it('refuse the names of every object', async () => {
    for (const key of ['__proto__', 'constructor', 'toString']) {
      expectProblem(await request(app.url).get(`/api/v1/gear?kind=heater&${key}=1`), 422)
    }
  })

  it.each(['colour', 'form', '--powerW', 'relevance', 'powerW;--'])('refuse to sort by %s', async (sort) => {
    expect(listPointers(expectProblem(await ask({ kind: 'heater', sort }), 422))).toEqual(['#/sort'])
  })
})

describe('filters that leave nothing', () => {
  it('say which one to loosen, and how many there would be', async () => {
    const empty = await list({ form: 'polymer-rod', powerW: '..200', status: 'current' })
    expect(empty).toMatchObject({ items: [], total: 0, next: null })
    // Polymer: E alone, of 300 W. Up to 200 W and in production: A, B and C. Of the kind without the brand: the demo data's.
    const loosen = Object.fromEntries(empty.loosen.map(({ key, total }) => [key, total]))
    expect(loosen).toMatchObject({ form: 3, powerW: 1, status: 0 })
    expect(empty.loosen.map(({ total }) => total)).toEqual(empty.loosen.map(({ total }) => total).sort((a, b) => b - a))
    expect(empty.hint).toContain(`Without ${empty.loosen[0]?.key}`)
  })

  it('say so of a brand that is not there', async () => {
    const empty = await list({ brand: 'No such makers' })
    expect(empty.loosen[0]?.key).toBe('brand')
    expect(empty.loosen[0]?.total).toBeGreaterThan(50)
  })

  it('have nothing to loosen where something is left', async () => {
    expect((await list({ form: 'glass-rod' })).loosen).toEqual([])
  })
})
