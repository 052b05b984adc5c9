import type { Filled, FilledValue } from '#shared/engine/worksheets/fill-types'
import type { Worksheet } from '#shared/engine/worksheets/types'
import type { Printer } from '#shared/units/print'
import type { SheetTexts } from '../link/read-sheet'
import { spellValues } from '../link/spell-values'

function flatten(path: string, value: unknown): [string, FilledValue][] {
  const isLeaf = typeof value !== 'object' || value === null
  const isSet = Array.isArray(value) && value.every((one) => typeof one !== 'object')
  if (isLeaf || isSet) return [[path, value as FilledValue]]
  return Object.entries(value).flatMap(([key, one]) => flatten(path === '' ? key : `${path}.${key}`, one))
}

/** The worksheet's example as texts, in round numbers of the reader's units. */
export function writeExample(sheet: Worksheet, printer: Printer): SheetTexts {
  const filled: Filled = Object.fromEntries(flatten('', sheet.example))
  return spellValues(sheet, filled, printer, false)
}
