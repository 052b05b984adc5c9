import { refuse, scanNumber, type Refusal } from './read-number'
import { lookUpUnit } from './read-unit'
import { namedUnits, type NamedUnit } from './unit-names'
import type { Quantity } from './units'

/** A number and its unit, or two of them as in `2 ft 3 1/2 in`. */
export interface Parts {
  readonly ok: true
  readonly parts: readonly { readonly value: number; readonly written: string; readonly unit: NamedUnit }[]
  readonly assumedUnit: boolean
}

/** `unknownUnit` holds what stood where a unit was looked for. */
export type PartsRefusal = Refusal & { readonly unknownUnit?: string }

/** "25 degrees" says that a temperature follows, not on which scale. */
const isBareDegree = (typed: string, quantity: Quantity): boolean =>
  quantity.startsWith('temperature') && /^(°|deg\.?|degrees?)$/.test(typed)

/** Reads normalised text without a sign; a number that names no unit takes `bareUnit`. */
export const readParts = (text: string, quantity: Quantity, bareUnit: NamedUnit): Parts | PartsRefusal => {
  const first = scanNumber(text, 0)
  if (!first.ok) return first
  const rest = text.slice(first.end).trim()
  const one = (unit: NamedUnit, assumedUnit: boolean): Parts => ({
    ok: true,
    parts: [{ value: first.value, written: first.written, unit }],
    assumedUnit,
  })

  if (rest === '' || isBareDegree(rest, quantity)) return one(bareUnit, true)
  const named = lookUpUnit(rest, quantity)
  if (named !== undefined) return one(named, false)
  if (/^\d/.test(rest)) return refuse('Two numbers stand side by side; write one, without spaces between its digits.')
  if (/^- ?\d/.test(rest)) return refuse('This reads like a range; write one number.')

  const second = rest.search(/[.,]?\d/)
  const large = second === -1 ? undefined : lookUpUnit(rest.slice(0, second).replace(/[ ,-]+$/, ''), quantity)
  const small = namedUnits[quantity].find((unit) => unit.symbol === large?.then)
  if (large === undefined || small === undefined) return { ...refuse('Unknown unit.'), unknownUnit: rest }
  return readSmallerPart(rest, second, { ...first, unit: large }, small, quantity)
}

const readSmallerPart = (
  rest: string,
  start: number,
  large: Parts['parts'][number],
  small: NamedUnit,
  quantity: Quantity,
): Parts | PartsRefusal => {
  const number = scanNumber(rest, start)
  if (!number.ok) return number
  const unitText = rest.slice(number.end).trim()
  if (unitText !== '' && lookUpUnit(unitText, quantity) !== small) {
    return { ...refuse('Unknown unit.'), unknownUnit: unitText }
  }
  if (number.value >= Math.round(large.unit.factor / small.factor)) {
    return refuse(
      `"${number.written} ${small.symbol}" after "${large.unit.symbol}" is a whole ${large.unit.symbol} or more.`,
    )
  }
  return {
    ok: true,
    parts: [
      { value: large.value, written: large.written, unit: large.unit },
      { value: number.value, written: number.written, unit: small },
    ],
    assumedUnit: false,
  }
}
