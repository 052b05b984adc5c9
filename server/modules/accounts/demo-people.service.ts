import type { Database } from '../../db/database'
import type { Role } from '../../db/schema/people'
import { insertDemoPeople } from './accounts.queries'
import { hashPassword } from './passwords'

export interface DemoPerson {
  readonly name: string
  readonly email: string
  readonly password: string
  readonly role: Role
}

/** People to try every role with, marked as such; those who are there already stay as they are. Answers how many are new. */
export async function importDemoPeople(db: Database, demoPeople: readonly DemoPerson[]): Promise<number> {
  const rows = await Promise.all(
    demoPeople.map(async ({ name, email, password, role }) => {
      const passwordHash = await hashPassword(password)
      return { name, email, role, passwordHash, emailConfirmedAt: new Date(), isDemo: true }
    }),
  )
  return insertDemoPeople(db, rows)
}
