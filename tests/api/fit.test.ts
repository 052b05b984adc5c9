import request from 'supertest'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { answerSchema, fitResultSchema, reportSchema } from '../../shared/schemas/answer'
import { addRevision, importPieces } from '../../server/modules/gear/gear-writes.service'
import { startApp, type TestApp } from '../support/app'
import { expectProblem, listPointers } from './problems'
import { addHeaters, describePiece, describeRevision, rearChamberSetup as setup, wholeHeater } from './records'

let app: TestApp

beforeAll(async () => {
  app = await startApp()
  await addHeaters(app.client.db)
  const tank = { outerLengthMm: 600, outerWidthMm: 400, outerHeightMm: 400, wallMm: 8 }
  await importPieces(app.client.db, [describePiece('Tank', tank, { kind: 'tank' })])
})

afterAll(() => app.stop())

const post = (path: string, body: unknown) =>
  request(app.url)
    .post(`/api/v1${path}`)
    .send(body as object)
const slugOf = (letter: string) => `quillmoor-testworks-${letter}`

/** Everything, however many pieces the catalogue holds. */
async function findAll(body: Record<string, unknown>) {
  const answers = []
  let cursor: string | null = null
  do {
    const sent: Record<string, unknown> = {
      setup,
      kind: 'heater',
      limit: 50,
      ...body,
      ...(cursor !== null && { cursor }),
    }
    const result = fitResultSchema.parse((await post('/fit', sent).expect(200)).body)
    answers.push(...result.answers)
    cursor = result.next
  } while (cursor !== null)
  return answers
}

