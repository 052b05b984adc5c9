/**
 * Damerau–Levenshtein distance (optimal string alignment): letters added, lost, changed, or two neighbours swapped.
 * `limit + 1` where it is more than `limit`. F. J. Damerau, CACM 7(3), 1964.
 */
export const measureDistance = (a: string, b: string, limit: number): number => {
  const tooFar = limit + 1
  if (Math.abs(a.length - b.length) > limit) return tooFar
  let before: number[] = []
  let above = Array.from({ length: b.length + 1 }, (_, index) => index)
  for (let i = 1; i <= a.length; i++) {
    const row = [i]
    let least = i
    for (let j = 1; j <= b.length; j++) {
      const same = a[i - 1] === b[j - 1]
      let cost = Math.min((above[j] ?? 0) + 1, (row[j - 1] ?? 0) + 1, (above[j - 1] ?? 0) + (same ? 0 : 1))
      const isSwap = i > 1 && j > 1 && a[i - 1] === b[j - 2] && a[i - 2] === b[j - 1]
      if (isSwap) cost = Math.min(cost, (before[j - 2] ?? 0) + 1)
      row.push(cost)
      if (cost < least) least = cost
    }
    // A swap reaches one row back, so one row past the limit is no proof yet.
    if (least > tooFar) return tooFar
    before = above
    above = row
  }
  return Math.min(above[b.length] ?? tooFar, tooFar)
}

/** How many slips of the finger a word of this length may have before it is another word. */
export const allowedSlips = (length: number): number => (length < 3 ? 0 : length < 6 ? 1 : length < 9 ? 2 : 3)
