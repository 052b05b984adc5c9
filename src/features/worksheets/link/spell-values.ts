import { findSetupField } from '#shared/kinds/setup-fields'
import type { FieldAttribute } from '#shared/kinds/types'
import type { Filled, FilledValue } from '#shared/engine/worksheets/fill-types'
import type { Worksheet } from '#shared/engine/worksheets/types'
import { spellUnit } from '#shared/schemas/setup-link-values'
import type { Printer } from '#shared/units/print'
import type { UnitSystem } from '#shared/units/systems'
import { findField, type SheetTexts } from './read-sheet'

export const findAttribute = (sheet: Worksheet, path: string): FieldAttribute | undefined =>
  findField(sheet, path)?.attribute ?? findSetupField(path)?.attribute

function spell(value: FilledValue, attribute: FieldAttribute, printer: Printer, isExact: boolean): string {
  if (typeof value === 'number' && attribute.type === 'measure')
    return printer.measure(value, attribute.unit, { exact: isExact }).replaceAll('\u00a0', ' ')
  if (typeof value === 'boolean') return value ? 'yes' : 'no'
  if (Array.isArray(value)) return value.join(',') || 'none'
  return String(value)
}

/** Canonical values as somebody would type them, measures in the reader's units. */
export function spellValues(sheet: Worksheet, filled: Filled, printer: Printer, isExact = true): SheetTexts {
  return Object.fromEntries(
    Object.entries(filled).flatMap(([path, value]): [string, string][] => {
      const attribute = value === undefined ? undefined : findAttribute(sheet, path)
      return attribute === undefined ? [] : [[path, spell(value, attribute, printer, isExact)]]
    }),
  )
}

const bareNumber = /^-?\d+(\.\d+)?$/

/** A bare number of a link is canonical; in a form its unit is written out. */
export function spellBareNumbers(sheet: Worksheet, texts: SheetTexts, printer: Printer): SheetTexts {
  return Object.fromEntries(
    Object.entries(texts).map(([path, text]) => {
      const attribute = bareNumber.test(text) ? findAttribute(sheet, path) : undefined
      return [path, attribute?.type === 'measure' ? spell(Number(text), attribute, printer, true) : text]
    }),
  )
}

/** Bare numbers with the unit that they were typed in. */
export function spellTyped(sheet: Worksheet, texts: SheetTexts, system: UnitSystem): SheetTexts {
  return Object.fromEntries(
    Object.entries(texts).map(([path, text]) => {
      const attribute = findAttribute(sheet, path)
      return [path, attribute?.type === 'measure' && text.trim() !== '' ? spellUnit(text, attribute, system) : text]
    }),
  )
}
