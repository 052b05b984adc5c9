/**
 * @typedef {object} Row
 * @property {string} name
 * @property {string} unit of the figures; the ratio has none
 * @property {import('./figures.mjs').Figures | null} figures null: there is one value alone
 * @property {number} value what the target speaks of, or the rate that a load reached
 * @property {number | null} ratio to the yardstick of the same run
 * @property {string} yardstick
 * @property {{ of: 'value' | 'ratio' | 'p95', least?: number, most?: number } | null} target
 */

const print = (/** @type {number | null | undefined} */ value) =>
  value === null || value === undefined || Number.isNaN(value) ? '' : value.toPrecision(3)

const round = (/** @type {number | null | undefined} */ value) =>
  typeof value === 'number' && Math.abs(value) >= 100 ? String(Math.round(value)) : print(value)

/** Whether the target is met; null where there is none. */
export function isMet(/** @type {Row} */ { target, value, ratio, figures }) {
  if (!target) return null
  const judged = { value, ratio: ratio ?? NaN, p95: figures?.p95 ?? NaN }[target.of]
  return judged >= (target.least ?? -Infinity) && judged <= (target.most ?? Infinity)
}

function describeTarget(/** @type {Row} */ row) {
  const { target } = row
  if (!target) return ''
  const limit = target.least === undefined ? `≤ ${target.most}` : `≥ ${target.least}`
  return `${target.of} ${limit}: ${isMet(row) ? 'met' : 'MISSED'}`
}

/** Lines of equal columns. */
export function drawTable(/** @type {readonly Row[]} */ rows) {
  const head = ['measure', 'unit', 'value', 'min', 'median', 'p95', 'ratio', 'to', 'target']
  const cells = rows.map((row) => [
    row.name,
    row.unit,
    round(row.value),
    round(row.figures?.min),
    round(row.figures?.median),
    round(row.figures?.p95),
    round(row.ratio),
    row.yardstick,
    describeTarget(row),
  ])
  const widths = head.map((title, at) => Math.max(title.length, ...cells.map((line) => (line[at] ?? '').length)))
  return [head, ...cells].map((line) =>
    line
      .map((cell, at) => cell.padEnd(widths[at] ?? 0))
      .join('  ')
      .trimEnd(),
  )
}
