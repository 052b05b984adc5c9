import { getAttribute, type KindKey } from '#shared/kinds/index'
import type { MeasureAttribute } from '#shared/kinds/types'
import type { ProposalRequest } from '#shared/schemas/proposals'
import { findDoubts } from '#shared/unlikely/find-doubts'
import type { Doubt } from '#shared/unlikely/types'
import type { Printer } from '#shared/units/print'
import type { ReadForm } from './read-typed'
import type { FormBase, TypedForm } from './typed-form'
import { typeValue } from './type-value'

export interface PlacedDoubt extends Doubt {
  /** What its reason is kept under: another number is another question. Holds no dot, being part of a form's path. */
  readonly id: string
  /** Where the number is typed. */
  readonly place: string
}

/** A reason belongs to one number: once that changes, the question is asked anew. */
const doubtId = ({ path, rule, value }: Doubt): string => `${path}|${rule}|${value}`.replaceAll('.', '_')

function findPlace(path: string, { places }: ReadForm): string {
  const [key = '', at, field] = path.split('.')
  if (at === undefined) return `specs.${key}.text`
  if (field === undefined) return `specs.${key}.entries.0.${at}`
  return `specs.${key}.entries.${places[key]?.[Number(at)] ?? at}.${field}`
}

export function askDoubts(base: FormBase, read: ReadForm, printer: Printer): readonly PlacedDoubt[] {
  const change = { values: read.specs, before: base.gear?.specs ?? {} }
  return findDoubts(base.kind, change, printer)
    .filter(({ path }) => (path.split('.')[0] ?? '') in read.values)
    .map((doubt) => ({ ...doubt, id: doubtId(doubt), place: findPlace(doubt.path, read) }))
}

function findMeasure(kind: KindKey, path: string): MeasureAttribute | undefined {
  const words = path.split('.')
  const attribute = getAttribute(kind, words[0] ?? '')
  const field = attribute?.type === 'group' ? attribute.fields.find(({ key }) => key === words.at(-1)) : attribute
  return field?.type === 'measure' ? field : undefined
}

/** A suggestion as it would be typed. */
export function typeSuggestion(kind: KindKey, { path }: Doubt, value: number, printer: Printer): string {
  const measure = findMeasure(kind, path)
  return measure ? typeValue(measure, value, printer, { exact: true }) : String(value)
}

/** The questions that stand, with what was said about each. */
export const writeFlags = (doubts: readonly PlacedDoubt[], { reasons }: TypedForm): ProposalRequest['flags'] =>
  doubts.map(({ path, rule, value, id }) => ({ path, rule, value, reason: reasons[id]?.trim() || null }))
