import { and, eq, inArray } from 'drizzle-orm'
import type { Database } from '../../db/database'
import { disputes } from '../../db/schema/index'

export async function listOpenDisputes(db: Database, gearId: number, keys?: readonly string[]) {
  const isKey = keys === undefined ? undefined : inArray(disputes.key, [...keys])
  return db
    .select()
    .from(disputes)
    .where(and(eq(disputes.gearId, gearId), eq(disputes.status, 'open'), isKey))
}

/** Opens a dispute, unless one is open. */
export async function insertDispute(db: Database, row: typeof disputes.$inferInsert): Promise<string | null> {
  const [inserted] = await db.insert(disputes).values(row).onConflictDoNothing().returning({ id: disputes.id })
  return inserted?.id ?? null
}
