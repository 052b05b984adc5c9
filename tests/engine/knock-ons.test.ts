import { describe, expect, it } from 'vitest'
import { assess } from '#shared/engine/assess'
import { fit, fitCheck } from '#shared/engine/fit'
import { diff } from '#shared/engine/knock-ons'
import { report } from '#shared/engine/report'
import { replacements } from '#shared/engine/swap/replacements'
import type { KnockOn, Setup } from '#shared/engine/types'
import { heater, item, piece, roUnit, tankValues, toPlain, wholeSetup } from './build'
import { catalogueOf } from './demo-catalogue'

type Values = Readonly<Record<string, unknown>>

const strip = (values: Values = {}) =>
  piece('power-strip', { outlets: 2, ratedA: 15, ratedV: 125, volts: [120], plugType: 'A/B', ...values })
const pump = (values: Values = {}) =>
  piece('wavemaker', { powerW: 10, plugs: 1, volts: [120], plugType: 'A/B', ...values })
const keeper = (values: Values = {}) =>
  piece('temperature-controller', {
    maxLoadW: 150,
    outlets: 2,
    rangeMinC: 10,
    rangeMaxC: 40,
    plugs: 1,
    powerW: 3,
    volts: [120],
    plugType: 'A/B',
    ...values,
  })
const setupWith = (outlets: number, ...items: Setup['items']) =>
  wholeSetup({}, { mains: { ...wholeSetup().mains, outlets }, items })

const tell = ({ kind, subject, from, to }: { kind: string; subject: string; from: unknown; to: unknown }) => [
  kind,
  subject,
  from,
  to,
]

describe('the knock-ons of a candidate', () => {
  it('are none where it fits and asks nothing', () => {
    expect(fitCheck(setupWith(4, item('pump', pump())), heater()).knockOns).toEqual([])
  })

  it('are its own demands first', () => {
    const { knockOns } = fitCheck(setupWith(4), heater({ thermostat: 'external-needed', plugType: 'F' }))
    expect(knockOns.map(tell)).toEqual([
      ['need', 'temperature-control', null, 'change'],
      ['need', 'plug-adaptor', null, 'change'],
    ])
  })

  it('are checks of what stays that get worse', () => {
    const setup = setupWith(4, item('keeper', keeper({ maxLoadW: 80 })))
    const { verdict, knockOns } = fitCheck(setup, heater())
    expect(verdict).toBe('changes')
    expect(knockOns.map(tell)).toContainEqual(['check', 'keeper', 'pass', 'fail'])
  })

  it('say once that outlets are short, however many pieces could say it', () => {
    const setup = setupWith(3, ...['a', 'b', 'c'].map((id) => item(id, pump())))
    const { knockOns } = fitCheck(setup, heater())
    expect(knockOns.filter(({ kind }) => kind === 'check')).toEqual([])
    expect(knockOns.map(({ kind, subject }) => [kind, subject])).toContainEqual(['need', 'outlets'])
  })

  it('are none for a piece that does not fit', () => {
    const answer = fitCheck(
      setupWith(4, item('pump', pump())),
      heater({ lengthMm: 500, thermostat: 'external-needed' }),
    )
    expect(answer).toMatchObject({ verdict: 'no', knockOns: [] })
  })
})

