import type { Database } from '../../db/database'
import type { Catalogue } from '../catalogue/catalogue.service'
import { AppError } from '../../lib/errors'
import { pingDatabase } from './system.queries'

/** Resolves when a visitor sent here would be served, without waiting for the catalogue to be read. */
export async function checkReadiness(db: Database, catalogue: Catalogue, isDraining: boolean): Promise<void> {
  if (isDraining) throw new AppError('unavailable', 'This process is shutting down.')
  await pingDatabase(db)
  await catalogue.snapshot()
}
