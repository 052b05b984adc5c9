import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { assess } from '#shared/engine/assess'
import { diff } from '#shared/engine/knock-ons'
import { report } from '#shared/engine/report'
import type { Catalogue } from '#shared/engine/swap/add-ons'
import { replacements } from '#shared/engine/swap/replacements'
import type { Item, Piece, Setup } from '#shared/engine/types'
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

const severity = ['fits', 'changes', 'unknown', 'no'] as const

/** Items other than the candidate that a report finds worse off than another did. */
function findWorse(before: Setup, after: Setup, id: string): readonly unknown[] {
  const was = new Map(report(before).items.map((one) => [one.id, one.verdict]))
  return report(after).items.flatMap((one) => {
    const from = was.get(one.id)
    if (one.id === id || from === undefined || severity.indexOf(one.verdict) <= severity.indexOf(from)) return []
    return [[one.id, one.kind, from, one.verdict]]
  })
}

/** The setup with an answer's piece where the gone one, or the tank, was. */
function takePlace(setup: Setup, id: string, candidate: Piece, quantity: number): Setup {
  if (id === 'tank')
    return { ...setup, tank: { specs: candidate.specs, ...(candidate.gear && { gear: candidate.gear }) } }
  const put = (one: Item): Item => (one.id === id ? { ...one, piece: candidate, quantity, state: 'planned' } : one)
  return { ...setup, items: setup.items.map(put) }
}

const present = (setup: Setup): Setup => ({
  ...setup,
  items: setup.items.map((one): Item => (one.id === 'gone' ? { ...one, state: 'have' } : one)),
})

/** Answers that fit and leave something else worse off. */
function findSilent(setup: Setup, id: string, catalogue: Catalogue, kind: KindKey) {
  const { answers } = replacements(setup, id, catalogue, { ...page, verdict: 'fits' })!
  expect(answers.every(({ verdict }) => verdict === 'fits')).toBe(true)
  const before = present(setup)
  const silent = answers.flatMap(({ gear, pieces }) => {
    const candidate = catalogue[kind].find((one) => one.gear?.slug === gear?.slug)
    if (!candidate || pieces.length > 1) return []
    const worse = findWorse(before, takePlace(before, id, candidate, pieces[0]?.quantity ?? 1), id)
    return worse.length > 0 ? [[gear?.slug, worse]] : []
  })
  return { silent, fitting: answers.length }
}

/** A setup with a piece of every kind that others are judged with. */
const crowded = wholeSetup(
  { rim: 'framed' },
  {
    items: (
      [
        'light',
        'light-mount',
        'ro-unit',
        'booster-pump',
        'heater',
        'temperature-controller',
        'power-strip',
        'wavemaker',
        'stand',
        'sand',
        'scraper',
        'light-controller',
      ] as const
    ).map((kind) => item(kind, demoCatalogue[kind][0]!)),
  },
)

/** The pieces of a catalogue with now one, now another of their numbers not recorded. */
const withGaps = (pieces: readonly Piece[]): readonly Piece[] =>
  pieces.flatMap((one, at) => {
    const keys = Object.keys(one.specs)
    const lost = keys[at % Math.max(1, keys.length)]
    const specs = Object.fromEntries(Object.entries(one.specs).filter(([key]) => key !== lost))
    const gear = { brand: 'Inventmark', model: `gap ${at}`, slug: `gap-${at}` }
    return [one, { ...one, specs, gear }]
  })

describe('an answer that fits', () => {
  const kinds = ['tank', ...new Set(crowded.items.map(({ piece: { kind } }) => kind))] as const

  it.each(kinds)(
    'leaves no other piece of a full setup worse off: %s',
    (kind) => {
      const catalogue = { ...demoCatalogue, [kind]: withGaps(demoCatalogue[kind]) }
      const items = crowded.items.map((one): Item => (one.id === kind ? { ...one, id: 'gone', state: 'gone' } : one))
      expect(findSilent({ ...crowded, items }, kind === 'tank' ? 'tank' : 'gone', catalogue, kind).silent).toEqual([])
    },
    patienceMs,
  )

  it(
    'leaves no other piece worse off, whatever else is in the setup',
    () => {
      let fitting = 0
      const kindsFelt = ['heater', 'temperature-controller', 'power-strip', 'wavemaker', 'return-pump'] as const
      fc.assert(
        fc.property(anySetup, fc.constantFrom(...kindsFelt), fc.nat(), (setup, kind, at) => {
          const pieces = demoCatalogue[kind]
          const items = [...setup.items, item('gone', pieces[at % pieces.length]!, { state: 'gone' })]
          const found = findSilent({ ...setup, items }, 'gone', { ...demoCatalogue, [kind]: withGaps(pieces) }, kind)
          expect(found.silent).toEqual([])
          fitting += found.fitting
        }),
        { numRuns: 40 },
      )
      expect(fitting).toBeGreaterThan(20)
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
