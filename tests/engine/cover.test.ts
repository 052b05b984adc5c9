import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { findCheapestCover } from '#shared/engine/cover'

const wanted = ['a', 'b', 'c', 'd']

/** The size of the smallest cover by trying every choice of sets there is. */
function countByTrying(sets: readonly (readonly string[])[]): number | undefined {
  const sizes = Array.from({ length: 2 ** sets.length }, (_, bits) => sets.filter((_set, at) => bits & (1 << at)))
    .filter((chosen) => wanted.every((one) => chosen.some((set) => set.includes(one))))
    .map((chosen) => chosen.length)
  return sizes.length > 0 ? Math.min(...sizes) : undefined
}

describe('the cheapest cover', () => {
  it('is as small as the smallest of all choices of sets, and covers', () => {
    const sets = fc.array(fc.subarray([...wanted, 'e']), { maxLength: 8 })
    fc.assert(
      fc.property(sets, (list) => {
        const chosen = findCheapestCover(wanted, list)
        expect(chosen?.length).toBe(countByTrying(list))
        const held = new Set(chosen?.flatMap((at) => list[at] ?? []))
        if (chosen) expect(wanted.every((one) => held.has(one))).toBe(true)
      }),
    )
  })

  it('is, of covers as small, the one of what comes first', () => {
    expect(findCheapestCover(['a', 'b'], [['a'], ['b'], ['a'], ['b']])).toEqual([0, 1])
    // A greedy choice would begin with the largest set and need three.
    expect(findCheapestCover(wanted, [['a', 'b', 'c'], ['a', 'd'], ['b', 'c'], ['d']])).toHaveLength(2)
  })

  it('is nothing where nothing is wanted, and none where it cannot be had', () => {
    expect(findCheapestCover([], [['a']])).toEqual([])
    expect(findCheapestCover(['a', 'z'], [['a']])).toBeUndefined()
  })
})
