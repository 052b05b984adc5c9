import { findSheetOf } from '#shared/engine/worksheets/by-check'
import type { UnitSystem } from '#shared/units/systems'
import { paths } from '../../config/paths'
import type { RawSetup } from './edit-raw'
import { writeSetupHref } from './setup-href'

/** The piece whose check is worked out: one of the catalogue in the setup's place, or one of the setup itself. */
export type WorkingSubject = { readonly piece: string; readonly quantity: number } | { readonly item: string }

/** Where a check's numbers are worked out, filled in from the setup; undefined for a check that is no calculation. */
export function writeWorkingHref(
  checkId: string,
  raw: RawSetup,
  system: UnitSystem,
  subject: WorkingSubject,
): string | undefined {
  const name = findSheetOf(checkId)
  if (name === undefined) return undefined
  const own =
    'item' in subject
      ? { item: subject.item }
      : { piece: subject.piece, ...(subject.quantity > 1 && { quantity: String(subject.quantity) }) }
  return writeSetupHref(paths.worksheet(name), raw, system, { from: checkId, ...own })
}