describe('POST /api/v1/fit', () => {
  it('judges every piece of the kind once, over all pages', async () => {
    const answers = await findAll({})
    const slugs = answers.map(({ gear }) => gear?.slug)
    expect(new Set(slugs).size).toBe(slugs.length)
    expect(slugs).toEqual(expect.arrayContaining(['rod-a', 'rod-b', 'rod-c'].map(slugOf)))
    const { total } = fitResultSchema.parse((await post('/fit', { setup, kind: 'heater' })).body)
    expect(slugs).toHaveLength(total)
  })

  it('says no to a rod longer than its chamber, and why, and does not know without the power', async () => {
    const answers = await findAll({})
    const long = answers.find(({ gear }) => gear?.slug === slugOf('rod-b'))
    expect(long?.verdict).toBe('no')
    expect(long?.checks.find(({ id }) => id === 'heater.space')?.outcome).toBe('fail')
    const unknown = answers.find(({ gear }) => gear?.slug === slugOf('rod-c'))
    expect(unknown?.verdict).toBe('unknown')
    expect(unknown?.checks.find(({ id }) => id === 'heater.power')?.missing).toContain('powerW')
  })

  it('says with which one number of the setup changed a piece would fit, and keeps that word', async () => {
    const check = async (asked: object) =>
      answerSchema.parse((await post('/fit/check', { setup: asked, piece: rod }).expect(200)).body)
    const rod = { kind: 'heater', specs: { ...wholeHeater, lengthMm: 310, orientation: 'vertical' } }
    const { chambers, ...tank } = { ...setup.tank, outerHeightMm: 500 }
    const deep = (waterDepthMm: number) => ({
      ...setup,
      tank: { ...tank, chambers: [{ ...chambers[0], waterDepthMm }] },
    })
    const { verdict, turnsBy } = await check(deep(290))
    expect(verdict).toBe('no')
    expect(turnsBy).toMatchObject({ path: 'tank.chambers.0.waterDepthMm', from: 290, unit: 'mm' })
    expect((await check(deep(turnsBy?.to ?? 0))).verdict).toBe(turnsBy?.verdict)
    expect((await check(deep(309))).verdict).toBe('no')
  })

  it('keeps to one verdict, or to those that one check fails, and counts over all', async () => {
    const all = await findAll({})
    const no = await findAll({ verdict: 'no' })
    expect(no).toHaveLength(all.filter(({ verdict }) => verdict === 'no').length)
    expect(no.every(({ verdict }) => verdict === 'no')).toBe(true)
    const tooLong = await findAll({ check: 'heater.space' })
    expect(tooLong.map(({ gear }) => gear?.slug)).toContain(slugOf('rod-b'))
    const outcomes = tooLong.map(({ checks }) => checks.find(({ id }) => id === 'heater.space')?.outcome)
    expect(new Set(outcomes)).toEqual(new Set(['fail', 'nodata']))
  })

  it('keeps to those that one missing attribute leaves unjudged, as many as it counts', async () => {
    const { missingBy } = fitResultSchema.parse((await post('/fit', { setup, kind: 'heater' }).expect(200)).body)
    const { key = '', count } = missingBy.find((each) => each.key === 'powerW') ?? {}
    const unjudged = await findAll({ missing: key })
    expect(unjudged).toHaveLength(count ?? NaN)
    expect(unjudged.map(({ gear }) => gear?.slug)).toContain(slugOf('rod-c'))
    for (const { verdict, specs } of unjudged) {
      expect(verdict).toBe('unknown')
      expect(specs).not.toHaveProperty(key)
    }
    const response = await post('/fit', { setup, kind: 'heater', missing: 'shininess' })
    expect(listPointers(expectProblem(response, 422))).toEqual(['#/missing'])
  })

  it('keeps to what was asked for, and takes nothing unknown for a match', async () => {
    const slugs = async (filters: object) => (await findAll({ filters })).map(({ gear }) => gear?.slug)
    const exact = await slugs({ lengthMm: [220, 220], powerW: [150, null], form: 'titanium-rod', volts: '120' })
    expect(exact).toContain(slugOf('rod-a'))
    expect(exact).not.toContain(slugOf('rod-b'))
    expect(exact).not.toContain(slugOf('rod-c'))
    expect(await slugs({ lengthMm: [600, null] })).toContain(slugOf('rod-b'))
    expect(await slugs({ powerW: [null, 149.9] })).not.toContain(slugOf('rod-a'))
    expect(await slugs({})).toHaveLength((await findAll({})).length)
  })

  it('names every filter that the kind cannot answer', async () => {
    const filters = { lengthMm: [300, 200], powerW: 'much', form: 'brick', colour: 'red', volts: true, diameterMm: [1] }
    const known = { lengthMm: [300, 200], powerW: 'much', form: 'brick', colour: 'red', volts: true }
    const malformed = await post('/fit', { setup, kind: 'heater', filters })
    expect(listPointers(expectProblem(malformed, 422))).toContain('#/filters/diameterMm')
    const response = await post('/fit', { setup, kind: 'heater', filters: known })
    expect(listPointers(expectProblem(response, 422))).toEqual(
      Object.keys(known)
        .sort()
        .map((key) => `#/filters/${key}`),
    )
  })

  it('gives the scales and a mark for every candidate only when asked', async () => {
    const plain = fitResultSchema.parse((await post('/fit', { setup, kind: 'heater' })).body)
    expect(plain.marks).toBeUndefined()
    const body = (await post('/fit', { setup, kind: 'heater', scales: true }).expect(200)).body as unknown
    const withScales = fitResultSchema.parse(body)
    expect(withScales.marks?.length).toBe(plain.total)
    expect(withScales.scales?.length).toBeGreaterThan(0)
  })

  it('names each default that it used', async () => {
    const { assumptions } = fitResultSchema.parse((await post('/fit', { setup, kind: 'heater' })).body)
    expect(assumptions.map(({ key }) => key)).toEqual(expect.arrayContaining(['room.coldestC', 'tank.wallMm']))
  })

  it('speaks the units of the setup', async () => {
    const say = async (units: string) => {
      const body = { setup: { ...setup, units }, piece: { gear: slugOf('rod-a') } }
      const answer = answerSchema.parse((await post('/fit/check', body).expect(200)).body)
      return answer.checks.map(({ message }) => message).join(' ')
    }
    expect(await say('us')).toMatch(/\u00a0(in|°F)\b/)
    expect(await say('metric')).toMatch(/\u00a0(mm|°C)\b/)
    expect(await say('metric')).not.toMatch(/\u00a0(in|°F)\b/)
  })

  it('takes a tank from the catalogue, with its own figures before the entry’s', async () => {
    const reported = async (tank: object) => {
      const response = await post('/fit', { setup: { tank }, kind: 'heater', limit: 1 }).expect(200)
      return fitResultSchema.parse(response.body).assumptions.map(({ key }) => key)
    }
    expect(await reported({ gear: slugOf('tank') })).not.toContain('tank.wallMm')
    expect(await reported({ outerLengthMm: 600, outerWidthMm: 400, outerHeightMm: 400 })).toContain('tank.wallMm')
    expect(await reported({ volumeL: 75 })).toContain('tank.outerLengthMm')
    await post('/fit', { setup: { tank: { gear: slugOf('tank'), wallMm: 6 } }, kind: 'heater' }).expect(200)
    const absurd = await post('/fit', {
      setup: { tank: { gear: slugOf('tank'), wallMm: 80, outerWidthMm: 150 } },
      kind: 'heater',
    })
    expect(listPointers(expectProblem(absurd, 422))).toContain('#/setup/tank/wallMm')
  })

  it('names every wrong field of a request in one answer', async () => {
    const response = await post('/fit', {
      setup: {
        units: 'furlongs',
        colour: 'blue',
        tank: { outerLengthMm: -5, wallMm: '8', chambers: [{ id: 'rear', lengthMm: 1e9 }], glassy: true },
        room: { coldestC: 999, draughty: 1 },
        mains: { volts: 9000 },
        goals: { coral: ['soft', 'soft'], turnoverPerHour: [9, 3] },
        items: [{ id: 'a b', kind: 'heater', specs: { powerW: -1, colour: 'red' }, quantity: 0 }, { id: 'x' }],
      },
      kind: 'spoon',
      limit: 51,
      verdict: 'perhaps',
      wish: 'a pony',
    })
    expect(listPointers(expectProblem(response, 422))).toEqual([
      '#/kind',
      '#/limit',
      '#/setup/colour',
      '#/setup/goals/coral',
      '#/setup/goals/turnoverPerHour',
      '#/setup/items/0/id',
      '#/setup/items/0/quantity',
      '#/setup/items/0/specs/colour',
      '#/setup/items/0/specs/powerW',
      '#/setup/items/1/gear',
      '#/setup/mains/volts',
      '#/setup/room/coldestC',
      '#/setup/room/draughty',
      '#/setup/tank/chambers/0/lengthMm',
      '#/setup/tank/glassy',
      '#/setup/tank/outerLengthMm',
      '#/setup/tank/wallMm',
      '#/setup/units',
      '#/verdict',
      '#/wish',
    ])
  })

  it('refuses a tank among the items, typed or by its slug: the tank is the setup’s own', async () => {
    const items = [
      { id: 'a', gear: slugOf('rod-a') },
      { id: 'b', kind: 'tank', specs: { outerLengthMm: 600 } },
      { id: 'c', gear: slugOf('tank') },
    ]
    const pointers = ['#/setup/items/1/kind', '#/setup/items/2/kind']
    for (const [path, more] of [
      ['/setups/report', {}],
      ['/fit', { kind: 'heater' }],
      ['/fit/check', { piece: { gear: slugOf('rod-a') } }],
      ['/replacements', { itemId: 'a' }],
    ] as const)
      expect(listPointers(expectProblem(await post(path, { setup: { ...setup, items }, ...more }), 422))).toEqual(
        pointers,
      )
  })

  it('names every unknown slug at its place', async () => {
    const items = [
      { id: 'a', gear: 'no-such-heater' },
      { id: 'b', kind: 'net', gear: slugOf('rod-a') },
      { id: 'b', gear: slugOf('rod-a') },
    ]
    const twice = await post('/setups/report', { setup: { ...setup, items } })
    expect(listPointers(expectProblem(twice, 422))).toEqual(['#/setup/items/0/gear', '#/setup/items/2/id'])
    const body = { setup: { tank: { gear: slugOf('rod-a') }, items: items.slice(0, 2) }, piece: { gear: 'nothing' } }
    expect(listPointers(expectProblem(await post('/fit/check', body), 422))).toEqual([
      '#/piece/gear',
      '#/setup/items/0/gear',
      '#/setup/items/1/kind',
      '#/setup/tank/gear',
    ])
  })

  it.each([
    [
      'walls that meet',
      { outerLengthMm: 600, outerWidthMm: 150, outerHeightMm: 400, wallMm: 75 },
      '#/setup/tank/wallMm',
    ],
    ['no size at all', {}, '#/setup/tank'],
    ['one size of three', { outerLengthMm: 600 }, '#/setup/tank'],
  ])('refuses a tank with %s', async (_, tank, pointer) => {
    expect(listPointers(expectProblem(await post('/fit', { setup: { tank }, kind: 'heater' }), 422))).toContain(pointer)
  })

  it('refuses a chamber that is longer than its tank, at that chamber', async () => {
    const tank = { ...setup.tank, chambers: [{ id: 'rear', lengthMm: 900, widthMm: 127, waterDepthMm: 300 }] }
    const pointers = listPointers(expectProblem(await post('/fit', { setup: { tank }, kind: 'heater' }), 422))
    expect(pointers).toEqual(['#/setup/tank/chambers/0/lengthMm'])
  })

  it.each([
    [null],
    ['text'],
    [42],
    [[]],
    [{}],
    [{ setup: null, kind: 'heater' }],
    [{ setup: { tank: [] }, kind: 'heater' }],
  ])('answers 422 to the body %j', async (body) => {
    const response = await request(app.url).post('/api/v1/fit').type('json').send(JSON.stringify(body))
    expect(listPointers(expectProblem(response, 422)).length).toBeGreaterThan(0)
  })

  it('refuses forged cursors, and those of another question', async () => {
    const first = fitResultSchema.parse((await post('/fit', { setup, kind: 'heater', limit: 1 })).body)
    const payload = Buffer.from('{"offset":-1}').toString('base64url')
    for (const cursor of ['x', `${payload}.AAAAAAAAAAAA`, `${first.next}a`, '']) {
      const response = await post('/fit', { setup, kind: 'heater', limit: 1, cursor })
      expect(listPointers(expectProblem(response, 422))).toEqual(['#/cursor'])
    }
    const other = await post('/fit', { setup: { tank: { volumeL: 90 } }, kind: 'heater', limit: 1, cursor: first.next })
    expect(listPointers(expectProblem(other, 422))).toEqual(['#/cursor'])
  })

  it('sees a new revision within a few seconds', async () => {
    await addRevision(app.client.db, slugOf('rod-c'), describeRevision({ powerW: 150 }))
    const verdict = async () => {
      const response = await post('/fit/check', { setup, piece: { gear: slugOf('rod-c') } }).expect(200)
      return answerSchema.parse(response.body).verdict
    }
    await expect.poll(verdict, { timeout: 5000, interval: 200 }).not.toBe('unknown')
  })
})

