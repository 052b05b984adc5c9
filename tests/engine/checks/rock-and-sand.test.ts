import { describe, expect, it } from 'vitest'
import { fitCheck } from '#shared/engine/fit'
import { report } from '#shared/engine/report'
import type { Setup } from '#shared/engine/types'
import { item, judge, piece, toPlain, wholeSetup } from '../build'

type Values = Readonly<Record<string, unknown>>

const goals = { ...wholeSetup().goals, rockKg: 20 }
const withItems = (...items: Setup['items']) => wholeSetup({}, { goals, items })

describe('rock', () => {
  const rock = (values: Values = {}) => piece('rock', { state: 'dry', form: 'base', packKg: 5, ...values })
  const amount = (values: Values, setup = withItems()) => judge(setup, rock(values), 'rock.amount')
  const state = (values: Values, setup = withItems()) => judge(setup, rock(values), 'rock.state')

  it('comes in packs for what is still wanted of the goal', () => {
    expect(toPlain(amount({}).message)).toBe('4 packs of 5 kg for the 20 kg still wanted.')
    expect(toPlain(amount({ packKg: 6 }, withItems(item('a', rock(), { quantity: 2 }))).message)).toBe(
      '2 packs of 6 kg for the 10 kg still wanted.',
    )
    expect(amount({}, withItems(item('a', rock(), { quantity: 4 }))).message).toContain('already reaches the goal')
    expect(toPlain(judge({ ...withItems(), units: 'us' }, rock(), 'rock.amount').message)).toBe(
      '4 packs of 11 lb for the 44 lb still wanted.',
    )
  })

  it('is base rock to at least half of the goal', () => {
    const ledge = { form: 'ledge' }
    expect(amount(ledge).outcome).toBe('change')
    expect(amount(ledge, withItems(item('a', rock({ packKg: 9.9 })))).outcome).toBe('change')
    expect(amount(ledge, withItems(item('a', rock({ packKg: 10 })))).outcome).toBe('pass')
    expect(fitCheck(withItems(), rock(ledge)).knockOns).toContainEqual(
      expect.objectContaining({ kind: 'need', subject: 'base-rock' }),
    )
  })

  it('is no data where pack or form is missing and it turns on that', () => {
    expect(amount({ packKg: undefined })).toMatchObject({ outcome: 'nodata', missing: ['packKg'] })
    expect(amount({ form: undefined })).toMatchObject({ outcome: 'nodata', missing: ['form'] })
    expect(amount({ form: undefined }, withItems(item('a', rock({ packKg: 10 })))).outcome).toBe('pass')
  })

  it('says where other rock states no mass', () => {
    const setup = withItems(item('a', rock({ packKg: undefined })))
    expect(fitCheck(setup, rock()).cautions).toContain('1 piece in the setup states no mass and could not be counted.')
  })

  it('makes the cycle longer where it is dry and live rock was planned that does not stay', () => {
    const live = rock({ state: 'live' })
    expect(state({}).outcome).toBe('pass')
    expect(state({}, withItems(item('a', live, { state: 'gone' })))).toMatchObject({
      outcome: 'change',
      message: 'Dry where live was planned: the cycle takes longer.',
    })
    expect(state({ state: 'artificial' }, withItems(item('a', live, { state: 'gone' }))).message).toContain(
      'Artificial',
    )
    expect(state({ state: 'live' }, withItems(item('a', live, { state: 'gone' }))).outcome).toBe('pass')
    expect(state({}, withItems(item('a', live))).outcome).toBe('pass')
    expect(judge(withItems(item('a', live)), rock(), 'rock.state', { instead: ['a'] }).outcome).toBe('change')
    expect(state({ state: undefined })).toMatchObject({ outcome: 'nodata', missing: ['state'] })
    const both = report(withItems(item('a', live), item('b', rock()))).items.find(({ id }) => id === 'b')
    expect(both?.checks.find(({ id }) => id === 'rock.state')?.outcome).toBe('pass')
  })

  it('is never collected outdoors', () => {
    expect(fitCheck(withItems(), rock()).cautions.join(' ')).toContain('Never use rock collected outdoors')
  })
})

