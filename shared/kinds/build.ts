import type { CanonicalUnit } from '../units/units'
import type {
  Attribute,
  BooleanAttribute,
  ChoiceAttribute,
  GroupAttribute,
  MeasureAttribute,
  Option,
  Role,
  SetAttribute,
  TextAttribute,
  TextListAttribute,
} from './types'

interface Extras {
  readonly role: Role
  readonly guide?: string
  readonly better?: 'more' | 'less'
}

interface MeasureExtras extends Extras {
  readonly plausible: readonly [number, number]
  readonly usual: readonly [number, number]
  readonly guide: string
}

/** Options as `value: label`, in the order in which they are offered. */
type OptionLabels = Readonly<Record<string, string>>

function toOptions(labels: OptionLabels): readonly Option[] {
  return Object.entries(labels).map(([value, label]) => ({ value, label }))
}

export function measure(key: string, label: string, unit: CanonicalUnit, extras: MeasureExtras): MeasureAttribute {
  return { type: 'measure', key, label, unit, ...extras }
}

export function choice(key: string, label: string, labels: OptionLabels, extras: Extras): ChoiceAttribute {
  return { type: 'choice', key, label, options: toOptions(labels), ...extras }
}

export function set(key: string, label: string, labels: OptionLabels, extras: Extras): SetAttribute {
  return { type: 'set', key, label, options: toOptions(labels), ...extras }
}

export function boolean(key: string, label: string, extras: Extras): BooleanAttribute {
  return { type: 'boolean', key, label, ...extras }
}

export function text(key: string, label: string, maxLength: number, extras: Extras): TextAttribute {
  return { type: 'text', key, label, maxLength, ...extras }
}

export function texts(key: string, label: string, maxLength: number, extras: Extras): TextListAttribute {
  return { type: 'texts', key, label, maxLength, ...extras }
}

interface GroupExtras extends Extras {
  readonly fields: readonly Attribute[]
  readonly required: readonly string[]
  readonly phrase?: string
}

/** One object stored as one value. */
export function group(key: string, label: string, extras: GroupExtras): GroupAttribute {
  return { type: 'group', key, label, many: false, ...extras }
}

/** A list of objects stored as one value. */
export function groups(key: string, label: string, extras: GroupExtras): GroupAttribute {
  return { type: 'group', key, label, many: true, ...extras }
}
