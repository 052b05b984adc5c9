import type { CanonicalUnit } from '../units/units'

/** Decides: read by a check · compared when one piece replaces another · shown only. */
export type Role = 'check' | 'difference' | 'display'

export interface Option {
  readonly value: string
  readonly label: string
}

interface AttributeBase {
  /** Unique inside its kind; a measure's key ends with its canonical unit (`lengthMm`). */
  readonly key: string
  readonly label: string
  readonly role: Role
  /** One sentence: where the calipers, tape or eye go. */
  readonly guide?: string
  /** Which way is an improvement when one piece replaces another; absent where it only differs. */
  readonly better?: 'more' | 'less'
}

/** A number with a dimension, stored in `unit`. Outside `plausible` it is refused, outside `usual` it is questioned. */
export interface MeasureAttribute extends AttributeBase {
  readonly type: 'measure'
  readonly unit: CanonicalUnit
  readonly plausible: readonly [number, number]
  readonly usual: readonly [number, number]
}

export interface ChoiceAttribute extends AttributeBase {
  readonly type: 'choice'
  readonly options: readonly Option[]
  /** Values are stored and exchanged as the numbers that the options spell (mains volts). */
  readonly numeric?: true
}

/** Several of the options at once; stored as an array without repeats. */
export interface SetAttribute extends AttributeBase {
  readonly type: 'set'
  readonly options: readonly Option[]
  /** Values are stored and exchanged as the numbers that the options spell (mains volts). */
  readonly numeric?: true
}

export interface BooleanAttribute extends AttributeBase {
  readonly type: 'boolean'
}

export interface TextAttribute extends AttributeBase {
  readonly type: 'text'
  readonly maxLength: number
  /** Sanitised rich text rather than a plain line. */
  readonly rich?: boolean
  /** Letters, digits, dashes and underscores only: it is used inside dotted paths. */
  readonly word?: true
}

/** A list of short texts, such as the tanks a stand is made for. */
export interface TextListAttribute extends AttributeBase {
  readonly type: 'texts'
  readonly maxLength: number
}

/** A group of fields stored as one value: one object, or with `many` a list of them (a pump's curve, a tank's chambers, a lamp's bands). */
export interface GroupAttribute extends AttributeBase {
  readonly type: 'group'
  readonly many: boolean
  readonly fields: readonly Attribute[]
  /** How one entry reads, fields by key: `{flowLph} at {headM}`. Absent: each field with its label. */
  readonly phrase?: string
  /** Keys of `fields` that must be there. */
  readonly required: readonly string[]
}

/** What can be typed into one field: everything but a group, which is several fields. */
export type FieldAttribute = Exclude<Attribute, GroupAttribute>

export type Attribute =
  | MeasureAttribute
  | ChoiceAttribute
  | SetAttribute
  | BooleanAttribute
  | TextAttribute
  | TextListAttribute
  | GroupAttribute

/** A category of gear with its spec schema. */
export interface Kind {
  readonly key: string
  /** "heater" */
  readonly label: string
  /** "heaters" */
  readonly plural: string
  /** True where the piece plugs into the mains. */
  readonly electric: boolean
  /** In a setup, several pieces of an additive kind count beside each other (test kits, wavemakers, rock, nets). */
  readonly additive: boolean
  readonly attributes: readonly Attribute[]
}

/** A part of the specs that contradicts another part. `path` is dotted, inside the specs: `chambers.0.lengthMm`. */
export interface Inconsistency {
  readonly path: string
  readonly detail: string
}

/** Bare values by attribute key. Values of a wrong type are somebody else's finding and are passed over here. */
export type BareSpecs = Readonly<Record<string, unknown>>
