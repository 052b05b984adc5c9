import type { AuditEventItem } from '#shared/schemas/admin'

interface EventRow {
  readonly id: number
  readonly at: Date
  readonly actorId: number | null
  readonly action: string
  readonly subjectType: string
  readonly subjectId: string
  readonly detail: Record<string, unknown>
  readonly requestId: string | null
}

/** `name` is how the actor is called today; null for the system itself. */
export function presentAuditEvent(row: EventRow, name: string | null): AuditEventItem {
  return {
    id: row.id,
    at: row.at.toISOString(),
    actor: row.actorId === null ? null : name,
    action: row.action,
    subject: { type: row.subjectType, id: row.subjectId },
    detail: row.detail,
    requestId: row.requestId,
  }
}
