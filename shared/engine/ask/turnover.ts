import { namedUnits } from '../../units/unit-names'
import { amountIn, createAmount, printAmount, type Amount } from './amounts'
import type { Draft } from './draft'
import type { Measure } from './measures'
import type { Reading } from './reading'

/** What one number stands for as a goal: from 0.8 to 1.25 of it (common practice; the return pump's flow check). */
const around = [0.8, 1.25] as const
const perHour = namedUnits.turnover[0]

const round = (value: number): number => Number(value.toPrecision(4))

const setTurnover = (draft: Draft, from: number, to: number): boolean => {
  const ends = from === to ? [from * around[0], to * around[1]] : [from, to]
  const [low, high] = ends.map((value) => createAmount(round(value), 'turnover', perHour))
  return (
    low !== undefined &&
    high !== undefined &&
    draft.setAmount('goals.turnoverPerHour.0', low) &&
    draft.setAmount('goals.turnoverPerHour.1', high)
  )
}

const endsOf = (measure: Measure): readonly [Amount, Amount] | undefined => {
  const [first, last] = [measure.amounts[0], measure.amounts.at(-1)]
  return first === undefined || last === undefined ? undefined : [first, last]
}

const printEnds = (first: Amount, last: Amount): string =>
  first === last ? printAmount(last) : `${printAmount(first)} to ${printAmount(last)}`

/** Reads "10x turnover", "5-10 times per hour". */
export const readTurnover = ({ draft }: Reading, measure: Measure): boolean => {
  const ends = endsOf(measure)
  if (ends === undefined || !setTurnover(draft, amountIn(ends[0], '/h'), amountIn(ends[1], '/h'))) return false
  draft.note({ meaning: `turnover ${printEnds(...ends)}`, path: 'goals.turnoverPerHour.0' }, measure)
  return true
}

/** A return pump's flow is a goal of turnover, once the tank's volume is read. */
export const readReturnFlow = ({ draft, kind }: Reading, measure: Measure): boolean => {
  const litres = draft.fields['tank.volumeL']?.value
  const ends = endsOf(measure)
  if (kind !== 'return-pump' || typeof litres !== 'number' || ends?.[1].quantity !== 'flow') return false
  const [from, to] = ends.map((end) => amountIn(end, 'L/h') / litres)
  if (from === undefined || to === undefined || !setTurnover(draft, from, to)) return false
  const times =
    from === to ? String(Number(to.toPrecision(2))) : `${Number(from.toPrecision(2))} to ${Number(to.toPrecision(2))}`
  draft.note(
    { meaning: `return flow ${printEnds(...ends)}, ${times} times an hour`, path: 'goals.turnoverPerHour.0' },
    measure,
  )
  return true
}
