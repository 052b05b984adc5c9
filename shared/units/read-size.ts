import { findShownUnit } from './convert'
import { describeExample } from './examples'
import { longestTyped, normaliseTyped } from './normalise'
import { createPrinter } from './print'
import { refuse, type Refusal } from './read-number'
import { readMeasure } from './read'
import { unitSystems, type UnitSystem } from './systems'

export interface SizeReading {
  readonly ok: true
  /** In the order typed. */
  readonly valuesMm: readonly number[]
  /** No unit was typed; the system's own was taken. */
  readonly assumedUnit: boolean
  /** In both systems, the reader's own first: "4 × 5 × 12 in = 101.6 × 127 × 304.8 mm". */
  readonly echo: string
}

const separator = / ?(?:×|\*|x|\bby\b) ?/
const fewest = 2
const most = 3

/**
 * Two or three lengths in a row: `24 x 18 x 12`, `60×45×40 cm`, `24" by 18" by 12"`. One without a unit takes that of
 * the next that has one, else of the last before it, else the system's.
 */
export const readSize = (text: string, system: UnitSystem): SizeReading | Refusal => {
  const example = describeExample('mm', system)
  if (text.length > longestTyped) return refuse('This is too long; a size is expected, such as 24 x 18 x 12 in.')
  const typed = normaliseTyped(text).split(separator)
  if (typed.length < fewest || typed.length > most) {
    return refuse(`Write two or three lengths with an x between them, such as ${example} x ${example}.`)
  }

  const first = typed.map((part) => readMeasure(part, 'mm', system))
  const refused = first.find((reading) => !reading.ok)
  if (refused !== undefined && !refused.ok) return refused

  const given = first.map((reading) =>
    reading.ok && !reading.assumedUnit ? reading.unitRead.split(' ').at(-1) : undefined,
  )
  const assumedUnit = given.every((symbol) => symbol === undefined)
  const valuesMm: number[] = []
  for (const [index, part] of typed.entries()) {
    const symbol =
      given.slice(index).find((each) => each !== undefined) ??
      given.slice(0, index).findLast((each) => each !== undefined) ??
      findShownUnit('mm', system).symbol
    const reading = readMeasure(given[index] === undefined ? `${part} ${symbol}` : part, 'mm', system)
    if (!reading.ok) return reading
    valuesMm.push(reading.value)
  }
  const ownFirst = unitSystems.toSorted((a, b) => Number(b === system) - Number(a === system))
  const echo = ownFirst.map((each) => createPrinter(each).size(valuesMm, { finer: 1 })).join(' = ')
  return { ok: true, valuesMm, assumedUnit, echo }
}
