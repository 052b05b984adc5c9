/** Lowest lane first: the first in which each position keeps its distance from the one before. Positions ascend. */
export function assignLanes(positionsPx: readonly number[], spacingPx: number, lanes: number): readonly number[] {
  const ends = Array.from({ length: lanes }, () => -Infinity)
  return positionsPx.map((position) => {
    const free = ends.findIndex((end) => position - end >= spacingPx)
    // All lanes taken: where the overlap is least.
    const lane = free >= 0 ? free : ends.indexOf(Math.min(...ends))
    ends[lane] = position
    return lane
  })
}
