import { findBound } from './cues'
import type { Measure } from './measures'
import { findNearest } from './nearest'
import { indexPhrases, matchAt } from './phrases'
import type { Reading } from './reading'
import { amountIn, printAmount, withUnit } from './amounts'
import { namedUnits, type NamedUnit } from '../../units/unit-names'

const outletWords = 'outlet, socket, plug, way, gang, receptacle, port'
const outlets = indexPhrases<'plain' | 'wall' | 'switched'>([
  ...outletWords.split(', ').map((word) => [word, 'plain'] as const),
  ...['switched', 'switchable', 'controllable'].flatMap(
    (word) =>
      [
        [`${word} outlet`, 'switched'],
        [`${word} socket`, 'switched'],
      ] as const,
  ),
  ...['free', 'wall', 'free wall', 'spare'].flatMap(
    (word) =>
      [
        [`${word} outlet`, 'wall'],
        [`${word} socket`, 'wall'],
      ] as const,
  ),
])
const hasOutlets: ReadonlySet<string | null> = new Set(['power-strip', 'temperature-controller'])

/** Reads "8 outlets", "4 switched outlets", "2 free wall outlets". */
export const readOutlets = (reading: Reading, measure: Measure): boolean => {
  const { tokens, draft, kind } = reading
  const amount = measure.amounts.at(-1)
  const isBare = measure.shape === 'single' && amount?.quantity === undefined
  const at = tokens[measure.to]?.text === '-' ? measure.to + 1 : measure.to
  const mention = isBare ? matchAt(outlets, tokens, at) : undefined
  const count = amount?.parts[0]?.value
  if (mention === undefined || count === undefined || !Number.isInteger(count)) return false
  const isOfPiece = hasOutlets.has(kind) && mention.means !== 'wall'
  const bound = findBound(reading, measure)
  const cues = bound === undefined ? [mention] : [mention, bound]
  if (isOfPiece && !(mention.means === 'switched' && kind !== 'power-strip')) {
    const key = mention.means === 'switched' ? 'switchedOutlets' : 'outlets'
    if (!draft.setFilter(key, bound?.means === 'most' ? [null, count] : [count, null])) return false
    draft.note(
      {
        meaning: `${bound?.means === 'most' ? 'at most' : 'at least'} ${count} ${mention.means === 'switched' ? 'switched ' : ''}outlets`,
      },
      measure,
      ...cues,
    )
    return true
  }
  const path = mention.means === 'switched' ? 'goals.switchedOutlets' : 'mains.outlets'
  if (!draft.setField(path, count, String(count))) return false
  draft.note(
    { meaning: `${count} ${mention.means === 'switched' ? 'switched outlets' : 'free wall outlets'}`, path },
    measure,
    ...cues,
  )
  return true
}

interface Bare {
  readonly subject: 'salinity' | 'feed' | 'humidity'
  readonly path: string
  readonly name: string
  readonly unit: NamedUnit | undefined
  readonly canonical: 'ppt' | 'ppm' | 'fraction'
  readonly likely: readonly [number, number]
}

const bares: readonly Bare[] = [
  {
    subject: 'salinity',
    path: 'goals.salinityPpt',
    name: 'salinity',
    unit: namedUnits.salinity[0],
    canonical: 'ppt',
    likely: [20, 45],
  },
  {
    subject: 'feed',
    path: 'water.feedTdsPpm',
    name: 'tap dissolved solids',
    unit: namedUnits.concentration[0],
    canonical: 'ppm',
    likely: [5, 2000],
  },
]
const beside = 2

/** Reads "salinity 35" and "TDS of 180": numbers whose unit goes without saying. */
export const readBareNumber = (reading: Reading, measure: Measure): boolean => {
  const { draft, tokens } = reading
  const amount = measure.amounts[0]
  if (measure.shape !== 'single' || amount === undefined || amount.quantity !== undefined) return false
  for (const { subject, path, name, unit, canonical, likely } of bares) {
    const near = findNearest(reading, measure, (landmark) => landmark.subject === subject)
    const value = amount.parts[0]?.value ?? 0
    const isSolids =
      near !== undefined &&
      (subject !== 'feed' || tokens.slice(near.landmark.from, near.landmark.to).some(({ text }) => text === 'tds'))
    if (
      near === undefined ||
      near.cost > beside ||
      !isSolids ||
      unit === undefined ||
      value < likely[0] ||
      value > likely[1]
    )
      continue
    const full = withUnit(amount, canonical === 'ppt' ? 'salinity' : 'concentration', unit)
    if (!draft.setField(path, amountIn(full, canonical), printAmount(full))) return false
    draft.note({ meaning: `${name} ${printAmount(full)}`, path }, measure, near.landmark)
    return true
  }
  return false
}
