import { and, eq, sql } from 'drizzle-orm'
import type { Database } from '../../db/database'
import { confirmations, errorReports, gear } from '../../db/schema/index'

export async function setMerged(db: Database, gearId: number, into: number | null): Promise<void> {
  await db.update(gear).set({ mergedInto: into, updatedAt: new Date() }).where(eq(gear.id, gearId))
}

export async function setRetired(db: Database, gearId: number, reason: string | null): Promise<void> {
  const retiredAt = reason === null ? null : new Date()
  await db.update(gear).set({ retiredAt, retiredReason: reason, updatedAt: new Date() }).where(eq(gear.id, gearId))
}

/** Keeps one a person and value; answers whether it is new. A value that changed can be confirmed once more. */
export async function insertConfirmation(db: Database, row: typeof confirmations.$inferInsert): Promise<boolean> {
  const inserted = await db
    .insert(confirmations)
    .values(row)
    .onConflictDoUpdate({
      target: [confirmations.gearId, confirmations.key, confirmations.personId],
      set: { value: sql`excluded.value`, measured: sql`excluded.measured`, at: sql`now()` },
      setWhere: sql`${confirmations.value} <> excluded.value`,
    })
    .returning({ id: confirmations.id })
  return inserted.length > 0
}

const isOfPresentValue = sql`${confirmations.value} = ${gear.specs} -> ${confirmations.key}`

export async function countConfirmationsOf(db: Database, gearId: number, key: string): Promise<number> {
  const rows = await db
    .select({ id: confirmations.id })
    .from(confirmations)
    .innerJoin(gear, eq(gear.id, confirmations.gearId))
    .where(and(eq(confirmations.gearId, gearId), eq(confirmations.key, key), isOfPresentValue))
  return rows.length
}

export async function listConfirmedKeys(db: Database, gearId: number, personId: number): Promise<string[]> {
  const rows = await db
    .select({ key: confirmations.key })
    .from(confirmations)
    .innerJoin(gear, eq(gear.id, confirmations.gearId))
    .where(and(eq(confirmations.gearId, gearId), eq(confirmations.personId, personId), isOfPresentValue))
    .orderBy(confirmations.key)
  return rows.map(({ key }) => key)
}

export async function insertReport(db: Database, row: typeof errorReports.$inferInsert): Promise<string> {
  const [inserted] = await db.insert(errorReports).values(row).returning({ id: errorReports.id })
  if (inserted === undefined) throw new Error('The report was not inserted')
  return inserted.id
}
