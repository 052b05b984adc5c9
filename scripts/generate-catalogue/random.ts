/** Numbers that look random and are the same in every run. */
export interface Random {
  /** From 0 up to, but not including, 1. */
  readonly next: () => number
  readonly between: (low: number, high: number) => number
  readonly pick: <T>(list: readonly T[]) => T
  readonly chance: (share: number) => boolean
}

/** Mulberry32: 32 bits of state, plenty for made-up gear; the constants are the generator's own. */
export function createRandom(seed: number): Random {
  let state = seed >>> 0
  const next = () => {
    state = (state + 0x6d2b79f5) >>> 0
    let mixed = Math.imul(state ^ (state >>> 15), state | 1)
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61)
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 2 ** 32
  }
  return {
    next,
    between: (low, high) => low + (high - low) * next(),
    pick: <T>(list: readonly T[]): T => {
      const picked = list[Math.floor(next() * list.length)]
      if (picked === undefined) throw new RangeError('There is nothing to pick from.')
      return picked
    },
    chance: (share) => next() < share,
  }
}
