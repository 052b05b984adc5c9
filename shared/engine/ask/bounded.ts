import { getAttribute } from '../../kinds/index'
import { amountIn, printAmount } from './amounts'
import type { Span } from './draft'
import type { Measure } from './measures'
import type { Reading } from './reading'
import type { Filter } from './types'
import type { Bound } from './words/compare-words'
import type { CanonicalUnit } from '../../units/units'

/** "About" is a tenth to either side. */
const aboutShare = 0.1
/** A piece that has gone is looked for within a quarter of what it was. */
const goneShare = 0.25

export interface Target {
  readonly key: string
  readonly unit: CanonicalUnit
  readonly bound: Bound | undefined
  /** A number alone means about that rather than exactly that. */
  readonly loose?: boolean
}

const round = (value: number): number => Number(value.toPrecision(12))

const around = (value: number, share: number): Filter => [round(value * (1 - share)), round(value * (1 + share))]

const describeBound = { most: 'at most', least: 'at least', about: 'about' } as const

const toFilter = (low: number, high: number, { bound, loose }: Target, isGone: boolean): Filter => {
  if (low !== high) return [Math.min(low, high), Math.max(low, high)]
  if (bound === 'most') return [null, high]
  if (bound === 'least') return [low, null]
  if (bound === 'about' || loose) return around(low, isGone ? goneShare : aboutShare)
  return isGone ? around(low, goneShare) : [low, high]
}

/** Narrows the pieces by a number of theirs. */
export const readBounded = (reading: Reading, measure: Measure, target: Target, cues: readonly Span[]): boolean => {
  const { draft, isGone } = reading
  const first = measure.amounts[0]
  const last = measure.amounts.at(-1)
  if (first === undefined || last === undefined) return false
  const filter = toFilter(amountIn(first, target.unit), amountIn(last, target.unit), target, isGone)
  if (target.key === 'grain') return readGrain(reading, measure, filter, cues)
  if (!draft.setFilter(target.key, filter)) return false
  const isRange = measure.shape === 'range'
  const isAbout = target.bound === undefined && (target.loose === true || isGone)
  const prefix =
    target.bound !== undefined && !isRange ? `${describeBound[target.bound]} ` : isAbout && !isRange ? 'about ' : ''
  const numbers = isRange ? `${printAmount(first, false)} to ${printAmount(last)}` : printAmount(last)
  const label = reading.kind === null ? undefined : getAttribute(reading.kind, target.key)?.label
  draft.note({ meaning: `${label === undefined ? '' : `${label} `}${prefix}${numbers}` }, measure, ...cues)
  return true
}

const readGrain = ({ draft }: Reading, measure: Measure, filter: Filter, cues: readonly Span[]): boolean => {
  if (!Array.isArray(filter)) return false
  const [low, high] = filter as readonly [number | null, number | null]
  const hasSet = [
    low !== null && draft.setFilter('grainMinMm', [low, null]),
    high !== null && draft.setFilter('grainMaxMm', [null, high]),
  ]
  if (!hasSet.includes(true)) return false
  const ends = measure.amounts.map((amount) => printAmount(amount))
  draft.note({ meaning: `grains of ${[...new Set(ends)].join(' to ')}` }, measure, ...cues)
  return true
}
