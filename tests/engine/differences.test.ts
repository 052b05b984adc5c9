import { describe, expect, it } from 'vitest'
import { replacements } from '#shared/engine/swap/replacements'
import { countDifferences, findDifferences } from '#shared/engine/swap/differences'
import type { Piece } from '#shared/engine/types'
import { createPrinter } from '#shared/units/print'
import { heater, item, piece, toPlain, toSpecs, wholeSetup } from './build'
import { catalogueOf, demoCatalogue } from './demo-catalogue'
import { kindKeys } from '#shared/kinds/index'

const words = createPrinter('metric')
const tell = (from: Readonly<Record<string, unknown>>, to: Readonly<Record<string, unknown>>) =>
  findDifferences('ro-unit', toSpecs(from), toSpecs(to), words).map(({ key, sense, message }) => [
    key,
    sense,
    toPlain(message),
  ])

describe('the differences from what is gone', () => {
  it('say which way is better, attribute by attribute', () => {
    expect(
      tell(
        { membraneLpd: 190, wasteRatio: 4, boosterIncluded: false, testPressureKPa: 350 },
        { membraneLpd: 280, wasteRatio: 5, boosterIncluded: true, testPressureKPa: 410 },
      ),
    ).toEqual([
      ['membraneLpd', 'better', 'Membrane output: 280 L/day instead of 190 L/day.'],
      ['testPressureKPa', 'different', 'Test pressure: 410 kPa instead of 350 kPa.'],
      ['wasteRatio', 'worse', 'Waste per product: 5 : 1 instead of 4 : 1.'],
      ['boosterIncluded', 'better', 'Booster pump included: yes instead of no.'],
    ])
  })

  it('name what is recorded of one alone, and pass over what is recorded of neither', () => {
    expect(tell({ wasteRatio: 4 }, { membraneLpd: 280 })).toEqual([
      ['membraneLpd', 'different', 'Membrane output: 280 L/day; what it was is not recorded.'],
      ['wasteRatio', 'different', 'Waste per product: not recorded, 4 : 1 before.'],
    ])
  })

  it('do not mind the order of a set', () => {
    expect(tell({ stages: ['carbon', 'membrane'] }, { stages: ['membrane', 'carbon'] })).toEqual([])
  })

  it('are none of a piece with itself, and as many as are counted, for every kind', () => {
    for (const kind of kindKeys) {
      const [first, second] = demoCatalogue[kind]
      if (!first || !second) throw new Error(`the demo catalogue has too few of ${kind}`)
      expect(findDifferences(kind, first.specs, first.specs, words), kind).toEqual([])
      const found = findDifferences(kind, first.specs, second.specs, words)
      expect(found.length, kind).toBe(countDifferences(kind, first.specs, second.specs))
    }
  })
})

describe('how many of a replacement there are', () => {
  const counts = (gone: Parameters<typeof item>[1], quantity: number, ...pieces: readonly Piece[]) => {
    const setup = wholeSetup({}, { items: [item('gone', gone, { quantity })] })
    const { answers } = replacements(setup, 'gone', catalogueOf(...pieces), { limit: 10, offset: 0 })!
    return Object.fromEntries(answers.map(({ pieces: [first] }) => [first?.gear?.slug, first?.quantity]))
  }
  const bag = (packKg: number | undefined, slug: string) =>
    piece('sand', { packKg, mineral: 'aragonite', grainMinMm: 0.5, grainMaxMm: 1, state: 'dry' }, slug)

  it('is as many packs as hold at least as much', () => {
    // Two bags of 9 kg are 18 kg: one of 20, two of 9, four of 5; as many as there were where nobody knows.
    const found = counts(bag(9, 'old'), 2, bag(20, 'b20'), bag(9, 'b9'), bag(5, 'b5'), bag(undefined, 'unknown'))
    expect(found).toEqual({ b20: 1, b9: 2, b5: 4, unknown: 2 })
  })

  it('is as many as there were, or one where so many do not fit', () => {
    const rod = (powerW: number, slug: string) => heater({ powerW, lengthMm: 200, diameterMm: 20 }, slug)
    // 84 L that need 84 to 95 W: two of 50 W are right, two of 150 W far too strong (210 W at the most), one is not.
    expect(counts(rod(50, 'old'), 2, rod(55, 'w55'), rod(150, 'w150'))).toEqual({ w55: 2, w150: 1 })
  })
})
