import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { assess } from '#shared/engine/assess'
import { fit, fitCheck } from '#shared/engine/fit'
import { diff } from '#shared/engine/knock-ons'
import { report } from '#shared/engine/report'
import type { Answer, FitResult, Piece, Setup, Verdict } from '#shared/engine/types'
import type { KindKey } from '#shared/kinds/index'
import { anyCorePiece, anyHeater, anySetup, pieceOf } from '../arbitraries'

/** What an answer finds, its words left out. */
const findings = ({ verdict, checks, pieces, confidence, place, knockOns }: Answer) => ({
  verdict,
  pieces: pieces.map(({ quantity }) => quantity),
  confidence,
  place,
  checks: checks.map(({ message: _, ...check }) => check),
  knockOns: knockOns.map(({ message: _, ...knockOn }) => knockOn),
})

const named = (pieces: readonly Piece[]): readonly Piece[] =>
  pieces.map((piece, index) => ({
    ...piece,
    gear: { slug: `piece-${String(index).padStart(2, '0')}`, brand: 'Inventmark', model: `No. ${index}` },
  }))

/** These judge whole setups many times over. */
const patienceMs = 240_000

const everything = { limit: 100, offset: 0 }

describe('the unit system', () => {
  it(
    'changes words and nothing else',
    () => {
      fc.assert(
        fc.property(anySetup, anyCorePiece, (setup, piece) => {
          const us = fitCheck({ ...setup, units: 'us' }, piece)
          const metric = fitCheck({ ...setup, units: 'metric' }, piece)
          expect(findings(us)).toEqual(findings(metric))
        }),
        { numRuns: 30 },
      )
    },
    patienceMs,
  )
})

describe('the order of items', () => {
  it(
    'changes no finding of a report',
    () => {
      fc.assert(
        fc.property(anySetup, (setup) => {
          const there = report(setup)
          const back = report({ ...setup, items: [...setup.items].reverse() })
          const byId = ({ items }: typeof there) =>
            Object.fromEntries(
              items.map(({ id, verdict, checks }) => [
                id,
                { verdict, outcomes: checks.map((check) => [check.id, check.outcome]) },
              ]),
            )
          expect(byId(back)).toEqual(byId(there))
          expect(back.verdict).toBe(there.verdict)
          expect(back.missing).toEqual(there.missing)
          for (const [key, { used, limit }] of Object.entries(there.budgets)) {
            expect(back.budgets[key]?.used, key).toBeCloseTo(used, 6)
            if (limit !== null) expect(back.budgets[key]?.limit, key).toBeCloseTo(limit, 6)
          }
        }),
        { numRuns: 20 },
      )
    },
    patienceMs,
  )

  it(
    'changes no finding about a candidate',
    () => {
      fc.assert(
        fc.property(anySetup, anyHeater, (setup, piece) => {
          const outcomes = ({ verdict, checks }: Answer) => [verdict, checks.map(({ id, outcome }) => [id, outcome])]
          expect(outcomes(fitCheck({ ...setup, items: [...setup.items].reverse() }, piece))).toEqual(
            outcomes(fitCheck(setup, piece)),
          )
        }),
        { numRuns: 20 },
      )
    },
    patienceMs,
  )
})

describe('a piece in its own place', () => {
  it(
    'has no knock-ons, nor has an equal one',
    () => {
      fc.assert(
        fc.property(anySetup, (setup) => {
          expect(diff(assess(setup), assess(setup))).toEqual([])
          const clones: Setup = {
            ...setup,
            items: setup.items.map((item) => ({ ...item, piece: structuredClone(item.piece) })),
          }
          expect(diff(assess(setup), assess(clones))).toEqual([])
        }),
        { numRuns: 20 },
      )
    },
    patienceMs,
  )
})

describe('pieces that are gone', () => {
  it(
    'count for nothing',
    () => {
      fc.assert(
        fc.property(anySetup, anyHeater, (setup, piece) => {
          const left = setup.items.filter(({ state }) => state !== 'gone')
          expect(findings(fitCheck(setup, piece))).toEqual(findings(fitCheck({ ...setup, items: left }, piece)))
        }),
        { numRuns: 15 },
      )
    },
    patienceMs,
  )
})

