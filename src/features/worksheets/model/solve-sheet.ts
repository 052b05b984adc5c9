import type { Worksheet, WorksheetField, Working } from '#shared/engine/worksheets/types'
import type { Printer } from '#shared/units/print'
import { toEngineSetup } from '../../../components/setup/to-engine-setup'
import { checkField } from '../../../components/setup/check-field'
import { findAttribute } from '../link/spell-values'
import { readSheet, type ReadSheet, type SheetTexts } from '../link/read-sheet'

/** A worksheet with what is typed into it, worked out as far as it goes. */
export interface Solved {
  readonly read: ReadSheet
  /** Null while something is wrong or still needed. */
  readonly working: Working | null
  /** What is wrong, by path; a path that is no field belongs to the whole form. */
  readonly errors: ReadonlyMap<string, string>
  readonly needed: readonly WorksheetField[]
  /** What a form about a tank still needs, in words. */
  readonly need: string | null
}

/** What is typed is in the reader's own units. */
export function solveSheet(sheet: Worksheet, texts: SheetTexts, printer: Printer): Solved {
  const { system } = printer
  const read = readSheet(sheet, Object.entries(texts), system, system)
  const errors = new Map(
    read.problems.map(({ path, text, detail }) => {
      const attribute = findAttribute(sheet, path)
      return [path, (attribute && checkField(text, attribute, system, undefined)) ?? detail]
    }),
  )
  const base = { read, errors, needed: read.needed, need: null }
  if (errors.size > 0 || read.needed.length > 0) return { ...base, working: null }
  const found = sheet.work(read.values, toEngineSetup(read.setup), printer)
  if (found.ok) return { ...base, working: found }
  const [first] = found.problems
  if (first?.path === 'tank') return { ...base, working: null, need: first.detail }
  return {
    ...base,
    working: null,
    errors: new Map(found.problems.map(({ path, detail }) => [path, detail])),
  }
}
