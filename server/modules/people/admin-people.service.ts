import { z } from 'zod'
import type { AdminPeople, AdminPeopleQuery, AdminPerson, PersonChange } from '#shared/schemas/people'
import { limits } from '#shared/limits'
import type { Database } from '../../db/database'
import type { Actor } from '../../lib/actor'
import { recordAudit } from '../../lib/audit'
import { createCursor, readCursor } from '../../lib/cursor'
import { AppError } from '../../lib/errors'
import { endSessionsOf } from '../accounts/sessions.service'
import { queueLetter } from '../mail/mail.service'
import { listPeople, lockPersonByName, updateStanding, type ListedPerson } from './admin-people.queries'
import { canAdminister, canChangeStanding } from './people.policy'
import { presentAdminPerson } from './people.presenter'
import { writeReturnLetter, writeRoleLetter, writeSuspensionLetter } from './standing-letters'

function checkAdmin(actor: Actor): void {
  if (!canAdminister(actor)) throw new AppError('forbidden', 'Only admins look after people.')
}

export async function findPeople(db: Database, actor: Actor, query: AdminPeopleQuery): Promise<AdminPeople> {
  checkAdmin(actor)
  const { cursor, ...filter } = query
  const question = JSON.stringify([filter.q ?? '', filter.role ?? '', filter.standing ?? ''])
  const after = cursor === undefined ? undefined : readCursor(cursor, question, z.string())
  const rows = await listPeople(db, { ...filter, after }, limits.page + 1)
  const page = rows.slice(0, limits.page)
  const last = page.at(-1)
  return {
    items: page.map((row) => presentAdminPerson(row, actor)),
    next: rows.length > page.length && last !== undefined ? createCursor(last.sortName, question) : null,
  }
}

interface Change {
  readonly tx: Database
  readonly actor: Actor
  readonly person: ListedPerson
  readonly origin: string
  readonly requestId: string
}

const recipientOf = ({ id, email }: ListedPerson) => ({ personId: id, recipient: email ?? '' })

async function record({ tx, actor, person, requestId }: Change, action: string, detail: Record<string, unknown>) {
  const subject = { subjectType: 'person', subjectId: person.id }
  await recordAudit(tx, { actorId: actor.id, action, ...subject, detail, requestId })
}

async function changeRole(change: Change, role: ListedPerson['role']): Promise<void> {
  const { tx, person, origin } = change
  if (role === person.role) return
  await updateStanding(tx, person.id, { role })
  await queueLetter(tx, writeRoleLetter(recipientOf(person), role, origin))
  await record(change, 'person.change-role', { from: person.role, to: role })
}

async function suspend(change: Change, reason: string): Promise<void> {
  const { tx, person } = change
  const isNew = person.suspendedAt === null
  await updateStanding(tx, person.id, { suspendedReason: reason, ...(isNew && { suspendedAt: new Date() }) })
  await endSessionsOf(tx, person.id)
  await queueLetter(tx, writeSuspensionLetter(recipientOf(person), reason))
  await record(change, 'person.suspend', { reason })
}

async function liftSuspension(change: Change): Promise<void> {
  const { tx, person, origin } = change
  if (person.suspendedAt === null) return
  await updateStanding(tx, person.id, { suspendedAt: null, suspendedReason: null })
  await queueLetter(tx, writeReturnLetter(recipientOf(person), origin))
  await record(change, 'person.lift-suspension', {})
}

export interface StandingRequest {
  readonly name: string
  readonly change: PersonChange
  readonly origin: string
  readonly requestId: string
}

/** Changes a role or a suspension, with its audit and its letter, or nothing at all. */
export async function changePerson(db: Database, actor: Actor, request: StandingRequest): Promise<AdminPerson> {
  checkAdmin(actor)
  const { name, change, origin, requestId } = request
  return db.transaction(async (tx) => {
    const person = await lockPersonByName(tx, name)
    if (person === null) throw new AppError('not-found', `Nobody is called ${name}.`)
    if (!canChangeStanding(actor, person.id)) {
      throw new AppError('forbidden', 'Nobody changes their own role or suspends themselves: ask another admin.')
    }
    const whole = { tx, actor, person, origin, requestId }
    if (change.role !== undefined) await changeRole(whole, change.role)
    if (change.suspended === null) await liftSuspension(whole)
    else if (change.suspended !== undefined) await suspend(whole, change.suspended.reason)
    const changed = await lockPersonByName(tx, name)
    if (changed === null) throw new Error(`${person.id} is gone amid a change`)
    return presentAdminPerson(changed, actor)
  })
}
