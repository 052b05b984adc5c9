import { report } from '#shared/engine/report'
import type { Report } from '#shared/engine/types'
import type { SetupParsed } from '#shared/schemas/setup'
import type { Catalogue } from '../catalogue/catalogue.service'
import { readSetup } from './read-setup'

/** Every check of every piece of a setup, its needs, budgets and what is missing. */
export async function reportSetup(catalogue: Catalogue, parsed: SetupParsed): Promise<Report> {
  return report(readSetup(await catalogue.snapshot(), parsed))
}
