import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { listRules } from '#shared/engine/checks/index'
import { fitCheck } from '#shared/engine/fit'
import type { Answer, Check, Piece } from '#shared/engine/types'
import { kindKeys } from '#shared/kinds/index'
import { resolve } from '#shared/engine/setup/resolve'
import { findInconsistencies } from '#shared/kinds/consistency'
import { anySetup, pieceOf } from '../arbitraries'
import { heater } from '../build'

/** Checks whose limit nothing is measured against: counts, nominal voltages, and what is set or printed on a scale. */
const exact: ReadonlySet<string> = new Set([
  ...listRules()
    .filter(({ unit }) => unit === 'count' || unit === 'V')
    .map(({ id }) => id),
  'temperature-controller.range',
  'salinity-meter.resolution',
])

const anyKind = fc.oneof(
  ...kindKeys.map((kind) => ({ weight: kind === 'light' ? 1 : 4, arbitrary: pieceOf(kind, 10) })),
)

const hasLimit = ({ measured, limit, outcome }: Check) =>
  typeof measured === 'number' && limit !== null && outcome !== 'nodata'

describe('how sure a check is', () => {
  it('is said of every limit that something is measured against', () => {
    const seen = new Set<string>()
    fc.assert(
      fc.property(anySetup, anyKind, (setup, what) => {
        for (const check of fitCheck(setup, what).checks.filter(hasLimit)) {
          if (exact.has(check.id)) continue
          seen.add(check.id)
          expect(check.probability, check.id).toBeTypeOf('number')
          expect(check.probability, check.id).toBeGreaterThanOrEqual(0)
          expect(check.probability, check.id).toBeLessThanOrEqual(1)
        }
      }),
      { numRuns: 250, seed: 20261201 },
    )
    expect(seen.size).toBeGreaterThan(30)
  }, 240_000)

  it('is more than even where something is to spare, less where something lacks, and a close call only in between', () => {
    fc.assert(
      fc.property(anySetup, anyKind, (setup, what) => {
        for (const { id, margin, limit, probability, closeCall } of fitCheck(setup, what).checks) {
          if (probability === undefined) continue
          // Common practice: 5 to 95 %.
          expect(closeCall !== undefined, id).toBe(probability > 0.05 && probability < 0.95)
          if (typeof limit !== 'number' || margin === null || Math.abs(margin) < 1e-3) continue
          expect(probability >= 0.5, `${id} ${margin} ${probability}`).toBe(margin > 0)
        }
      }),
      { numRuns: 200, seed: 20261201 },
    )
  }, 240_000)

  const isConsistent = ({ kind, specs }: Piece) =>
    findInconsistencies(kind, Object.fromEntries(Object.entries(specs).map(([key, one]) => [key, one?.value])))
      .length === 0

  /** A pass that its own numbers deny: outside of its limit, or with next to no chance to be within it. */
  const listDenied = ({ checks }: Pick<Answer, 'checks'>) =>
    checks
      .filter(({ outcome, limit }) => outcome === 'pass' && limit !== null)
      .filter(({ margin, probability }) => (margin ?? 0) < -1e-9 || (probability ?? 1) < 0.05)
      .map(({ id, measured, limit, margin, probability }) => ({ id, measured, limit, margin, probability }))

  it('never denies a pass, whether its limit is one number or the ends of a range', () => {
    const intervals = new Set<string>()
    fc.assert(
      fc.property(anySetup, anyKind.filter(isConsistent), (setup, what) => {
        const answer = fitCheck(setup, what)
        expect(listDenied(answer)).toEqual([])
        for (const { id, outcome, limit } of answer.checks)
          if (outcome === 'pass' && Array.isArray(limit)) intervals.add(id)
      }),
      { numRuns: 400, seed: 20261201 },
    )
    expect(intervals.size).toBeGreaterThan(3)
  }, 240_000)

  it('never denies the pass of a heater that is rated for a little more or less than the tank', () => {
    let passes = 0
    const share = fc.double({ min: 0.75, max: 1.35, noNaN: true })
    fc.assert(
      fc.property(anySetup, share, share, (setup, one, other) => {
        const { ratedL } = resolve(setup).tank
        const [ratedVolumeMinL, ratedVolumeMaxL] = [Math.min(one, other) * ratedL, Math.max(one, other) * ratedL]
        const answer = fitCheck(setup, heater({ ratedVolumeMinL, ratedVolumeMaxL }))
        expect(listDenied(answer)).toEqual([])
        if (answer.checks.some(({ id, outcome }) => id === 'heater.rated-volume' && outcome === 'pass')) passes += 1
      }),
      { numRuns: 150, seed: 20261201 },
    )
    expect(passes).toBeGreaterThan(20)
  }, 240_000)
})
