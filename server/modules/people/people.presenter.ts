import type { AdminPerson, Person } from '#shared/schemas/people'
import type { Actor } from '../../lib/actor'
import { canAdminister, canChangeStanding } from './people.policy'

interface PublicRow {
  readonly name: string | null
  readonly role: Actor['role']
  readonly createdAt: Date
  readonly isDemo: boolean
}

type Measurement = Omit<Person['recent'][number], 'at'> & { readonly at: Date }

export function presentPerson(
  { name, role, createdAt, isDemo }: PublicRow,
  accepted: Person['accepted'],
  measurements: readonly Measurement[],
  actor: Actor | null,
): Person {
  return {
    name: name ?? '',
    role,
    since: createdAt.toISOString(),
    isDemo,
    accepted,
    recent: measurements.map((measurement) => ({ ...measurement, at: measurement.at.toISOString() })),
    can: { administer: canAdminister(actor) },
  }
}

interface AdminRow extends PublicRow {
  readonly id: number
  readonly email: string | null
  readonly emailConfirmedAt: Date | null
  readonly suspendedAt: Date | null
  readonly suspendedReason: string | null
  readonly acceptedRevisions: number
}

export function presentAdminPerson(row: AdminRow, actor: Actor): AdminPerson {
  const { id, name, email, role, createdAt, emailConfirmedAt, isDemo, suspendedAt, suspendedReason } = row
  const mayChange = canChangeStanding(actor, id)
  return {
    name: name ?? '',
    email: email ?? '',
    role,
    since: createdAt.toISOString(),
    isConfirmed: emailConfirmedAt !== null,
    isDemo,
    acceptedRevisions: row.acceptedRevisions,
    suspended: suspendedAt && { since: suspendedAt.toISOString(), reason: suspendedReason ?? '' },
    can: { changeRole: mayChange, suspend: mayChange },
  }
}