describe('sand', () => {
  const sand = (values: Values = {}) =>
    piece('sand', {
      mineral: 'aragonite',
      grainMinMm: 0.5,
      grainMaxMm: 1,
      state: 'dry',
      packKg: 9,
      magneticGrains: false,
      madeFor: ['reef'],
      ...values,
    })
  const check = (id: string, values: Values, setup = withItems()) => judge(setup, sand(values), `sand.${id}`)

  it('is one mass for one bed, in its own check and in the budget, whatever its bulk density', () => {
    for (const bulkDensityKgL of [undefined, 1.2, 1.7]) {
      const { items, budgets } = report(withItems(item('sand', sand({ bulkDensityKgL }))))
      const checks = items.find(({ id }) => id === 'sand')?.checks ?? []
      expect(budgets['sandKg']?.used).toBeCloseTo(checks.find(({ id }) => id === 'sand.amount')?.measured as number, 9)
    }
  })

  it('is aragonite or calcite; silica only where it is made for salt water, as a change', () => {
    expect(check('mineral', {}).outcome).toBe('pass')
    expect(check('mineral', { mineral: 'calcite' }).outcome).toBe('pass')
    expect(check('mineral', { mineral: 'silica', madeFor: ['marine-fish'] }).outcome).toBe('change')
    expect(check('mineral', { mineral: 'silica', madeFor: ['freshwater'] }).outcome).toBe('fail')
    expect(check('mineral', { mineral: 'silica', madeFor: undefined })).toMatchObject({
      outcome: 'nodata',
      missing: ['madeFor'],
    })
    expect(check('mineral', { mineral: undefined })).toMatchObject({ outcome: 'nodata', missing: ['mineral'] })
    const cautions = fitCheck(withItems(), sand({ mineral: 'volcanic' })).cautions.join(' ')
    expect(cautions).toContain('Volcanic sand does not buffer')
    expect(cautions).toContain('Never use sand from a beach')
  })

  it('has grains whose geometric mean is from 0.25 to 2 mm', () => {
    const grain = (grainMinMm: number | undefined, grainMaxMm: number | undefined) =>
      check('grain', { grainMinMm, grainMaxMm })
    // √(0.125 × 0.5) = 0.25; √(1 × 4) = 2.
    expect(grain(0.125, 0.5)).toMatchObject({ outcome: 'pass', measured: 0.25 })
    expect(grain(1, 4)).toMatchObject({ outcome: 'pass', measured: 2 })
    expect(grain(0.124, 0.5)).toMatchObject({
      outcome: 'change',
      message: expect.stringContaining('blow about') as string,
    })
    expect(grain(1, 4.1)).toMatchObject({
      outcome: 'change',
      message: expect.stringContaining('waste gets caught') as string,
    })
    expect(grain(undefined, 1)).toMatchObject({ outcome: 'nodata', missing: ['grainMinMm'] })
    // Every usual upper end of 0.4 to 8 mm passes from 0.5 mm on, not so from 1 mm on.
    expect(fitCheck(withItems(), sand({ grainMaxMm: undefined })).verdict).toBe('fits')
    expect(fitCheck(withItems(), sand({ grainMinMm: 1, grainMaxMm: undefined })).verdict).toBe('unknown')
  })

  it('comes in bags for the bed, and a bare bottom is a caution', () => {
    expect(check('amount', { packKg: undefined })).toMatchObject({ outcome: 'nodata', missing: ['packKg'] })
    expect(check('amount', {}, wholeSetup({ shape: 'corner' })).outcome).toBe('nodata')
    const bare = wholeSetup({}, { goals: { ...goals, sandDepthMm: 0 } })
    expect(check('amount', {}, bare)).toMatchObject({ outcome: 'pass', measured: 0 })
    expect(fitCheck(bare, sand()).cautions.join(' ')).toContain('A bare bottom is less stable')
  })

  it('scratches where its grains are magnetic and a magnet scraper is in the setup', () => {
    const scraper = (form: string | undefined) => withItems(item('scraper', piece('scraper', { form })))
    const ids = fitCheck(withItems(), sand({ magneticGrains: true })).checks.map(({ id }) => id)
    expect(ids).not.toContain('sand.magnetic')
    expect(check('magnetic', { magneticGrains: true }, scraper('magnet')).outcome).toBe('change')
    expect(check('magnetic', {}, scraper('magnet')).outcome).toBe('pass')
    expect(check('magnetic', { magneticGrains: undefined }, scraper('magnet')).missing).toEqual(['magneticGrains'])
    expect(check('magnetic', { magneticGrains: true }, scraper(undefined)).outcome).toBe('nodata')
    expect(fitCheck(scraper('handheld'), sand()).checks.map(({ id }) => id)).not.toContain('sand.magnetic')
  })

  it('makes the cycle longer where it is dry in place of live', () => {
    const live = item('sand', sand({ state: 'live' }))
    expect(check('state', {}, withItems(live)).outcome).toBe('change')
    expect(check('state', {}, withItems({ ...live, state: 'gone' })).outcome).toBe('change')
    expect(check('state', {}, withItems(item('sand', sand()))).outcome).toBe('pass')
    expect(check('state', { state: 'live' }, withItems(live)).outcome).toBe('pass')
    expect(check('state', { state: undefined })).toMatchObject({ outcome: 'nodata', missing: ['state'] })
  })
})
