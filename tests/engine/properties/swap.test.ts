import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { assess } from '#shared/engine/assess'
import { diff } from '#shared/engine/knock-ons'
import { replacements } from '#shared/engine/swap/replacements'
import type { Piece, Setup } from '#shared/engine/types'
import { kindKeys, type KindKey } from '#shared/kinds/index'
import { anySetup } from '../arbitraries'
import { heater, item, piece, wholeSetup } from '../build'
import { catalogueOf, demoCatalogue } from '../demo-catalogue'

const patienceMs = 120_000
const page = { limit: 50, offset: 0 }

/** Without its name, so that a piece may take its own place. */
const unnamed = ({ kind, specs }: Piece): Piece => ({ kind, specs })
const demoOf = (kind: KindKey) => fc.constantFrom(...demoCatalogue[kind]).map(unnamed)

describe('a piece swapped for itself', () => {
  it.each(kindKeys.filter((kind) => kind !== 'tank'))(
    'changes nothing, whatever else is in the setup: %s',
    (kind) => {
      fc.assert(
        fc.property(anySetup, demoOf(kind), fc.integer({ min: 0, max: 4 }), (setup, gone, at) => {
          const left = setup.items.filter(({ piece: { kind: other } }) => kind !== 'stand' || other !== 'stand')
          const items = [...left.slice(0, at), item('gone', gone, { state: 'gone' }), ...left.slice(at)]
          const { answers } = replacements({ ...setup, items }, 'gone', catalogueOf(gone), page)!
          expect(answers.map(({ knockOns, addOns, differences }) => [knockOns, addOns, differences])).toEqual([
            [[], [], []],
          ])
        }),
        { numRuns: 12 },
      )
    },
    patienceMs,
  )

  it(
    'changes nothing: tank',
    () => {
      fc.assert(
        fc.property(anySetup, demoOf('tank'), (setup, gone) => {
          const items = setup.items.map(({ place: _, ...one }) => one)
          const swapped: Setup = { ...setup, items, tank: { specs: gone.specs } }
          const [answer] = replacements(swapped, 'tank', catalogueOf(gone), page)!.answers
          expect([answer?.knockOns, answer?.addOns, answer?.differences]).toEqual([[], [], []])
        }),
        { numRuns: 12 },
      )
    },
    patienceMs,
  )
})

describe('a piece of an unrelated kind that is added', () => {
  const base = wholeSetup(
    {},
    { items: [item('heater', heater({ powerW: 100 })), item('rock', piece('rock', { packKg: 9 }))] },
  )
  const before = assess(base)
  const kinds: readonly KindKey[] = [
    'net',
    'siphon',
    'salinity-meter',
    'test-kit',
    'salt-mix',
    'ro-unit',
    'booster-pump',
  ]

  it.each([...kinds, 'light', 'light-controller', 'light-mount', 'wavemaker'] as const)(
    'changes plugs, watts, heat and weight at most: %s',
    (kind) => {
      for (const added of demoCatalogue[kind]) {
        const changed = diff(before, assess({ ...base, items: [...base.items, item('added', added)] }))
        // What it asks for itself is its own; what is freed was missing before.
        const elsewhere = changed.filter(
          (one) =>
            one.kind === 'missing' || one.kind === 'budget' || (one.kind === 'check' && one.subject === 'heater'),
        )
        for (const { kind: how, subject } of elsewhere)
          expect([how, subject]).toEqual(['budget', expect.stringMatching(/^(plugs|powerW|heatW|massKg|floorKPa)$/)])
      }
    },
  )
})

describe('replacements', () => {
  const items = [
    item('heater', heater({ thermostat: 'external-included', lengthMm: 200 }), { state: 'gone' }),
    item('light', demoCatalogue.light[3]!),
    item('strip', demoCatalogue['power-strip'][0]!),
    item('meter', demoCatalogue['salinity-meter'][0]!),
  ]
  const catalogue = { ...demoCatalogue, heater: demoCatalogue.heater.slice(0, 30) }
  const tell = (setup: Setup) =>
    replacements(setup, 'heater', catalogue, page)!.answers.map(({ gear, verdict, knockOns, addOns, differences }) => ({
      slug: gear?.slug,
      verdict,
      knockOns: knockOns.map(({ kind, subject, from, to }) => JSON.stringify([kind, subject, from, to])).sort(),
      addOns: addOns.map(({ need, options }) => [need, options]),
      differences: differences.map(({ key, from, to, sense }) => [key, from, to, sense]),
    }))

  it('do not depend on the order of the items, nor on the units they are told in', () => {
    const setup = wholeSetup({}, { items })
    const told = tell(setup)
    expect(told).toHaveLength(30)
    for (const units of ['us', 'metric'] as const)
      for (const order of [items, items.toReversed()]) expect(tell({ ...setup, units, items: order })).toEqual(told)
  })
})
