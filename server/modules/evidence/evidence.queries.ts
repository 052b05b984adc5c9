import { and, asc, count, eq, inArray, isNull, lt, or, sql } from 'drizzle-orm'
import type { Database } from '../../db/database'
import { evidenceFiles, proposals } from '../../db/schema/index'

export type EvidenceRow = typeof evidenceFiles.$inferSelect
export type NewEvidence = typeof evidenceFiles.$inferInsert

/** With a lock that keeps it as it is until the end of the transaction, and lets one upload in at a time. */
export async function findProposal(db: Database, id: string, { isLocked = false } = {}) {
  const query = db
    .select({ id: proposals.id, authorId: proposals.authorId, status: proposals.status })
    .from(proposals)
    .where(eq(proposals.id, id))
  const [proposal] = isLocked ? await query.for('update') : await query
  return proposal
}

export async function insertEvidence(db: Database, row: NewEvidence): Promise<EvidenceRow> {
  const [inserted] = await db.insert(evidenceFiles).values(row).returning()
  if (inserted === undefined) throw new Error('The database kept no row')
  return inserted
}

/** The same bytes by the same person in the same proposal: an upload that was sent again. */
export async function findSame(db: Database, row: Pick<EvidenceRow, 'uploaderId' | 'sha256'> & { proposalId: string }) {
  const [same] = await db
    .select()
    .from(evidenceFiles)
    .where(
      and(
        eq(evidenceFiles.proposalId, row.proposalId),
        eq(evidenceFiles.uploaderId, row.uploaderId),
        eq(evidenceFiles.sha256, row.sha256),
      ),
    )
    .limit(1)
  return same
}

export async function countEvidence(db: Database, proposalId: string): Promise<number> {
  const [row] = await db.select({ count: count() }).from(evidenceFiles).where(eq(evidenceFiles.proposalId, proposalId))
  return row?.count ?? 0
}

export async function listEvidence(db: Database, proposalId: string): Promise<EvidenceRow[]> {
  return db
    .select()
    .from(evidenceFiles)
    .where(eq(evidenceFiles.proposalId, proposalId))
    .orderBy(asc(evidenceFiles.createdAt), asc(evidenceFiles.id))
}

/** The file, and the state of the proposal that it belongs to. */
export async function findEvidence(db: Database, id: string) {
  const [found] = await db
    .select({ file: evidenceFiles, status: proposals.status })
    .from(evidenceFiles)
    .leftJoin(proposals, eq(proposals.id, evidenceFiles.proposalId))
    .where(eq(evidenceFiles.id, id))
  return found
}

/** Only while it is not public: what backs an approved value stays. */
export async function deleteEvidence(db: Database, id: string): Promise<EvidenceRow | undefined> {
  const unpublished = and(eq(evidenceFiles.id, id), isNull(evidenceFiles.publishedAt))
  const [removed] = await db.delete(evidenceFiles).where(unpublished).returning()
  return removed
}

/** Files that nothing refers to any more: without a proposal, or of one that was withdrawn; older than a day. */
export async function listOrphans(db: Database, limit: number): Promise<EvidenceRow[]> {
  const rows = await db
    .select({ file: evidenceFiles })
    .from(evidenceFiles)
    .leftJoin(proposals, eq(proposals.id, evidenceFiles.proposalId))
    .where(
      and(
        isNull(evidenceFiles.publishedAt),
        lt(evidenceFiles.createdAt, sql`now() - interval '1 day'`),
        or(
          isNull(evidenceFiles.proposalId),
          and(eq(proposals.status, 'withdrawn'), lt(proposals.updatedAt, sql`now() - interval '1 day'`)),
        ),
      ),
    )
    .limit(limit)
  return rows.map(({ file }) => file)
}

/** Those of the keys that a row names. */
export async function findKnownKeys(db: Database, keys: readonly string[]): Promise<Set<string>> {
  const wanted = [...keys]
  const rows = await db
    .select({ storageKey: evidenceFiles.storageKey, thumbnailKey: evidenceFiles.thumbnailKey })
    .from(evidenceFiles)
    .where(or(inArray(evidenceFiles.storageKey, wanted), inArray(evidenceFiles.thumbnailKey, wanted)))
  return new Set(rows.flatMap(({ storageKey, thumbnailKey }) => [storageKey, thumbnailKey ?? '']))
}
