import { findSetupField } from '#shared/kinds/setup-fields'
import type { Worksheet, WorksheetField, WorksheetList } from '#shared/engine/worksheets/types'
import { listFields, type SheetTexts } from '../link/read-sheet'

export interface FieldGroup {
  readonly key: string
  readonly title: string
  readonly fields: readonly WorksheetField[]
}

/** A list as a form shows it: its rows, and one more to fill in where there is room. */
export interface RowGroup extends WorksheetList {
  readonly title: string
  readonly rows: readonly (readonly WorksheetField[])[]
}

const titles: Readonly<Record<string, string>> = {
  tank: 'Tank',
  room: 'Room',
  goals: 'Goal',
  light: 'Light',
  chamber: 'Chamber',
  fittings: 'Fittings',
  strip: 'Power strip, if there is one',
  circuit: 'Circuit',
  flowCurve: 'Flow curve of the pump',
  items: 'Everything that is plugged in',
}

const ownTitles: Readonly<Record<string, string>> = {
  'heat-balance': 'Heat',
  'rod-in-chamber': 'Rod',
  'light-map': 'Over the tank',
  'pump-point': 'Pipe',
  'filled-weight': 'What is in it and under it',
  'sand-bed': 'Bed and sand',
  'salt-mix': 'Water and salt',
  seawater: 'Water',
  membrane: 'Membrane and tap',
}

const sectionOf = (path: string): string => (path.includes('.') ? (path.split('.')[0] ?? '') : '')

const toSetupField = (path: string): WorksheetField[] => {
  const field = findSetupField(path)
  return field ? [{ path, attribute: field.attribute }] : []
}

/** The fields of a form by what they are about, lists left out. */
export function groupFields(sheet: Worksheet): readonly FieldGroup[] {
  const ofSetup = (sheet.setup?.asks ?? []).flatMap(toSetupField)
  const own = sheet.fields.filter(({ path }) => !path.includes('.*.'))
  const all = [...ofSetup, ...own]
  const keys = [...new Set(all.map(({ path }) => sectionOf(path)))]
  return keys.map((key) => ({
    key,
    title: titles[key] ?? ownTitles[sheet.name] ?? 'Numbers',
    fields: all.filter(({ path }) => sectionOf(path) === key),
  }))
}

export function groupRows(sheet: Worksheet, texts: SheetTexts): readonly RowGroup[] {
  return (sheet.lists ?? []).map((list) => {
    const used = listFields(sheet, texts).filter(({ path }) => path.startsWith(`${list.path}.`))
    const count = Math.max(list.least, ...used.map(({ path }) => Number(path.split('.')[1]) + 1))
    const templates = sheet.fields.filter(({ path }) => path.startsWith(`${list.path}.*.`))
    const rows = Array.from({ length: Math.min(list.most, count + 1) }, (_, place) =>
      templates.map((field) => ({ ...field, path: field.path.replace('.*.', `.${place}.`) })),
    )
    return { ...list, title: titles[list.path] ?? list.path, rows }
  })
}

/** The id of a field's control, for labels, errors and links into the form. */
export const sheetFieldId = (path: string): string => `sheet-${path.replaceAll('.', '-')}`
