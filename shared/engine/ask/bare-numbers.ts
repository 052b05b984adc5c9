import { namedUnits, type NamedUnit } from '../../units/unit-names'
import type { Quantity } from '../../units/units'
import { findLast } from '../physics/bisect'
import { specificGravity } from '../physics/seawater'
import { createAmount, printAmount, type Amount } from './amounts'
import type { Measure } from './measures'
import { findNearest } from './nearest'
import type { Reading } from './reading'

interface Bare {
  readonly subject: 'salinity' | 'feed'
  /** A word of the subject that must be there: pressure and dissolved solids are both of the tap. */
  readonly word?: string
  readonly path: string
  readonly name: string
  readonly quantity: Quantity
  readonly unit: NamedUnit | undefined
  readonly likely: readonly [number, number]
}

const bares: readonly Bare[] = [
  {
    subject: 'salinity',
    path: 'goals.salinityPpt',
    name: 'salinity',
    quantity: 'salinity',
    unit: namedUnits.salinity[0],
    likely: [20, 45],
  },
  {
    subject: 'feed',
    word: 'tds',
    path: 'water.feedTdsPpm',
    name: 'tap dissolved solids',
    quantity: 'concentration',
    unit: namedUnits.concentration[0],
    likely: [5, 2000],
  },
]
const beside = 2
/** Both temperatures of the specific gravity that the trade's instruments show, °C. */
const gravityC = 25
const likelyGravity = [1.01, 1.035] as const
const mostPpt = 50

/** "1.025" is a specific gravity; the salinity that has it, to a tenth. */
const fromGravity = (gravity: number): Amount | undefined => {
  if (gravity < likelyGravity[0] || gravity > likelyGravity[1]) return undefined
  const ppt = findLast((salinityPpt) => specificGravity(salinityPpt, gravityC, gravityC) <= gravity, 0, mostPpt)
  return ppt === null ? undefined : createAmount(Math.round(ppt * 10) / 10, 'salinity', namedUnits.salinity[0])
}

const toAmount = (value: number, { subject, quantity, unit, likely }: Bare): Amount | undefined => {
  if (value >= likely[0] && value <= likely[1]) return createAmount(value, quantity, unit)
  return subject === 'salinity' ? fromGravity(value) : undefined
}

/** Reads "salinity 35", "SG 1.025" and "TDS of 180": numbers whose unit goes without saying. */
export const readBareNumber = (reading: Reading, measure: Measure): boolean => {
  const { draft, tokens } = reading
  const value = measure.amounts[0]?.parts[0]?.value
  if (measure.shape !== 'single' || value === undefined || measure.amounts[0]?.quantity !== undefined) return false
  for (const bare of bares) {
    const near = findNearest(reading, measure, ({ subject }) => subject === bare.subject)
    if (near === undefined || near.cost > beside) continue
    const amount = toAmount(value, bare)
    if (amount === undefined) continue
    const words = tokens.slice(near.landmark.from, near.landmark.to).map(({ text }) => text)
    if ((bare.word !== undefined && !words.includes(bare.word)) || !draft.setAmount(bare.path, amount)) continue
    const remark = value < likelyGravity[1] ? ` (specific gravity ${value} at 25 °C)` : ''
    draft.note({ meaning: `${bare.name} ${printAmount(amount)}${remark}`, path: bare.path }, measure, near.landmark)
    return true
  }
  return false
}