describe('what could be judged and no longer can', () => {
  const mount = (values: Values = {}) =>
    piece('light-mount', { type: 'arm', maxLoadKg: 3, rimMinMm: 5, rimMaxMm: 15, ...values })
  const light = (values: Values = {}, slug?: string) =>
    piece(
      'light',
      {
        powerW: 60,
        plugs: 1,
        volts: [120],
        plugType: 'A/B',
        massKg: 2,
        mountsIncluded: [],
        mountsPossible: ['arm'],
        ...values,
      },
      slug,
    )
  const booster = piece('booster-pump', {
    inletMinKPa: 70,
    outletKPa: 550,
    maxLpd: 1500,
    powerW: 28,
    plugs: 1,
    volts: [120],
    plugType: 'A/B',
  })
  const lost = (knockOns: readonly KnockOn[]) => knockOns.filter(({ to }) => to === 'nodata')
  const others = (setup: Setup) => report(setup).items.map(({ id, verdict }) => [id, verdict])

  it('is told of a tank of a shape whose areas are not computed', () => {
    const setup = setupWith(4, item('heater', heater()))
    const bowed = piece('tank', { ...tankValues, shape: 'bow-front', includedPump: {}, nominalVolumeL: 84 })
    const answer = fitCheck(setup, bowed)
    expect(others({ ...setup, tank: { specs: bowed.specs } })).toEqual([['heater', 'unknown']])
    expect(answer.verdict).toBe('changes')
    const [first, ...more] = lost(answer.knockOns)
    expect(more).toEqual([])
    expect(first).toMatchObject({ kind: 'check', subject: 'heater', from: 'pass' })
    expect(toPlain(first?.message)).toContain('can no longer be judged. Areas and volumes of a bow front tank')
  })

  it('is told of a light of unknown mass over a mount, swapped or fitted', () => {
    const setup = setupWith(4, item('mount', mount()), item('light', light()))
    const heavy = light({ massKg: undefined }, 'unweighed')
    const swapped = replacements(setup, 'light', catalogueOf(heavy), { limit: 1, offset: 0 })!.answers[0]!
    for (const { verdict, knockOns } of [swapped, fitCheck(setup, heavy)]) {
      expect(verdict).not.toBe('fits')
      expect(lost(knockOns).map(tell)).toEqual([['check', 'mount', 'pass', 'nodata']])
      expect(lost(knockOns)[0]?.message).toContain('Nobody has recorded what the light weighs.')
    }
  })

  it('is told of an RO/DI unit beside a booster pump that is chosen by its numbers, swapped or fitted', () => {
    const setup = setupWith(4, item('booster', booster), item('unit', roUnit()))
    expect(others(setup)).toEqual([
      ['booster', 'fits'],
      ['unit', 'fits'],
    ])
    const silent = roUnit({ minFeedKPa: undefined }, 'silent')
    const swapped = replacements(setup, 'unit', catalogueOf(silent), { limit: 1, offset: 0 })!
    expect(swapped.counts).toMatchObject({ fits: 0, changes: 1 })
    for (const { verdict, knockOns } of [swapped.answers[0]!, fitCheck(setup, silent)]) {
      expect(verdict).toBe('changes')
      expect(lost(knockOns).map(tell)).toEqual([['check', 'booster', 'pass', 'nodata']])
    }
    expect(fit(setup, 'ro-unit', [silent], { limit: 1, offset: 0 }).counts).toMatchObject({ fits: 0, changes: 1 })
  })

  it('is not charged to what comes where it could not be judged before', () => {
    const setup = setupWith(4, item('booster', booster))
    expect(lost(fitCheck(setup, roUnit({ minFeedKPa: undefined })).knockOns)).toEqual([])
  })

  it('is told of a piece in the place of another in a setup', () => {
    const setup = (what: Values) => setupWith(4, item('heater', heater(what)))
    const found = diff(assess(setup({})), assess(setup({ volts: undefined })))
    expect(found.map(tell)).toContainEqual(['check', 'heater', 'pass', 'nodata'])
  })
})

describe('the difference of two assessments', () => {
  const before = setupWith(4, item('heater', heater()), item('pump', pump()))

  it('names what a weaker replacement asks beyond the old one', () => {
    const after = {
      ...before,
      items: [item('heater', heater({ thermostat: 'external-needed' })), item('pump', pump())],
    }
    expect(diff(assess(before), assess(after)).map(tell)).toContainEqual([
      'need',
      'temperature-control',
      null,
      'change',
    ])
  })

  it('does not charge a replacement with what was wrong before it', () => {
    const wrong = (powerW: number) => ({
      ...before,
      items: [item('heater', heater({ powerW, plugType: 'F' })), item('pump', pump())],
    })
    const found = diff(assess(wrong(100)), assess(wrong(101)))
    expect(found.filter(({ kind }) => kind !== 'budget')).toEqual([])
  })

  it('names essentials that go missing, and those that are met at last', () => {
    const without = { ...before, items: [item('pump', pump())] }
    expect(diff(assess(before), assess(without)).map(tell)).toContainEqual(['missing', 'heat', null, null])
    expect(diff(assess(without), assess(before)).map(tell)).toContainEqual(['freed', 'heat', null, null])
  })

  it('counts freed outlets as freed and watts as moved', () => {
    const fewer = { ...before, items: [item('heater', heater({ plugs: 0, powerW: 95 })), item('pump', pump())] }
    const found = diff(assess(before), assess(fewer)).map(tell)
    expect(found).toContainEqual(['freed', 'plugs', 2, 1])
    expect(found).toContainEqual(['budget', 'powerW', 110, 105])
  })

  it('comes worst first', () => {
    const after = setupWith(0, item('heater', heater({ thermostat: 'external-needed' })), item('pump', pump()))
    const kinds = diff(assess(before), assess(after)).map(({ kind }) => kind)
    const order = ['need', 'check', 'missing', 'budget', 'freed']
    expect(kinds).toEqual([...kinds].sort((a, b) => order.indexOf(a) - order.indexOf(b)))
    expect(new Set(kinds).size).toBeGreaterThan(1)
  })
})

