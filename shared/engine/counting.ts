/** "1 outlet", "2 outlets". */
export const countOf = (count: number, word: string): string => `${count} ${word}${count === 1 ? '' : 's'}`

/** "none is free", "only 2 are free". */
export const sayFree = (free: number): string =>
  free <= 0 ? 'none is free' : `only ${free} ${free === 1 ? 'is' : 'are'} free`

/** A caution for pieces of the setup that do not state what had to be added up. */
export const sayUncounted = (pieces: number, what: string) => () =>
  `${countOf(pieces, 'piece')} in the setup ${pieces === 1 ? 'states' : 'state'} no ${what} and could not be counted.`

/** "ammonia", "ammonia and nitrite", "ammonia, nitrite and nitrate". */
export function joinNames(names: readonly string[], last: 'and' | 'or' = 'and'): string {
  const head = names.slice(0, -1).join(', ')
  return head === '' ? (names[0] ?? '') : `${head} ${last} ${names.at(-1)}`
}
