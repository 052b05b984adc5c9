import { and, count, eq, inArray, isNotNull, sql } from 'drizzle-orm'
import type { Database } from '../../db/database'
import { confirmations, disputes, evidenceFiles, gear } from '../../db/schema/index'

/** Of the values as they are now: what was confirmed of an earlier one says nothing about this one. */
export async function countConfirmations(db: Database, gearId: number) {
  return db
    .select({ key: confirmations.key, count: count() })
    .from(confirmations)
    .innerJoin(gear, eq(gear.id, confirmations.gearId))
    .where(and(eq(confirmations.gearId, gearId), sql`${confirmations.value} = ${gear.specs} -> ${confirmations.key}`))
    .groupBy(confirmations.key)
    .orderBy(confirmations.key)
}

export async function listDisputedKeys(db: Database, gearId: number): Promise<string[]> {
  const rows = await db
    .select({ key: disputes.key })
    .from(disputes)
    .where(and(eq(disputes.gearId, gearId), eq(disputes.status, 'open')))
    .orderBy(disputes.key)
  return rows.map(({ key }) => key)
}

/** Of these files the ones that everybody may see. */
export async function listPublished(db: Database, ids: readonly string[]) {
  if (ids.length === 0) return []
  return db
    .select({
      id: evidenceFiles.id,
      kind: evidenceFiles.kind,
      contentType: evidenceFiles.contentType,
      width: evidenceFiles.width,
      height: evidenceFiles.height,
      caption: evidenceFiles.caption,
    })
    .from(evidenceFiles)
    .where(and(inArray(evidenceFiles.id, [...ids]), isNotNull(evidenceFiles.publishedAt)))
}
