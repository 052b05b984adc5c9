import type { KindKey } from '../../kinds/index'
import type { UnitSystem } from '../../units/systems'
import type { Draft, Span } from './draft'
import type { Landmark } from './landmarks'
import type { Measure } from './measures'
import type { Token } from './token'

/** Everything that a reader of one sort of measure looks at. */
export interface Reading {
  readonly tokens: readonly Token[]
  readonly system: UnitSystem
  readonly kind: KindKey | null
  /** The text speaks of a piece that is to be replaced. */
  readonly isGone: boolean
  readonly measures: readonly Measure[]
  readonly landmarks: readonly Landmark[]
  readonly draft: Draft
  /** By each token that they cover. */
  readonly landmarkAt: ReadonlyMap<number, Landmark>
  readonly measureAt: ReadonlyMap<number, Measure>
}

export const byToken = <T extends Span>(spans: readonly T[]): ReadonlyMap<number, T> =>
  new Map(
    spans.flatMap((span) =>
      Array.from({ length: span.to - span.from }, (_, offset) => [span.from + offset, span] as const),
    ),
  )
