/**
 * So many of a list, the same ones for the same seed. Mulberry32, whose constants are the generator's own, and a shuffle
 * from the front (Fisher and Yates).
 * @template T
 * @param {readonly T[]} list
 * @param {number} count
 * @param {number} seed
 * @returns {T[]}
 */
export function drawSample(list, count, seed) {
  let state = seed >>> 0
  const next = () => {
    state = (state + 0x6d2b79f5) >>> 0
    let mixed = Math.imul(state ^ (state >>> 15), state | 1)
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61)
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 2 ** 32
  }
  const left = [...list]
  const most = Math.min(count, left.length)
  for (let at = 0; at < most; at += 1) {
    const other = at + Math.floor(next() * (left.length - at))
    const [a, b] = [left[at], left[other]]
    if (a !== undefined && b !== undefined) [left[at], left[other]] = [b, a]
  }
  return left.slice(0, most)
}
