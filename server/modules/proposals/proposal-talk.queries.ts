import { and, asc, eq, inArray, isNull } from 'drizzle-orm'
import type { Database } from '../../db/database'
import { evidenceFiles, proposalMessages } from '../../db/schema/index'

export async function insertMessage(db: Database, message: typeof proposalMessages.$inferInsert): Promise<void> {
  await db.insert(proposalMessages).values(message)
}

export async function listMessages(db: Database, proposalId: string) {
  return db
    .select()
    .from(proposalMessages)
    .where(eq(proposalMessages.proposalId, proposalId))
    .orderBy(asc(proposalMessages.id))
}

export type MessageRow = Awaited<ReturnType<typeof listMessages>>[number]

const fileColumns = {
  id: evidenceFiles.id,
  kind: evidenceFiles.kind,
  contentType: evidenceFiles.contentType,
  width: evidenceFiles.width,
  height: evidenceFiles.height,
  caption: evidenceFiles.caption,
  uploaderId: evidenceFiles.uploaderId,
}

export async function listFiles(db: Database, proposalId: string) {
  return db
    .select(fileColumns)
    .from(evidenceFiles)
    .where(eq(evidenceFiles.proposalId, proposalId))
    .orderBy(asc(evidenceFiles.createdAt), asc(evidenceFiles.id))
}

export type FileRow = Awaited<ReturnType<typeof listFiles>>[number]

/** Makes files public that back approved values of this proposal. */
export async function publishFiles(db: Database, proposalId: string, ids: readonly string[]): Promise<void> {
  if (ids.length === 0) return
  await db
    .update(evidenceFiles)
    .set({ publishedAt: new Date() })
    .where(
      and(
        eq(evidenceFiles.proposalId, proposalId),
        inArray(evidenceFiles.id, [...ids]),
        isNull(evidenceFiles.publishedAt),
      ),
    )
}
