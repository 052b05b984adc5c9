import type { KindKey } from '../../kinds/index'
import type { GearRef } from '../types'

/** Does this piece fit? · What fits? · What takes its place? · What is not there at all? */
export type Intent = 'check' | 'find' | 'replace' | 'missing'

/** From, to (null: open), one of an attribute's options, or yes and no. Canonical. */
export type Filter = readonly [number | null, number | null] | string | boolean

export type FieldValue = number | string | boolean | readonly string[]

/** A part of the setup that the text gives. */
export interface ReadField {
  /** Canonical, in the unit that the path ends with. */
  readonly value: FieldValue
  /** The number with the unit that was meant, or the option, as a setup link writes it: "20 gal", "4.5 in", "soft,lps". */
  readonly text: string
}

export interface Understood {
  /** The stretch of the question, as typed. */
  readonly text: string
  /** "coldest room 60 °F" */
  readonly meaning: string
  /** Setup path of the first field it filled, if any. */
  readonly path?: string
  /** UTF-16 offsets into the question. */
  readonly start: number
  readonly end: number
}

export interface Question {
  readonly intent: Intent
  /** What is asked about; null where the text does not say. */
  readonly kind: KindKey | null
  readonly gear?: GearRef
  /** By attribute key of the kind. */
  readonly filters: Readonly<Record<string, Filter>>
  /** By dotted setup path, such as `tank.chambers.0.lengthMm`. */
  readonly fields: Readonly<Record<string, ReadField>>
  readonly understood: readonly Understood[]
  /** Words that seem to matter and were not used, as typed. */
  readonly ignored: readonly string[]
}

export interface CatalogueName extends GearRef {
  readonly kind: KindKey
}