describe('a report', () => {
  it('names every essential that is missing from a bare setup, in the order in which people buy', () => {
    expect(report(wholeSetup()).missing.map(({ need }) => need)).toEqual([
      'heat',
      'cycle-tests',
      'salinity-reading',
      'salt',
      'pure-water',
      'circulation',
      'glass-cleaning',
      'light',
    ])
  })

  it('asks for no light without corals, and no heater in a room as warm as the water', () => {
    const needs = (rest: Partial<Setup>) => report(wholeSetup({}, rest)).missing.map(({ need }) => need)
    expect(needs({ goals: { ...wholeSetup().goals, coral: [] } })).not.toContain('light')
    expect(needs({ room: { temperatureC: 31, coldestC: 31, warmestC: 31, relativeHumidity: 1 } })).not.toContain('heat')
  })

  it('has each essential met by what meets it', () => {
    const items = [
      item('heater', heater()),
      item('kit', piece('test-kit', { parameters: ['ammonia', 'nitrite'] })),
      item('second', piece('test-kit', { parameters: ['nitrate'] })),
      item('pump', pump()),
      item('gone', piece('salt-mix', {}), { state: 'gone' }),
    ]
    const found = report(wholeSetup({}, { items }))
    const metBy = Object.fromEntries(found.needs.map(({ need, metBy: ids }) => [need, ids]))
    expect(metBy).toMatchObject({ heat: ['heater'], 'cycle-tests': ['kit', 'second'], circulation: ['pump'], salt: [] })
    expect(found.missing.map(({ need }) => need)).toContain('salt')
    expect(found.items.map(({ id }) => id)).not.toContain('gone')
  })

  it('names the tests that are missing', () => {
    const items = [item('kit', piece('test-kit', { parameters: ['ammonia'] }))]
    const tests = report(wholeSetup({}, { items })).missing.find(({ need }) => need === 'cycle-tests')
    expect(tests?.message).toContain('nitrite, nitrate')
    expect(tests?.message).not.toContain('ammonia')
  })

  it('is as bad as its worst piece, and a change where anything is missing', () => {
    const verdict = (what: ReturnType<typeof heater>) => report(wholeSetup({}, { items: [item('x', what)] })).verdict
    expect(verdict(heater())).toBe('changes')
    expect(verdict(heater({ volts: undefined }))).toBe('unknown')
    expect(verdict(heater({ lengthMm: 500 }))).toBe('no')
  })

  it('adds up outlets, watts, weight and heat', () => {
    const found = report(
      setupWith(2, item('strip', strip()), item('heater', heater()), item('pump', pump(), { quantity: 2 })),
    )
    expect(found.budgets['plugs']).toMatchObject({ used: 3, limit: 3, unit: '1' })
    expect(found.budgets['powerW']).toMatchObject({ used: 120, limit: 1440, unit: 'W' })
    expect(found.budgets['heatW']).toMatchObject({ limit: 100 })
    expect(found.budgets['massKg']?.limit).toBeNull()
  })

  it('computes no weight and no heat for shapes whose areas are not computed', () => {
    const budgets = Object.keys(report(wholeSetup({ shape: 'cylinder' })).budgets)
    expect(budgets).toEqual(['plugs', 'powerW'])
    const heat = report(wholeSetup({ shape: 'cylinder' })).needs.find(({ need }) => need === 'heat')
    expect(heat).toMatchObject({ amount: null })
  })
})
