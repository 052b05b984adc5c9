/**
 * The largest x in [low, high] for which `holds` is true, where `holds` is true below some x and false above it.
 * Returns null if it is false already at `low`. Halving brings the answer to `tolerance`, or machine precision; it never
 * fails to converge, which is why it is used here rather than a faster method.
 */
export function findLast(holds: (x: number) => boolean, low: number, high: number, tolerance = 0): number | null {
  if (!holds(low)) return null
  if (holds(high)) return high
  let below = low
  let above = high
  for (let step = 0; step < 100 && above - below > tolerance; step += 1) {
    const middle = (below + above) / 2
    if (middle <= below || middle >= above) break
    if (holds(middle)) below = middle
    else above = middle
  }
  return below
}