describe('an answer about all pieces of a kind', () => {
  const pieces = (kind: KindKey) =>
    fc.array(kind === 'heater' ? anyHeater : pieceOf(kind), { minLength: 2, maxLength: 6 }).map(named)
  const catalogue = fc.oneof(
    ...(['heater', 'heater', 'temperature-controller', 'power-strip', 'tank'] as const).map((kind) =>
      pieces(kind).map((list) => ({ kind, list })),
    ),
  )
  const verdictRank: Readonly<Record<Verdict, number>> = { fits: 0, changes: 1, unknown: 2, no: 3 }

  it(
    'is for each the answer about that piece',
    () => {
      fc.assert(
        fc.property(anySetup, catalogue, (setup, { kind, list }) => {
          const { answers } = fit(setup, kind, list, everything)
          expect(answers).toHaveLength(list.length)
          for (const answer of answers) {
            const piece = list.find(({ gear }) => gear?.slug === answer.gear?.slug)
            expect(piece && fitCheck(setup, piece)).toEqual(answer)
          }
        }),
        { numRuns: 20 },
      )
    },
    patienceMs,
  )

  it(
    'goes by verdict, then by what the piece asks, whatever order the catalogue is in',
    () => {
      fc.assert(
        fc.property(anySetup, catalogue, (setup, { kind, list }) => {
          const slugs = ({ answers }: FitResult) => answers.map(({ gear }) => gear?.slug)
          const result = fit(setup, kind, list, everything)
          expect(slugs(fit(setup, kind, [...list].reverse(), everything))).toEqual(slugs(result))
          const ranks = result.answers.map(({ verdict }) => verdictRank[verdict])
          expect(ranks).toEqual([...ranks].sort((a, b) => a - b))
          for (const verdict of ['fits', 'changes'] as const) {
            const asks = result.answers
              .filter((answer) => answer.verdict === verdict)
              .map(({ knockOns }) => knockOns.length)
            expect(asks).toEqual([...asks].sort((a, b) => a - b))
          }
        }),
        { numRuns: 20 },
      )
    },
    patienceMs,
  )

  it(
    'adds up',
    () => {
      fc.assert(
        fc.property(anySetup, catalogue, (setup, { kind, list }) => {
          const result = fit(setup, kind, list, everything)
          const { fits, changes, no, unknown } = result.counts
          expect(fits + changes + no + unknown).toBe(list.length)
          expect(result.total).toBe(list.length)
          for (const verdict of ['fits', 'changes', 'no', 'unknown'] as const) {
            const only = fit(setup, kind, list, { ...everything, verdict })
            expect(only.total, verdict).toBe(result.counts[verdict])
            expect(only.answers.every((answer) => answer.verdict === verdict)).toBe(true)
          }
          const failing = result.answers.filter(({ verdict }) => verdict === 'no')
          for (const { check, count } of result.failedBy) {
            const byHand = failing.filter(({ checks }) =>
              checks.some(({ id, outcome }) => id === check && outcome === 'fail'),
            )
            expect(count, check).toBeGreaterThanOrEqual(byHand.length)
            expect(fit(setup, kind, list, { ...everything, verdict: 'no', check }).total, check).toBe(count)
          }
          expect(result.failedBy.length > 0).toBe(no > 0)
        }),
        { numRuns: 15 },
      )
    },
    patienceMs,
  )

  it(
    'comes in pages that together are the whole',
    () => {
      fc.assert(
        fc.property(anySetup, catalogue, fc.integer({ min: 1, max: 3 }), (setup, { kind, list }, limit) => {
          const whole = fit(setup, kind, list, everything).answers.map(({ gear }) => gear?.slug)
          const paged: (string | undefined)[] = []
          for (let offset = 0; offset < list.length; offset += limit)
            paged.push(...fit(setup, kind, list, { limit, offset }).answers.map(({ gear }) => gear?.slug))
          expect(paged).toEqual(whole)
        }),
        { numRuns: 10 },
      )
    },
    patienceMs,
  )
})
