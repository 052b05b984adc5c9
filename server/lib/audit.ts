import type { Database } from '../db/database'
import { auditEvents } from '../db/schema/index'

export interface AuditEvent {
  /** Null: the system itself, or somebody without an account. */
  readonly actorId: number | null
  /** What was done, as "subject.verb": `proposal.approve`. */
  readonly action: string
  readonly subjectType: string
  readonly subjectId: string | number
  /** Never a secret: this is read by every admin, and kept for good. */
  readonly detail?: Readonly<Record<string, unknown>>
  readonly requestId?: string
}

/** Adds to the trail, in the transaction of what it tells of. */
export async function recordAudit(db: Database, event: AuditEvent): Promise<void> {
  const { actorId, action, subjectType, subjectId, detail = {}, requestId } = event
  await db.insert(auditEvents).values({
    actorId,
    action,
    subjectType,
    subjectId: String(subjectId),
    detail,
    ...(requestId !== undefined && { requestId }),
  })
}
