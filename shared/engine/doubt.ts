import { combineUncertainties, standardUncertainty } from './physics/conformance'
import type { Judgement } from './rule'
import type { TankPlan } from './setup/plan'
import type { Basin } from './setup/places'
import type { Value } from './types'

/** A number that a check rests on: its standard uncertainty in the check's unit, and what would make it surer. */
export interface Doubt {
  readonly u: number
  /** "measure the rear chamber", "check its length" */
  readonly settle: string
}

/** `factor`: how much the check's figure moves with the number. */
export const doubt = (
  { value, source, plusMinus }: Value<number>,
  quantity: 'length' | 'other',
  settle: string,
  factor = 1,
): Doubt => ({ u: Math.abs(factor) * standardUncertainty(value, source, plusMinus, quantity), settle })

/** One size of a chamber, sump or display. */
export const doubtBasin = ({ name, source, plusMinus }: Basin, sizeMm: number): Doubt =>
  doubt({ value: sizeMm, source, ...(plusMinus !== undefined && { plusMinus }) }, 'length', `measure the ${name}`)

/** A figure that follows from the tank's sizes, such as its volume, in a share that its source's usual ± gives. */
export const doubtTank = (figure: number, { source }: TankPlan): Doubt =>
  doubt({ value: figure, source }, 'other', 'measure the tank')

/** What the most uncertain number is settled by. */
const findSettle = (doubts: readonly Doubt[]): string | undefined =>
  doubts.reduce<Doubt | undefined>((worst, one) => (!worst || one.u > worst.u ? one : worst), undefined)?.settle

/**
 * How sure a check is: the probability that its limit is kept, by the uncertainties of what it rests on taken together
 * (JCGM 106:2012), and what to measure first. Asked for only where somebody reads it.
 */
export const beSure = (
  probabilityWith: (u: number) => number,
  list: () => readonly Doubt[],
): Required<Pick<Judgement, 'probability' | 'settle'>> => ({
  probability: () => probabilityWith(combineUncertainties(...list().map(({ u }) => u))),
  settle: () => findSettle(list()),
})
