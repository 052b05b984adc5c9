import request from 'supertest'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { worksheets } from '../../shared/engine/worksheets/registry'
import { workingSchema, worksheetListSchema } from '../../shared/schemas/worksheets'
import { expectWithinShare } from '../standards/within'
import { startApp, type TestApp } from '../support/app'
import { expectProblem, listPointers } from './problems'

let app: TestApp

beforeAll(async () => {
  app = await startApp()
})

afterAll(() => app.stop())

const post = (name: string, body: unknown) =>
  request(app.url)
    .post(`/api/v1/worksheets/${name}`)
    .send(body as object)

describe('GET /api/v1/worksheets', () => {
  it('lists every worksheet with what it is sent and what comes out', async () => {
    const { body, headers } = await request(app.url).get('/api/v1/worksheets').expect(200)
    const { items } = worksheetListSchema.strict().parse(body)
    expect(items.map(({ name }) => name).sort()).toEqual([
      'filled-weight',
      'heat-balance',
      'light-map',
      'membrane',
      'power-load',
      'pump-point',
      'rod-in-chamber',
      'salt-mix',
      'sand-bed',
      'seawater',
    ])
    const seawater = items.find(({ name }) => name === 'seawater')
    expect(seawater?.inputs).toMatchObject({ type: 'object', required: ['salinityPpt', 'temperatureC'] })
    expect(seawater?.results).toContainEqual({ key: 'densityKgM3', label: expect.any(String), unit: 'kg/m3' })
    await request(app.url)
      .get('/api/v1/worksheets')
      .set('If-None-Match', headers.etag ?? '')
      .expect(304)
  })
})

describe('POST /api/v1/worksheets/:name', () => {
  it.each(worksheets.map(({ name, example, results }) => [name, example, results.map(({ key }) => key)] as const))(
    'works %s out on its own example',
    async (name, example, keys) => {
      const { body, headers } = await post(name, example).expect(200)
      const { result, steps } = workingSchema.strict().parse(body)
      expect(headers['cache-control']).toContain('no-store')
      for (const key of keys) expect(result).toHaveProperty(key)
      expect(steps.length).toBeGreaterThan(1)
    },
  )

  it('gives the density of UNESCO 44', async () => {
    // Fofonoff & Millard 1983, UNESCO Technical Papers in Marine Science 44, p. 19.
    const { body } = await post('seawater', { salinityPpt: 35, temperatureC: 25 }).expect(200)
    expectWithinShare(body.result.densityKgM3, 1023.34306, 1e-8)
    expect(body.basis).toMatchObject({ type: 'standard', source: expect.stringContaining('UNESCO') })
  })

  it('takes a tank by its slug, values with their source, and says words in the units asked for', async () => {
    const { body } = await post('heat-balance', {
      tank: { outerLengthMm: { value: 610, source: 'measured', plusMinus: 1 }, outerWidthMm: 406, outerHeightMm: 406 },
      room: { coldestC: 16 },
      heaterW: 20,
      units: 'us',
    }).expect(200)
    expect(body.cautions.join(' ')).toMatch(/cannot hold 78\s°F with the room at 61\s°F/)
    const gear = await request(app.url).get('/api/v1/gear?kind=tank&limit=1').expect(200)
    const { slug } = gear.body.items[0] as { slug: string }
    const found = await post('filled-weight', { tank: { gear: slug } }).expect(200)
    expect(found.body.result.totalKg).toBeGreaterThan(10)
  })

  it('answers 404 to a name that is none, and says which there are', async () => {
    const problem = expectProblem(await post('tea-leaves', {}), 404)
    expect(problem.detail).toContain('heat-balance')
  })

  it('names every wrong field at once', async () => {
    const wrong = await post('membrane', { membraneLpd: 'much', testPressureKPa: 345, testTempC: 25, colour: 'red' })
    expect(listPointers(expectProblem(wrong, 422))).toEqual([
      '#/colour',
      '#/feedKPa',
      '#/feedTdsPpm',
      '#/feedTempC',
      '#/membraneLpd',
      '#/rejectionFraction',
      '#/wasteRatio',
    ])
    const nested = { tank: { wallMm: -1 }, room: { coldestC: 'cold' }, heaterW: 1e9 }
    expect(listPointers(expectProblem(await post('heat-balance', nested), 422))).toEqual([
      '#/heaterW',
      '#/room/coldestC',
      '#/tank/wallMm',
    ])
    const curve = {
      flowCurve: [{ flowLph: 1 }, { flowLph: 2, headM: 'x' }],
      staticHeadM: 1,
      boreMm: 20,
      pipeLengthM: 1,
    }
    expect(listPointers(expectProblem(await post('pump-point', curve), 422))).toEqual([
      '#/flowCurve/0/headM',
      '#/flowCurve/1/headM',
    ])
  })

  it('names what contradicts itself, under the worksheet’s own names', async () => {
    const size = { outerLengthMm: 610, outerWidthMm: 406, outerHeightMm: 406 }
    const thick = await post('heat-balance', {
      tank: { ...size, wallMm: 60 },
      room: { coldestC: 30, temperatureC: 20 },
    })
    expect(listPointers(expectProblem(thick, 422))).toEqual(['#/room/coldestC'])
    const deep = await post('filled-weight', { tank: size, sandDepthMm: 400 })
    expect(listPointers(expectProblem(deep, 422))).toEqual(['#/sandDepthMm'])
    expect(listPointers(expectProblem(await post('heat-balance', { tank: {} }), 422))).toEqual(['#/tank'])
    const dry = { lengthMm: 250, diameterMm: 24, minImmersionMm: 300 }
    const chamber = { lengthMm: 100, widthMm: 120, waterDepthMm: 300 }
    expect(listPointers(expectProblem(await post('rod-in-chamber', { ...dry, chamber }), 422))).toEqual([
      '#/minImmersionMm',
    ])
    const membrane = worksheets.find(({ name }) => name === 'membrane')?.example
    const weak = await post('membrane', { ...membrane, testPressureKPa: 60, testTdsPpm: 2000 })
    expect(listPointers(expectProblem(weak, 422))).toEqual(['#/testPressureKPa'])
    const flowCurve = [
      { flowLph: 0, headM: 1 },
      { flowLph: 1600, headM: 2 },
    ]
    const rising = await post('pump-point', { flowCurve, staticHeadM: 0.9, boreMm: 16, pipeLengthM: 1.8 })
    expect(listPointers(expectProblem(rising, 422))).toEqual(['#/flowCurve/1/flowLph'])
    const named = await post('filled-weight', { tank: { gear: 'no-such-tank' } })
    expect(listPointers(expectProblem(named, 422))).toEqual(['#/tank/gear'])
  })

  it.each([[null], [[]], ['text'], [7], [{ tank: null }], [{ items: [] }], [{ units: 'furlongs' }]])(
    'answers 422 to %j on every worksheet',
    async (body) => {
      for (const { name } of worksheets)
        expectProblem(
          await request(app.url)
            .post(`/api/v1/worksheets/${name}`)
            .set('content-type', 'application/json')
            .send(JSON.stringify(body)),
          422,
        )
    },
  )

  it('refuses broken JSON, another media type and another method', async () => {
    const url = '/api/v1/worksheets/seawater'
    expectProblem(await request(app.url).post(url).set('content-type', 'application/json').send('{"a":'), 400)
    expectProblem(await request(app.url).post(url).set('content-type', 'text/plain').send('hi'), 415)
    expectProblem(await request(app.url).get(url), 405)
  })
})
