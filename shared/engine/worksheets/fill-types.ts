import type { Scene } from '../scene'
import type { Item, Piece, Place } from '../types'

export type FilledValue = number | string | boolean | readonly string[] | undefined

/** Inputs by their dotted path, in canonical units; undefined where the setup does not tell. */
export type Filled = Readonly<Record<string, FilledValue>>

/** The piece whose numbers are worked out. */
export interface Subject {
  readonly piece: Piece
  readonly quantity: number
  readonly place?: Place
  readonly mountHeightMm?: number
  /** It counts beside the setup's own pieces of its kind, not in their place. */
  readonly isBeside?: true
}

/** The setup without what the subject takes the place of, and with it. */
export interface FillInput {
  readonly scene: Scene
  readonly items: readonly Item[]
  readonly subject: Subject | undefined
}

/** The same keys of a piece's specs, under a prefix. */
export const pickSpecs = ({ specs }: Piece, keys: readonly string[], prefix = ''): Filled =>
  Object.fromEntries(keys.map((key) => [`${prefix}${key}`, specs[key]?.value as FilledValue]))
