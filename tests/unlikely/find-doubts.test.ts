import { describe, expect, it } from 'vitest'
import fc from 'fast-check'
import { kindKeys, kinds, type KindKey } from '#shared/kinds/index'
import type { MeasureAttribute } from '#shared/kinds/types'
import { findDoubts } from '#shared/unlikely/find-doubts'
import { judgeValue } from '#shared/unlikely/judge-value'
import { createPrinter } from '#shared/units/print'
import { seedPieces } from '../../seeds/gear/index'

const us = createPrinter('us')
const metric = createPrinter('metric')

const measures = kindKeys.flatMap((kind) =>
  kinds[kind].attributes.flatMap((attribute) =>
    attribute.type === 'measure'
      ? [attribute]
      : attribute.type === 'group'
        ? attribute.fields.filter((field): field is MeasureAttribute => field.type === 'measure')
        : [],
  ),
)

const within = ([low, high]: readonly [number, number]) => fc.double({ min: low, max: high, noNaN: true })
const anyUsual = fc
  .constantFrom(...measures)
  .chain((attribute) => fc.tuple(fc.constant(attribute), within(attribute.usual)))
const judgeNew = (attribute: MeasureAttribute, value: number) =>
  judgeValue(attribute.key, attribute, value, undefined, us)
const ask = (kind: KindKey, values: Record<string, unknown>, before: Record<string, unknown> = {}) =>
  findDoubts(kind, { values, before }, metric)

describe('a single number', () => {
  it('in the usual range is never questioned', () => {
    fc.assert(fc.property(anyUsual, ([attribute, value]) => judgeNew(attribute, value) === undefined))
  })

  it('outside of the usual range is always questioned', () => {
    const outside = fc.constantFrom(...measures).chain((attribute) => {
      const [low, high] = attribute.usual
      const above = fc.double({ min: high * 1.001 + 1e-6, max: high * 1000 + 1, noNaN: true })
      const below = fc.double({ min: -Math.abs(low) - 1, max: low - Math.abs(low) * 0.001 - 1e-6, noNaN: true })
      return fc.tuple(fc.constant(attribute), fc.oneof(above, below))
    })
    fc.assert(fc.property(outside, ([attribute, value]) => judgeNew(attribute, value)?.value === value))
  })

  it('that is 25.4 times too large or too small is questioned wherever that leaves the plausible range', () => {
    fc.assert(
      fc.property(anyUsual, fc.constantFrom(25.4, 1 / 25.4), ([attribute, value], factor) => {
        const slipped = value * factor
        fc.pre(slipped < attribute.plausible[0] || slipped > attribute.plausible[1])
        const doubt = judgeNew(attribute, slipped)
        expect(doubt).toBeDefined()
        if (attribute.unit !== 'mm') return
        expect(doubt?.suggestions.some((one) => Math.abs(one.value / value - 1) < 1e-4)).toBe(true)
      }),
    )
  })

  it('takes no suggestion that could not be, and none that would be questioned again', () => {
    const anything = fc
      .constantFrom(...measures)
      .chain((attribute) => fc.tuple(fc.constant(attribute), fc.double({ min: 1e-6, max: 1e6, noNaN: true })))
    fc.assert(
      fc.property(anything, ([attribute, value]) => {
        for (const { value: meant } of judgeNew(attribute, value)?.suggestions ?? []) {
          expect(meant).toBeGreaterThanOrEqual(attribute.plausible[0])
          expect(meant).toBeLessThanOrEqual(attribute.plausible[1])
          expect(judgeNew(attribute, meant)).toBeUndefined()
        }
      }),
    )
  })

  it('typed in inches where millimetres were asked is met with the inches', () => {
    const [doubt] = ask('heater', { lengthMm: 10.6 })
    expect(doubt).toMatchObject({ path: 'lengthMm', rule: 'slip', value: 10.6 })
    expect(doubt?.suggestions[0]).toMatchObject({ value: 269.24, because: 'in were read as mm' })
    expect(doubt?.detail).toBe('10.6\u00a0mm is below what length usually is, 100–450\u00a0mm.')
  })
})

