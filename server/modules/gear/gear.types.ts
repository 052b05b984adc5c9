import type { KindKey } from '#shared/kinds/index'
import type { Source } from '#shared/engine/types'
import type { StoredProvenances, StoredSpecs } from '../../db/schema/index'

export type { GearRow } from './gear.queries'

/** One value with what backs it, in the canonical unit that its key names. */
export interface ValueInput {
  readonly value: unknown
  readonly source: Source
  readonly plusMinus?: number
  readonly evidence?: string
}

/** A change of specs: keys that are absent stay as they are, `null` removes. */
export interface RevisionInput {
  /** ISO day of the measurement or document. */
  readonly date: string
  readonly author: string
  readonly summary?: string
  readonly values: Readonly<Record<string, ValueInput | null>>
}

export interface IdentityInput {
  /** Made from brand and model when absent. */
  readonly slug?: string
  readonly kind: KindKey
  readonly brand: string
  readonly model: string
  readonly status: 'current' | 'discontinued' | 'unknown'
  readonly gtin?: string
  /** Rich text; sanitised before it is stored. */
  readonly notes?: string
}

/** A piece with its whole history, oldest revision first. */
export interface PieceInput extends IdentityInput {
  readonly revisions: readonly RevisionInput[]
}

/** A piece's specs after some revision. */
export interface SpecsState {
  readonly number: number
  readonly specs: StoredSpecs
  readonly provenance: StoredProvenances
}

export interface PreparedRevision {
  readonly state: SpecsState
  readonly input: RevisionInput
}

export interface PreparedPiece {
  readonly identity: IdentityInput & { readonly slug: string }
  readonly revisions: readonly PreparedRevision[]
  readonly first: PreparedRevision
  readonly head: PreparedRevision
}
