interface Cover {
  readonly count: number
  /** Sum of the places in the list: of covers that are as small, the one of what comes first. */
  readonly places: number
  readonly chosen: readonly number[]
}

const isBetter = (a: Cover, b: Cover | undefined): boolean =>
  b === undefined || a.count < b.count || (a.count === b.count && a.places < b.places)

/**
 * The fewest sets that together hold everything wanted, as their places in the list; undefined where all of them do not.
 * Exact: dynamic programming over the subsets of what is wanted, which are few (2 to the power of its length).
 */
export function findCheapestCover<T>(
  wanted: readonly T[],
  sets: readonly (readonly T[])[],
): readonly number[] | undefined {
  const everything = 2 ** wanted.length - 1
  const firstWith = new Map<number, number>()
  sets.forEach((set, place) => {
    const mask = wanted.reduce((bits, one, bit) => (set.includes(one) ? bits | (1 << bit) : bits), 0)
    if (mask !== 0 && !firstWith.has(mask)) firstWith.set(mask, place)
  })
  const best: (Cover | undefined)[] = [{ count: 0, places: 0, chosen: [] }]
  for (let held = 0; held <= everything; held += 1) {
    const reached = best[held]
    if (!reached) continue
    for (const [mask, place] of firstWith) {
      if ((held | mask) === held) continue
      const cover = {
        count: reached.count + 1,
        places: reached.places + place,
        chosen: [...reached.chosen, place],
      }
      if (isBetter(cover, best[held | mask])) best[held | mask] = cover
    }
  }
  return best[everything]?.chosen
}
