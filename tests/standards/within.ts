import { expect } from 'vitest'

/** Absolute tolerance, stated beside each published value. */
export function expectWithin(actual: number | null | undefined, expected: number, tolerance: number): void {
  expect(actual, `${actual} should be ${expected} ± ${tolerance}`).toSatisfy(
    (value: unknown) => typeof value === 'number' && Math.abs(value - expected) <= tolerance,
  )
}

/** Relative tolerance. */
export function expectWithinShare(actual: number | null | undefined, expected: number, share: number): void {
  expectWithin(actual, expected, Math.abs(expected) * share)
}
