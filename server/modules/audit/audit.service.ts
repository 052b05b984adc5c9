import { z } from 'zod'
import type { AuditList, AuditQuery } from '#shared/schemas/admin'
import type { Database } from '../../db/database'
import type { Actor } from '../../lib/actor'
import { createCursor, readCursor } from '../../lib/cursor'
import { AppError } from '../../lib/errors'
import { formerMember } from '../people/people.service'
import { canReadAudit } from './audit.policy'
import { presentAuditEvent } from './audit.presenter'
import { listAuditEvents } from './audit.queries'

const placeSchema = z.int().min(1)

/** `proposal:9f…`: a type, and after a colon one of its kind. */
function readSubject(subject: string | undefined) {
  if (subject === undefined) return {}
  const colon = subject.indexOf(':')
  if (colon === -1) return { subjectType: subject }
  return { subjectType: subject.slice(0, colon), subjectId: subject.slice(colon + 1) }
}

/** The trail, newest first. An empty filter counts as none. */
export async function searchAudit(db: Database, actor: Actor, query: AuditQuery): Promise<AuditList> {
  if (!canReadAudit(actor)) throw new AppError('forbidden', 'Only admins read the audit trail.')
  const { cursor, limit, ...asked } = query
  const filter = Object.fromEntries(Object.entries(asked).filter(([, value]) => value !== '')) as typeof asked
  const { subject, ...rest } = filter
  const question = JSON.stringify(filter)
  const beforeId = cursor === undefined ? undefined : readCursor(cursor, question, placeSchema)
  const rows = await listAuditEvents(db, { ...rest, ...readSubject(subject), beforeId, limit: limit + 1 })
  const shown = rows.slice(0, limit)
  const last = shown.at(-1)?.event.id
  return {
    items: shown.map(({ event, name }) => presentAuditEvent(event, name ?? formerMember)),
    next: rows.length > limit && last !== undefined ? createCursor(last, question) : null,
  }
}
