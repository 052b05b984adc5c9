import { listSlips, undoSlip, type Slip } from './slips'
import type { Doubt, Suggestion } from './types'
import type { MeasureAttribute } from '../kinds/types'
import type { Printer } from '../units/print'

type Range = readonly [number, number]

/** Two people who measure the same thing differ by less; a slip hits its factor closer. */
const largeTolerance = 0.04
/** The factors of mixed-up units can be small: such a ratio has to be all but exact to be no honest correction. */
const smallTolerance = 0.01
const largeFactor = 8
/** Apart by less than this, two numbers are one as printed. */
const sameShare = 1e-6

const isWithin = (value: number, [low, high]: Range): boolean => value >= low && value <= high

export const isSameNumber = (a: number, b: number): boolean =>
  Math.abs(a - b) <= sameShare * Math.max(Math.abs(a), Math.abs(b))

const distance = (a: number, b: number): number => (a > 0 && b > 0 ? Math.abs(Math.log(a / b)) : Infinity)

const canBe = ({ unit, plausible }: MeasureAttribute, value: number): boolean =>
  isWithin(value, plausible) && (unit !== 'count' || Number.isInteger(value))

function suggest(attribute: MeasureAttribute, value: number, slip: Slip, printer: Printer): Suggestion[] {
  const meant = undoSlip(value, slip)
  if (!canBe(attribute, meant)) return []
  return [{ value: meant, printed: printer.measure(meant, attribute.unit, { finer: 1 }), because: slip.because }]
}

function isHit(ratio: number, { factor }: Slip): boolean {
  const tolerance = Math.max(factor, 1 / factor) >= largeFactor ? largeTolerance : smallTolerance
  return Math.abs(ratio / factor - 1) <= tolerance
}

/** The middle of the usual range as people size things, by factors. */
const findMiddle = ([low, high]: Range): number => (low > 0 ? Math.sqrt(low * high) : (low + high) / 2)

function judgeAgainstRecorded(
  path: string,
  attribute: MeasureAttribute,
  value: number,
  recorded: number,
  printer: Printer,
): Doubt | undefined {
  const slip = listSlips(attribute).find((one) => isHit(value / recorded, one))
  const suggestions = slip ? suggest(attribute, value, slip, printer) : []
  if (!slip || suggestions.length === 0) return undefined
  const [now, was] = [value, recorded].map((one) => printer.measure(one, attribute.unit, { finer: 1 }))
  const times = Number(Math.max(slip.factor, 1 / slip.factor).toPrecision(3))
  const detail =
    slip.factor > 1 ? `${now} is ${times} times the recorded ${was}.` : `The recorded ${was} is ${times} times ${now}.`
  return { path, rule: 'slip', value, detail, suggestions }
}

function judgeAgainstUsual(
  path: string,
  attribute: MeasureAttribute,
  value: number,
  recorded: number | undefined,
  printer: Printer,
): Doubt | undefined {
  const { usual, unit, label } = attribute
  if (isWithin(value, usual)) return undefined
  const near = recorded ?? findMiddle(usual)
  const suggestions = listSlips(attribute)
    .filter((slip) => isWithin(undoSlip(value, slip), usual))
    .flatMap((slip) => suggest(attribute, value, slip, printer))
    .toSorted((a, b) => distance(a.value, near) - distance(b.value, near))
  const side = value < usual[0] ? 'below' : 'above'
  const printed = printer.measure(value, unit, { finer: 1 })
  return {
    path,
    rule: suggestions.length > 0 ? 'slip' : 'usual',
    value,
    detail: `${printed} is ${side} what ${label} usually is, ${printer.pair(usual, unit)}.`,
    suggestions,
  }
}

/** What is unlikely about one number; undefined where nothing is. A number that stays as recorded is not judged. */
export function judgeValue(
  path: string,
  attribute: MeasureAttribute,
  value: number,
  recorded: number | undefined,
  printer: Printer,
): Doubt | undefined {
  if (!Number.isFinite(value)) return undefined
  if (recorded !== undefined && isSameNumber(value, recorded)) return undefined
  const against =
    recorded === undefined || recorded <= 0 || value <= 0
      ? undefined
      : judgeAgainstRecorded(path, attribute, value, recorded, printer)
  return against ?? judgeAgainstUsual(path, attribute, value, recorded, printer)
}
