import type { BareSpecs } from '../kinds/types'

/** Far from what is usual · off by a factor that people slip by · at odds with another value of the piece. */
export type DoubtRule = 'usual' | 'slip' | 'pair'

export interface Suggestion {
  /** In the canonical unit of the value in doubt. */
  readonly value: number
  /** In the reader's units: "10.6 in". */
  readonly printed: string
  /** What would have happened: "inches taken for millimetres". */
  readonly because: string
}

/** A question about one number. It blocks nothing: whoever proposed it takes a suggestion or says why it is right. */
export interface Doubt {
  /** Dotted, inside the specs: `lengthMm`, `chambers.0.widthMm`. */
  readonly path: string
  readonly rule: DoubtRule
  readonly value: number
  /** A sentence in the reader's units. */
  readonly detail: string
  /** The likeliest first; none where nothing usual is near. */
  readonly suggestions: readonly Suggestion[]
}

export interface SpecsChange {
  /** The whole specs as they would be. */
  readonly values: BareSpecs
  /** As they are now; empty for a new piece. What is the same in both is not judged. */
  readonly before: BareSpecs
}
