import type { Database } from '../../db/database'
import { recordAudit } from '../../lib/audit'
import type { FileStore } from '../../services/files/file-store'
import { deleteEvidence, findKnownKeys, listOrphans } from './evidence.queries'

const batch = 500
const dayMs = 24 * 60 * 60 * 1000

export interface Swept {
  readonly rows: number
  readonly objects: number
}

/** Removes rows that nothing refers to; their bytes go with the objects, which have lost their row. */
async function sweepRows(db: Database): Promise<number> {
  const orphans = await listOrphans(db, batch)
  for (const { id, sha256 } of orphans) {
    await db.transaction(async (tx) => {
      if ((await deleteEvidence(tx, id)) === undefined) return
      const event = { action: 'evidence.sweep', subjectType: 'evidence', subjectId: id, detail: { sha256 } }
      await recordAudit(tx, { actorId: null, ...event })
    })
  }
  return orphans.length
}

async function removeUnknown(db: Database, files: FileStore, keys: readonly string[]): Promise<number> {
  if (keys.length === 0) return 0
  const known = await findKnownKeys(db, keys)
  const unknown = keys.filter((key) => !known.has(key))
  await files.remove(unknown)
  return unknown.length
}

/** A day's grace, since the bytes of an upload are there before its row. */
async function sweepObjects(db: Database, files: FileStore, now: Date): Promise<number> {
  let removed = 0
  let keys: string[] = []
  for await (const { key, modifiedAt } of files.list()) {
    if (now.getTime() - modifiedAt.getTime() < dayMs) continue
    keys.push(key)
    if (keys.length < batch) continue
    removed += await removeUnknown(db, files, keys)
    keys = []
  }
  return removed + (await removeUnknown(db, files, keys))
}

/** Clears what uploads left that were cut short, and what belongs to proposals that were withdrawn. */
export async function sweepEvidence(db: Database, files: FileStore, now = new Date()): Promise<Swept> {
  const rows = await sweepRows(db)
  return { rows, objects: await sweepObjects(db, files, now) }
}
