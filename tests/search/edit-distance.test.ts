import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { measureDistance } from '../../shared/search/edit-distance'

/** The definition itself (optimal string alignment), with no shortcuts: exponential, so for short words only. */
function measureByDefinition(a: string, b: string): number {
  if (a === '' || b === '') return a.length + b.length
  const rest = (i: number, j: number) => measureByDefinition(a.slice(i), b.slice(j))
  const swap = a.length > 1 && b.length > 1 && a[0] === b[1] && a[1] === b[0] ? rest(2, 2) + 1 : Infinity
  return Math.min(rest(1, 0) + 1, rest(0, 1) + 1, rest(1, 1) + (a[0] === b[0] ? 0 : 1), swap)
}

describe('the distance between two words', () => {
  // "kitten" to "sitting" is the usual textbook example (Levenshtein distance 3); "ca" to "abc" is 3 in optimal string alignment.
  it.each([
    ['kitten', 'sitting', 3],
    ['ca', 'abc', 3],
    ['ember', 'ember', 0],
    ['ember', 'embre', 1],
    ['', 'abc', 3],
  ])('from %j to %j is %d', (a, b, distance) => {
    expect(measureDistance(a, b, 5)).toBe(distance)
  })

  it('is what the definition says, up to the limit', () => {
    const words = fc.string({ unit: fc.constantFrom('a', 'b', 'c'), maxLength: 6 })
    fc.assert(
      fc.property(words, words, fc.integer({ min: 0, max: 4 }), (a, b, limit) => {
        expect(measureDistance(a, b, limit)).toBe(Math.min(measureByDefinition(a, b), limit + 1))
      }),
    )
  })
})
