import type { KindKey } from '../../kinds/index'
import type { NamedUnit } from '../../units/unit-names'
import type { UnitSystem } from '../../units/systems'
import type { Amount } from './amounts'
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
  /** The place of each measure in the row of all. */
  readonly placeOf: ReadonlyMap<Measure, number>
  /** The scale of the first temperature that names one. */
  readonly scale: NamedUnit | undefined
  /** A height is spoken of, so a depth may run front to back. */
  readonly hasHeight: boolean
}

export const byToken = <T extends Span>(spans: readonly T[]): ReadonlyMap<number, T> =>
  new Map(
    spans.flatMap((span) =>
      Array.from({ length: span.to - span.from }, (_, offset) => [span.from + offset, span] as const),
    ),
  )

const heights: ReadonlySet<string> = new Set(['tall', 'high', 'height'])

type Given = Pick<Reading, 'tokens' | 'system' | 'kind' | 'isGone' | 'measures' | 'landmarks' | 'draft'>

export const createReading = (given: Given): Reading => {
  const isTyped = ({ quantity, parts }: Amount) => quantity === 'temperature' && parts[0]?.unit !== undefined
  const temperature = given.measures.flatMap(({ amounts }) => amounts).find(isTyped)
  return {
    ...given,
    landmarkAt: byToken(given.landmarks),
    measureAt: byToken(given.measures),
    placeOf: new Map(given.measures.map((measure, place) => [measure, place])),
    scale: temperature?.parts[0]?.unit,
    hasHeight: given.tokens.some(({ text }) => heights.has(text)),
  }
}
