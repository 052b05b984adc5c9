import { findWorksheet, worksheets } from '#shared/engine/worksheets/registry'
import { noSetup, type Worksheet } from '#shared/engine/worksheets/types'
import type { Setup } from '#shared/engine/types'
import type { SetupParsed } from '#shared/schemas/setup'
import type { WorkingAnswer, WorksheetListAnswer } from '#shared/schemas/worksheets'
import { createPrinter } from '#shared/units/print'
import type { UnitSystem } from '#shared/units/systems'
import { AppError, createInvalidError } from '../../lib/errors'
import { toPointer } from '../../lib/to-issues'
import { createSnapshotBuilder } from '../catalogue/build-snapshot'
import type { Catalogue } from '../catalogue/catalogue.service'
import { expandSetup } from '../setups/expand-setup'
import { presentWorking, presentWorksheet } from './worksheets.presenter'

export const listWorksheets = (): WorksheetListAnswer => ({ items: worksheets.map(presentWorksheet) })

/** Throws AppError `not-found`, with the names that there are. */
export function requireWorksheet(name: string): Worksheet {
  const sheet = findWorksheet(name)
  if (sheet) return sheet
  const names = worksheets.map((known) => known.name).join(', ')
  throw new AppError('not-found', `There is no worksheet by that name. There are: ${names}.`)
}

const emptyCatalogue = createSnapshotBuilder().finish(0)

/** The parts of a setup among the inputs as the engine reads them; the catalogue is asked only for a tank named by slug. */
async function readParts(catalogue: Catalogue, parts: Partial<SetupParsed>, units: UnitSystem): Promise<Setup> {
  const parsed: SetupParsed = { tank: {}, ...parts, units, items: [] }
  const snapshot = parsed.tank.gear === undefined ? emptyCatalogue : await catalogue.snapshot()
  const { expanded, issues } = expandSetup(snapshot, parsed)
  // Here the parts stand at the top of the body.
  if (issues.length > 0)
    throw createInvalidError(
      issues.map(({ pointer, detail }) => ({ pointer: pointer.replace('#/setup/', '#/'), detail })),
    )
  return expanded
}

/** Works a sheet out on inputs that its schema let pass. Throws AppError `invalid` for inputs that contradict each other. */
export async function workSheet(
  catalogue: Catalogue,
  sheet: Worksheet,
  inputs: Readonly<Record<string, unknown>>,
): Promise<WorkingAnswer> {
  const { units = 'metric', ...rest } = inputs as { readonly units?: UnitSystem }
  const sections: readonly string[] = sheet.setup?.sections ?? []
  const entries = Object.entries(rest)
  const parts = Object.fromEntries(entries.filter(([key]) => sections.includes(key))) as Partial<SetupParsed>
  const values = Object.fromEntries(entries.filter(([key]) => !sections.includes(key)))
  const setup = sections.length > 0 ? await readParts(catalogue, parts, units) : noSetup
  const found = sheet.work(values, setup, createPrinter(units))
  if (found.ok) return presentWorking(sheet, found)
  throw createInvalidError(found.problems.map(({ path, detail }) => ({ pointer: toPointer(path.split('.')), detail })))
}
