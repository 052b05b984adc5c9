/**
 * @typedef {import('./list-mutants.mjs').Mutant} Mutant
 * @typedef {import('./try-mutant.mjs').Fate} Fate
 * @typedef {Mutant & { fate: Fate }} Tried
 */

const isNoticed = (/** @type {Tried} */ { fate }) => fate === 'killed' || fate === 'timed out'

const clip = (/** @type {string} */ text) => {
  const line = text.replaceAll(/\s+/g, ' ')
  return line.length > 60 ? `${line.slice(0, 57)}…` : line
}

/** "shared/engine/physics/heat.ts:40 arithmetic: * → /" */
const describe = (/** @type {Tried} */ { file, line, operator, was, becomes, fate }) =>
  `  ${file}:${line} ${operator}: ${clip(was)} → ${clip(becomes)}${fate === 'not reached' ? ' (no test reaches it)' : ''}`

/**
 * How many faults were noticed, by their sort, and each that was not.
 * @param {readonly Tried[]} tried
 */
export function writeReport(tried) {
  const operators = [...new Set(tried.map(({ operator }) => operator))].sort()
  const count = (/** @type {readonly Tried[]} */ some) => `${some.filter(isNoticed).length} of ${some.length}`
  const rows = operators.map(
    (operator) => `  ${operator.padEnd(12)}${count(tried.filter((one) => one.operator === operator))}`,
  )
  const survivors = tried
    .filter((one) => !isNoticed(one))
    .sort((a, b) => (a.file < b.file ? -1 : a.file > b.file ? 1 : a.line - b.line))
  const share = tried.length === 0 ? 0 : (100 * tried.filter(isNoticed).length) / tried.length
  return [
    `Noticed ${count(tried)} faults (${share.toFixed(1)} %):`,
    ...rows,
    ...(survivors.length > 0 ? ['Not noticed:', ...survivors.map(describe)] : []),
  ].join('\n')
}
