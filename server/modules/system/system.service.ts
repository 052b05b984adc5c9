import type { Database } from '../../db/database'
import { AppError } from '../../lib/errors'
import { pingDatabase } from './system.queries'

/** Resolves when a visitor sent here would be served. */
export async function checkReadiness(db: Database, isDraining: boolean): Promise<void> {
  if (isDraining) throw new AppError('unavailable', 'This process is shutting down.')
  await pingDatabase(db)
}
