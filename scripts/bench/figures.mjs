/** @typedef {{ min: number, median: number, p95: number }} Figures */

/** The value below which a share of the others lies: nearest rank. */
function rankAt(/** @type {readonly number[]} */ sorted, /** @type {number} */ share) {
  return sorted[Math.min(sorted.length - 1, Math.max(0, Math.ceil(share * sorted.length) - 1))] ?? NaN
}

/** @returns {Figures} */
export function summarise(/** @type {readonly number[]} */ values) {
  const sorted = [...values].sort((a, b) => a - b)
  return { min: sorted[0] ?? NaN, median: rankAt(sorted, 0.5), p95: rankAt(sorted, 0.95) }
}
