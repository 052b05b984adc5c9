import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { listRules } from '#shared/engine/checks/index'
import { fitCheck } from '#shared/engine/fit'
import type { Check } from '#shared/engine/types'
import { kindKeys } from '#shared/kinds/index'
import { anySetup, pieceOf } from '../arbitraries'

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
})
