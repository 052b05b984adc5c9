import { sql } from 'drizzle-orm'
import type { Database } from '../../db/database'

/** Fails when the database does not answer, or answers without our tables. */
export async function pingDatabase(db: Database): Promise<void> {
  await db.execute(sql`select version from catalogue_version`)
}
