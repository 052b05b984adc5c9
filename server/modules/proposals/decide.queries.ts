import { and, eq, isNull, lte, or, sql, type SQL } from 'drizzle-orm'
import type { Database } from '../../db/database'
import { proposals, type ProposalStatus } from '../../db/schema/index'

const isFreeFor = (personId: number): SQL | undefined =>
  or(isNull(proposals.leasedUntil), lte(proposals.leasedUntil, sql`now()`), eq(proposals.leasedBy, personId))

const leaseMinutes = 15

/** Takes the lease, or takes it anew; answers whether it was to be had. */
export async function takeLease(db: Database, id: string, personId: number): Promise<boolean> {
  const taken = await db
    .update(proposals)
    .set({ leasedBy: personId, leasedUntil: sql`now() + ${leaseMinutes} * interval '1 minute'` })
    .where(and(eq(proposals.id, id), eq(proposals.status, 'pending'), isFreeFor(personId)))
    .returning({ id: proposals.id })
  return taken.length > 0
}

export async function dropLease(db: Database, id: string, personId: number): Promise<boolean> {
  const dropped = await db
    .update(proposals)
    .set({ leasedBy: null, leasedUntil: null })
    .where(and(eq(proposals.id, id), eq(proposals.leasedBy, personId)))
    .returning({ id: proposals.id })
  return dropped.length > 0
}

export interface Outcome {
  readonly status: Extract<ProposalStatus, 'approved' | 'declined' | 'sent-back'>
  readonly decision: Record<string, unknown>
}

/** Of all that decide at once, the one whose update finds it waiting, as it was read and not held by another. */
export async function claimDecision(
  db: Database,
  seen: { readonly id: string; readonly version: number },
  personId: number,
  { status, decision }: Outcome,
): Promise<boolean> {
  const isWaiting = and(
    eq(proposals.id, seen.id),
    eq(proposals.version, seen.version),
    eq(proposals.status, 'pending'),
    isFreeFor(personId),
  )
  const isEnd = status !== 'sent-back'
  const claimed = await db
    .update(proposals)
    .set({
      status,
      decision,
      version: sql`${proposals.version} + 1`,
      updatedAt: new Date(),
      leasedBy: null,
      leasedUntil: null,
      ...(isEnd && { decidedAt: new Date(), decidedBy: personId }),
    })
    .where(isWaiting)
    .returning({ id: proposals.id })
  return claimed.length > 0
}

/** Ties an approved proposal to what came of it. */
export async function recordOutcome(db: Database, id: string, gearId: number, revision: number): Promise<void> {
  await db.update(proposals).set({ gearId, revision }).where(eq(proposals.id, id))
}