describe('POST /api/v1/fit/check', () => {
  it('judges specs that somebody typed as it judges the same piece of the catalogue', async () => {
    const sourced = Object.fromEntries(
      Object.entries(wholeHeater).map(([key, value]) => [key, { value, source: 'measured' }]),
    )
    const typed = await post('/fit/check', { setup, piece: { kind: 'heater', specs: sourced } }).expect(200)
    const known = await post('/fit/check', { setup, piece: { gear: slugOf('rod-a') } }).expect(200)
    const [fromTyped, fromKnown] = [answerSchema.parse(typed.body), answerSchema.parse(known.body)]
    expect(fromTyped.gear).toBeNull()
    expect(fromKnown.gear?.slug).toBe(slugOf('rod-a'))
    expect(fromTyped.checks).toEqual(fromKnown.checks)
    expect(fromTyped.verdict).toBe(fromKnown.verdict)
  })

  it('counts bare specs as the maker’s word', async () => {
    const answer = await post('/fit/check', { setup, piece: { kind: 'heater', specs: wholeHeater } }).expect(200)
    expect(answerSchema.parse(answer.body).specs.powerW).toEqual({ value: 150, source: 'maker' })
  })

  it('puts a piece where it is told to', async () => {
    const answer = await post('/fit/check', {
      setup,
      piece: { gear: slugOf('rod-b') },
      place: { in: 'display' },
      quantity: 2,
      beside: true,
    }).expect(200)
    expect(answerSchema.parse(answer.body).checks.length).toBeGreaterThan(0)
  })

  it.each([
    ['#/piece/gear', { piece: {} }],
    ['#/piece/kind', { piece: { specs: {} } }],
    ['#/piece/specs', { piece: { gear: 'quillmoor-testworks-rod-a', specs: {} } }],
    ['#/piece/specs/lengthMm', { piece: { kind: 'heater', specs: { lengthMm: -1 } } }],
    [
      '#/piece/specs/lengthMm/plusMinus',
      { piece: { kind: 'heater', specs: { lengthMm: { value: 200, source: 'maker', plusMinus: -1 } } } },
    ],
    [
      '#/piece/specs/lengthMm/source',
      { piece: { kind: 'heater', specs: { lengthMm: { value: 200, source: 'hearsay' } } } },
    ],
    [
      '#/piece/specs/flowCurve/1/flowLph',
      {
        piece: {
          kind: 'return-pump',
          specs: {
            flowCurve: [
              { headM: 0, flowLph: 500 },
              { headM: 2, flowLph: 900 },
            ],
          },
        },
      },
    ],
    ['#/quantity', { piece: { gear: 'quillmoor-testworks-rod-a' }, quantity: 1.5 }],
    ['#/place', { piece: { gear: 'quillmoor-testworks-rod-a' }, place: { in: 'attic' } }],
    ['#/instead/0', { piece: { gear: 'quillmoor-testworks-rod-a' }, instead: ['nothing'] }],
    ['#/beside', { piece: { gear: 'quillmoor-testworks-rod-a' }, beside: 'yes' }],
  ])('names what is wrong at %s', async (pointer, body) => {
    expect(listPointers(expectProblem(await post('/fit/check', { setup, ...body }), 422))).toEqual([pointer])
  })

  it('refuses a place in a chamber that the tank does not have', async () => {
    const body = { setup, piece: { gear: slugOf('rod-a') }, place: { chamber: 'cellar' } }
    expect(listPointers(expectProblem(await post('/fit/check', body), 422))).toEqual(['#/place/chamber'])
  })
})

describe('POST /api/v1/setups/report', () => {
  const items = [
    { id: 'heater', gear: slugOf('rod-a') },
    { id: 'strip', kind: 'power-strip', specs: { outlets: 6, ratedA: 15, ratedV: 120, plugs: 1, volts: [120] } },
  ]

  it('reports on every item, what is needed and what is missing', async () => {
    const response = await post('/setups/report', { setup: { ...setup, items } }).expect(200)
    const report = reportSchema.parse(response.body)
    expect(report.items.map(({ id }) => id)).toEqual(['heater', 'strip'])
    expect(report.missing.length).toBeGreaterThan(0)
    expect(response.headers['cache-control']).toBe('private, no-store')
  })

  it('reports on a setup with a tank alone', async () => {
    const report = reportSchema.parse((await post('/setups/report', { setup: { tank: { volumeL: 75 } } })).body)
    expect(report.items).toEqual([])
  })
})
