import { getKind, type KindKey } from '#shared/kinds/index'
import type { Attribute, GroupAttribute } from '#shared/kinds/types'
import type { Gear } from '#shared/schemas/gear'
import type { Printer } from '#shared/units/print'
import { typeEntries, typeValue } from './type-value'
import { notesToText } from './notes-text'

export type Source = 'measured' | 'maker' | 'estimate'

/** One attribute as it is typed. Empty backing: as said for all. */
export interface TypedSpec {
  readonly text: string
  /** Of a group: the texts of its entries by field. */
  readonly entries: readonly Readonly<Record<string, string>>[]
  readonly source: '' | Source
  readonly plusMinus: string
  readonly evidence: string
  readonly date: string
}

export interface TypedFile {
  readonly id: string
  readonly name: string
  readonly kind: 'photo' | 'document'
  /** Keys of the values that it backs; null: all that are proposed. */
  readonly only: readonly string[] | null
}

export interface TypedIdentity {
  readonly brand: string
  readonly model: string
  readonly status: string
  readonly gtin: string
  readonly notes: string
}

/** The whole form, as typed: nothing in it is lost because it cannot be read. */
export interface TypedForm {
  readonly identity: TypedIdentity
  readonly specs: Readonly<Record<string, TypedSpec>>
  /** What holds for every value that says nothing else. An empty date is today. */
  readonly backing: { readonly source: Source; readonly date: string; readonly evidence: string }
  readonly files: readonly TypedFile[]
  readonly summary: string
  /** Why an unlikely number is right, by `doubtKey`. */
  readonly reasons: Readonly<Record<string, string>>
}

/** What a form starts from: the piece as it is on record (null: a new one), and how that reads when typed. */
export interface FormBase {
  readonly kind: KindKey
  readonly gear: Gear | null
  readonly typed: TypedForm
}

export const emptyBacking = { source: '', plusMinus: '', evidence: '', date: '' } as const

/** Ids inside a list are made up where nobody gave one. */
export const listEntryFields = (group: GroupAttribute) =>
  group.fields.flatMap((field) => (field.type === 'group' || field.key === 'id' ? [] : [field]))

function typeSpec(attribute: Attribute, value: unknown, printer: Printer): TypedSpec {
  if (attribute.type !== 'group') return { text: typeValue(attribute, value, printer), entries: [], ...emptyBacking }
  const entries = typeEntries(attribute, value, printer)
  return { text: '', entries: entries.length > 0 || attribute.many ? entries : [{}], ...emptyBacking }
}

export function createBase(kind: KindKey, gear: Gear | null, printer: Printer): FormBase {
  const specs = getKind(kind).attributes.map((attribute): [string, TypedSpec] => [
    attribute.key,
    typeSpec(attribute, gear?.specs[attribute.key], printer),
  ])
  const typed: TypedForm = {
    identity: {
      brand: gear?.brand ?? '',
      model: gear?.model ?? '',
      status: gear?.status ?? 'current',
      gtin: gear?.gtin ?? '',
      notes: notesToText(gear?.notes ?? ''),
    },
    specs: Object.fromEntries(specs),
    backing: { source: 'measured', date: '', evidence: '' },
    files: [],
    summary: '',
    reasons: {},
  }
  return { kind, gear, typed }
}