describe('a correction', () => {
  it('is not judged where the number stays as it was, however unusual', () => {
    expect(ask('heater', { lengthMm: 580, powerW: 100 }, { lengthMm: 580, powerW: 200 })).toEqual([])
  })

  it('ten times the recorded number is questioned, though both are usual', () => {
    const [doubt] = ask('heater', { powerW: 1000 }, { powerW: 100 })
    expect(doubt).toMatchObject({ rule: 'slip', suggestions: [{ value: 100 }] })
    expect(doubt?.detail).toBe('1000\u00a0W is 10 times the recorded 100\u00a0W.')
  })

  it('a thousandth of the recorded number is met with the recorded size, an honest correction is not', () => {
    const [doubt] = ask('tank', { outerLengthMm: 0.612 }, { outerLengthMm: 610 })
    expect(doubt?.suggestions).toMatchObject([{ value: 612, because: 'the decimal point is three places off' }])
    expect(ask('tank', { outerLengthMm: 600 }, { outerLengthMm: 610 })).toEqual([])
  })

  it('of a chamber is judged by the chamber of the same id, wherever it now stands in the list', () => {
    const recorded = {
      chambers: [
        { id: 'a', widthMm: 100 },
        { id: 'b', widthMm: 60 },
      ],
    }
    const turned = {
      chambers: [
        { id: 'b', widthMm: 60 },
        { id: 'a', widthMm: 1000 },
      ],
    }
    expect(ask('tank', turned, recorded)).toMatchObject([
      { path: 'chambers.1.widthMm', rule: 'slip', suggestions: [{ value: 100 }] },
    ])
  })
})

describe('numbers that go together', () => {
  const sizes = { outerLengthMm: 600, outerWidthMm: 400, outerHeightMm: 400 }

  it('gallons given as litres are questioned against the outside sizes', () => {
    const [doubt] = ask('tank', { ...sizes, nominalVolumeL: 25 })
    expect(doubt).toMatchObject({ path: 'nominalVolumeL', rule: 'pair' })
    expect(doubt?.suggestions[0]).toMatchObject({ because: 'gal were read as L' })
    expect(doubt?.suggestions[0]?.value).toBeCloseTo(94.635, 2)
  })

  it('litres that the outside sizes hold are not', () => {
    expect(ask('tank', { ...sizes, nominalVolumeL: 95 })).toEqual([])
    expect(ask('tank', { ...sizes, nominalVolumeL: 25, shape: 'corner' })).toEqual([])
  })

  it('the watts of a heater are questioned against the largest tank it is rated for', () => {
    expect(ask('heater', { powerW: 1000, ratedVolumeMaxL: 40 })).toMatchObject([{ path: 'powerW', rule: 'pair' }])
    expect(ask('heater', { powerW: 100, ratedVolumeMaxL: 100 })).toEqual([])
  })

  it('are left alone where neither of them changed', () => {
    const recorded = { ...sizes, nominalVolumeL: 25 }
    expect(ask('tank', { ...recorded, wallMm: 8 }, recorded)).toEqual([])
    expect(ask('tank', { ...recorded, outerLengthMm: 610 }, recorded)).toMatchObject([{ rule: 'pair' }])
  })
})

describe('the demo catalogue', () => {
  it('is believable: fewer than one in forty of its numbers is questioned, and none for its pairs', () => {
    const doubts = seedPieces.flatMap(({ kind, revisions }) => {
      const values = Object.fromEntries(
        Object.entries(revisions[0]?.values ?? {}).map(([key, one]) => [key, one?.value]),
      )
      return ask(kind, values).map((doubt) => ({ kind, ...doubt }))
    })
    const numbers = seedPieces.flatMap(({ revisions }) =>
      Object.values(revisions[0]?.values ?? {}).filter((one) => typeof one?.value === 'number'),
    )
    expect(doubts.filter(({ rule }) => rule === 'pair').map(({ detail }) => detail)).toEqual([])
    expect(doubts.length / numbers.length).toBeLessThan(1 / 40)
  })
})
