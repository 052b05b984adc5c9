import { getAttribute, type KindKey } from '../kinds/index'
import type { BareSpecs, MeasureAttribute } from '../kinds/types'
import type { Printer } from '../units/print'
import { isSameNumber } from './judge-value'
import { pairs, type Pair } from './pairs'
import { listSlips, undoSlip } from './slips'
import type { Doubt, SpecsChange, Suggestion } from './types'

const readNumber = (specs: BareSpecs, key: string): number | undefined => {
  const value = specs[key]
  return typeof value === 'number' && Number.isFinite(value) && value > 0 ? value : undefined
}

const findMeasure = (kind: KindKey, key: string): MeasureAttribute | undefined => {
  const attribute = getAttribute(kind, key)
  return attribute?.type === 'measure' ? attribute : undefined
}

function isChanged({ key, beside }: Pair, { values, before }: SpecsChange): boolean {
  return [key, ...beside].some((one) => {
    const [now, was] = [readNumber(values, one), readNumber(before, one)]
    return now !== undefined && (was === undefined || !isSameNumber(now, was))
  })
}

const isUsual = ({ figure, usual: [low, high] }: Pair, value: number, beside: readonly number[]): boolean => {
  const at = figure(value, beside)
  return at >= low && at <= high
}

function suggest(pair: Pair, attribute: MeasureAttribute, value: number, beside: readonly number[], printer: Printer) {
  const [low, high] = attribute.plausible
  return listSlips(attribute).flatMap((slip): Suggestion[] => {
    const meant = undoSlip(value, slip)
    if (meant < low || meant > high || !isUsual(pair, meant, beside)) return []
    return [{ value: meant, printed: printer.measure(meant, attribute.unit, { finer: 1 }), because: slip.because }]
  })
}

function judgePair(pair: Pair, change: SpecsChange, printer: Printer): Doubt[] {
  const attribute = findMeasure(pair.kind, pair.key)
  const value = readNumber(change.values, pair.key)
  const others = pair.beside.map((key) => ({ key, value: readNumber(change.values, key) }))
  const beside = others.flatMap((other) => other.value ?? [])
  if (!attribute || value === undefined || beside.length < others.length) return []
  if (pair.appliesTo?.(change.values) === false || !isChanged(pair, change)) return []
  if (isUsual(pair, value, beside)) return []
  const printed = printer.measure(value, attribute.unit, { finer: 1 })
  const against = others.map(({ key, value: other }) => {
    const measure = findMeasure(pair.kind, key)
    return measure && other !== undefined ? `${measure.label} ${printer.measure(other, measure.unit)}` : key
  })
  const figure = Number(pair.figure(value, beside).toPrecision(2))
  const [low, high] = pair.usual
  return [
    {
      path: pair.key,
      rule: 'pair',
      value,
      detail: `${printed} does not go with ${against.join(', ')}: that is ${figure} ${pair.words}, usually ${low} to ${high}.`,
      suggestions: suggest(pair, attribute, value, beside, printer),
    },
  ]
}

/** Numbers of the piece that are at odds with each other, where one of them changed. */
export function judgePairs(kind: KindKey, change: SpecsChange, printer: Printer): readonly Doubt[] {
  return pairs.filter((pair) => pair.kind === kind).flatMap((pair) => judgePair(pair, change, printer))
}
