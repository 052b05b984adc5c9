import { and, desc, eq, gte, isNull, like, lt, lte, or, sql, type SQL } from 'drizzle-orm'
import type { Database } from '../../db/database'
import { auditEvents, people } from '../../db/schema/index'

export interface AuditFilter {
  readonly actor?: string | undefined
  readonly action?: string | undefined
  readonly subjectType?: string | undefined
  readonly subjectId?: string | undefined
  readonly from?: Date | undefined
  readonly to?: Date | undefined
  readonly beforeId?: number | undefined
  readonly limit: number
}

const system = 'system'

const escapeLike = (text: string): string => text.replace(/[\\%_]/g, '\\$&')

function matchActor(name: string): SQL | undefined {
  if (name.toLowerCase() === system) return isNull(auditEvents.actorId)
  return eq(sql`lower(${people.name})`, name.toLowerCase())
}

export async function listAuditEvents(db: Database, filter: AuditFilter) {
  const { actor, action, subjectType, subjectId, from, to, beforeId, limit } = filter
  return db
    .select({ event: auditEvents, name: people.name })
    .from(auditEvents)
    .leftJoin(people, eq(people.id, auditEvents.actorId))
    .where(
      and(
        actor === undefined ? undefined : matchActor(actor),
        action === undefined
          ? undefined
          : or(eq(auditEvents.action, action), like(auditEvents.action, `${escapeLike(action)}.%`)),
        subjectType === undefined ? undefined : eq(auditEvents.subjectType, subjectType),
        subjectId === undefined ? undefined : eq(auditEvents.subjectId, subjectId),
        from === undefined ? undefined : gte(auditEvents.at, from),
        to === undefined ? undefined : lte(auditEvents.at, to),
        beforeId === undefined ? undefined : lt(auditEvents.id, beforeId),
      ),
    )
    .orderBy(desc(auditEvents.id))
    .limit(limit)
}
