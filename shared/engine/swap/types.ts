import type { KindKey } from '../../kinds/index'
import type { UcumCode } from '../../units/units'
import type { Answer, FitResult, GearRef, Specs } from '../types'

export interface GearCount {
  readonly gear: GearRef
  readonly quantity: number
}

/** What a replacement leaves unmet, and the pieces that meet it: each option is complete, the fewest pieces first. */
export interface AddOn {
  readonly need: string
  /** What is needed, in a sentence. */
  readonly message: string
  /** Empty where nothing in the catalogue is known to meet it. */
  readonly options: readonly (readonly GearCount[])[]
}

/** One attribute in which a replacement is not like what is gone; null: nobody has recorded it. */
export interface Difference {
  readonly key: string
  readonly label: string
  readonly from: unknown
  readonly to: unknown
  readonly unit: UcumCode | null
  readonly sense: 'better' | 'worse' | 'different'
  readonly message: string
}

export interface Replacement extends Answer {
  readonly addOns: readonly AddOn[]
  readonly differences: readonly Difference[]
}

/** The piece whose place is to be taken, and how many of it there were. `id` is its item's, or `tank`. */
export interface Gone {
  readonly id: string
  readonly kind: KindKey
  readonly gear: GearRef | null
  readonly specs: Specs
  readonly quantity: number
}

export interface ReplacementsResult extends Omit<FitResult, 'answers' | 'scales' | 'marks'> {
  readonly gone: Gone
  readonly answers: readonly Replacement[]
}
