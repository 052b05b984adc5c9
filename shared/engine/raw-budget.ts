import type { CanonicalUnit } from '../units/units'
import type { Say } from './rule'

/** What is used of something, before anybody asks for words; null: nothing limits it, or nobody stated what does. */
export interface RawBudget {
  readonly used: number
  readonly limit: number | null
  readonly unit: CanonicalUnit
  readonly say: Say
}
