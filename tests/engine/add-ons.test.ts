import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { setSwapBench } from '#shared/engine/bench'
import { countPieces, findOptions, type Extras } from '#shared/engine/swap/add-ons'
import {
  assessOutfit,
  changeItems,
  createOutfit,
  findUnasked,
  type Outfit,
  type State,
} from '#shared/engine/swap/outfit'
import type { Item, Piece } from '#shared/engine/types'
import { heater, item, piece, wholeSetup } from './build'
import { catalogueOf } from './demo-catalogue'

const mains = { volts: [120], plugType: 'A/B', plugs: 1 }
const controller = (slug: string, maxLoadW: number, outlets: number) =>
  piece('temperature-controller', { maxLoadW, outlets, rangeMinC: 18, rangeMaxC: 34, powerW: 3, ...mains }, slug)
const strip = (slug: string, outlets: number) =>
  piece('power-strip', { outlets, ratedA: 15, ratedV: 125, switchedOutlets: 0, ...mains }, slug)

const need = 'temperature-control'
const mostPieces = 3

function outfitWith(outlets: number, powerW: number, pumps: number): Outfit {
  const gone = heater({ powerW, lengthMm: 250, thermostat: 'external-included' })
  const pump = piece('wavemaker', { powerW: 8, flowMinLph: 100, flowMaxLph: 2000, ...mains })
  const others = Array.from({ length: pumps }, (_, index) => item(`pump-${index}`, pump))
  const setup = wholeSetup({}, { mains: { ...wholeSetup().mains, outlets }, items: [item('heater', gone), ...others] })
  const bare = heater({ powerW, lengthMm: 250, thermostat: 'external-needed' }, 'bare')
  return createOutfit(setSwapBench(setup, 'heater')!, { piece: bare, quantity: 1 })
}

/** Whether with the extras nothing asks for control, nothing new is asked for, and nothing fails that did not. */
function isComplete(outfit: Outfit, state: State, extras: Extras): boolean {
  const after = assessOutfit(changeItems(outfit, [...outfit.items, ...extras]))
  return (
    after.unmet.every((one) => one.need !== need) &&
    findUnasked(after.unmet, state.unmet).length === 0 &&
    [...after.failing].every((id) => state.failing.has(id))
  )
}

/** The fewest pieces of a small catalogue that are complete, by trying every way to take so many of each. */
function countByTrying(outfit: Outfit, state: State, pieces: readonly Piece[]): number | undefined {
  const ways = pieces.reduce<Item[][]>(
    (all, one, index) =>
      all.flatMap((way) =>
        [0, 1, 2, 3].flatMap((quantity) => {
          const more: Item = { id: `tried-${index}`, piece: one, quantity, state: 'planned' }
          const next = quantity === 0 ? way : [...way, more]
          return countPieces(next) <= mostPieces ? [next] : []
        }),
      ),
    [[]],
  )
  const sizes = ways.filter((way) => isComplete(outfit, state, way)).map(countPieces)
  return sizes.length > 0 ? Math.min(...sizes) : undefined
}

describe('what meets a need of a replacement', () => {
  it(
    'is as few pieces as every way of choosing from a small catalogue can find, and complete',
    { timeout: 120_000 },
    () => {
      const anyPiece = fc.oneof(
        fc
          .tuple(fc.constantFrom(50, 100, 150, 300), fc.integer({ min: 1, max: 2 }))
          .map(([load, outlets]) => ({ load, outlets })),
        fc.integer({ min: 2, max: 6 }).map((outlets) => ({ load: null, outlets })),
      )
      const anyCatalogue = fc
        .array(anyPiece, { minLength: 1, maxLength: 4 })
        .map((list) =>
          list.map(({ load, outlets }, index) =>
            load === null ? strip(`strip-${index}`, outlets) : controller(`keeper-${index}`, load, outlets),
          ),
        )
      let found = 0
      fc.assert(
        fc.property(
          fc.integer({ min: 1, max: 3 }),
          fc.constantFrom(100, 150),
          fc.integer({ min: 0, max: 2 }),
          anyCatalogue,
          (outlets, powerW, pumps, pieces) => {
            const outfit = outfitWith(outlets, powerW, pumps)
            const state = assessOutfit(outfit)
            const asked = state.unmet.filter((one) => one.need === need)
            const options = findOptions(outfit, state, asked, catalogueOf(...pieces))
            const least = countByTrying(outfit, state, pieces)
            expect(options[0] && countPieces(options[0])).toBe(least)
            for (const option of options) expect(isComplete(outfit, state, option)).toBe(true)
            if (least !== undefined) found += 1
          },
        ),
        { numRuns: 60 },
      )
      expect(found).toBeGreaterThan(10)
    },
  )

  it('is nothing where nothing in the catalogue meets it', () => {
    const outfit = outfitWith(3, 150, 0)
    const state = assessOutfit(outfit)
    const asked = state.unmet.filter((one) => one.need === need)
    expect(findOptions(outfit, state, asked, catalogueOf(strip('strip', 6), controller('weak', 50, 1)))).toEqual([])
  })
})
