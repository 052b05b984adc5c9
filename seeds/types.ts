import type { KindKey } from '#shared/kinds/index'
import type { Source } from '#shared/engine/types'

/** What backs a value. `plusMinus` is in the value's own unit. */
export interface Backing {
  readonly source: Source
  readonly plusMinus?: number
  readonly evidence?: string
}

export interface SeedValue extends Backing {
  readonly value: unknown
}

/** A change to the state before it: keys that are absent stay, `null` removes. */
export interface SeedRevision {
  /** ISO day */
  readonly date: string
  readonly author: string
  readonly summary?: string
  readonly values: Readonly<Record<string, SeedValue | null>>
}

/** An invented piece of gear with its whole history. */
export interface SeedPiece {
  readonly slug?: string
  readonly kind: KindKey
  readonly brand: string
  readonly model: string
  readonly status: 'current' | 'discontinued' | 'unknown'
  readonly gtin?: string
  readonly notes?: string
  readonly revisions: readonly SeedRevision[]
}
