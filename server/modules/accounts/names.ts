import type { Database } from '../../db/database'
import { getPersonByName, type PersonRow } from './accounts.queries'

/** Names that speak for the site, or that stand for nobody in particular. */
const reserved = new Set([
  'admin',
  'administrator',
  'confirm',
  'moderator',
  'stillfits',
  'system',
  'support',
  'a former member',
])

/** An address that was never confirmed holds its name no longer than the link in its letter works. */
const confirmWithinMs = 48 * 60 * 60 * 1000

export const nameTaken = { pointer: '#/name', detail: "is somebody else's already" } as const

export const isPending = ({ emailConfirmedAt }: PersonRow): boolean => emailConfirmedAt === null

/** Somebody who signed up too long ago without confirming it. */
export const isLapsed = (person: PersonRow, now: Date): boolean =>
  isPending(person) && person.createdAt.getTime() + confirmWithinMs <= now.getTime()

/** A name is public, so saying that it is taken tells nothing new. */
export async function isNameTaken(db: Database, name: string, by: { email: string; now: Date }): Promise<boolean> {
  if (reserved.has(name.toLowerCase())) return true
  const holder = await getPersonByName(db, name)
  if (holder === null || isLapsed(holder, by.now)) return false
  return !isPending(holder) || holder.email?.toLowerCase() !== by.email.toLowerCase()
}
