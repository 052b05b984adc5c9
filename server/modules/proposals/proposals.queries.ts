import { and, count, desc, eq, inArray, sql, type SQL } from 'drizzle-orm'
import type { Database } from '../../db/database'
import { gear, proposals, type ProposalStatus } from '../../db/schema/index'

const columns = {
  id: proposals.id,
  kind: proposals.kind,
  gearId: proposals.gearId,
  slug: gear.slug,
  gearBrand: gear.brand,
  gearModel: gear.model,
  gearStatus: gear.status,
  gearGtin: gear.gtin,
  gearNotes: gear.notes,
  headRevision: gear.headRevision,
  headSpecs: gear.specs,
  headProvenance: gear.provenance,
  mergedInto: gear.mergedInto,
  retiredAt: gear.retiredAt,
  baseRevision: proposals.baseRevision,
  authorId: proposals.authorId,
  status: proposals.status,
  version: proposals.version,
  identity: proposals.identity,
  values: proposals.values,
  summary: proposals.summary,
  flags: proposals.flags,
  submittedAt: proposals.submittedAt,
  decidedAt: proposals.decidedAt,
  decidedBy: proposals.decidedBy,
  decision: proposals.decision,
  revision: proposals.revision,
  leasedBy: proposals.leasedBy,
  leasedUntil: proposals.leasedUntil,
  createdAt: proposals.createdAt,
  updatedAt: proposals.updatedAt,
}

const withGear = (db: Database) => db.select(columns).from(proposals).leftJoin(gear, eq(gear.id, proposals.gearId))

export async function findProposal(db: Database, id: string) {
  const [row] = await withGear(db).where(eq(proposals.id, id))
  return row ?? null
}

export type ProposalRow = NonNullable<Awaited<ReturnType<typeof findProposal>>>

export async function insertProposal(db: Database, row: typeof proposals.$inferInsert): Promise<string> {
  const [inserted] = await db.insert(proposals).values(row).returning({ id: proposals.id })
  if (inserted === undefined) throw new Error('The proposal was not inserted')
  return inserted.id
}

export type ProposalChange = Partial<Omit<typeof proposals.$inferInsert, 'id' | 'authorId' | 'version'>>

/** Changes a proposal that is still as it was seen; of several that try, one does. */
export async function changeProposal(
  db: Database,
  seen: { readonly id: string; readonly version: number; readonly statuses: readonly ProposalStatus[] },
  change: ProposalChange,
): Promise<boolean> {
  const isAsSeen = and(
    eq(proposals.id, seen.id),
    eq(proposals.version, seen.version),
    inArray(proposals.status, [...seen.statuses]),
  )
  const changed = await db
    .update(proposals)
    .set({ ...change, version: sql`${proposals.version} + 1`, updatedAt: new Date() })
    .where(isAsSeen)
    .returning({ id: proposals.id })
  return changed.length > 0
}

/** The last row of a page. */
export interface ListPlace {
  readonly updatedAt: string
  readonly id: string
}

const ofAuthor = (authorId: number, status: ProposalStatus | undefined): SQL | undefined =>
  and(eq(proposals.authorId, authorId), status === undefined ? undefined : eq(proposals.status, status))

const isAfter = ({ updatedAt, id }: ListPlace): SQL =>
  sql`(${proposals.updatedAt}, ${proposals.id}) < (${updatedAt}::timestamptz, ${id}::uuid)`

export async function listMine(
  db: Database,
  authorId: number,
  status: ProposalStatus | undefined,
  after: ListPlace | null,
  limit: number,
): Promise<ProposalRow[]> {
  return withGear(db)
    .where(and(ofAuthor(authorId, status), after === null ? undefined : isAfter(after)))
    .orderBy(desc(proposals.updatedAt), desc(proposals.id))
    .limit(limit)
}

export async function countMine(db: Database, authorId: number, status: ProposalStatus | undefined): Promise<number> {
  const [row] = await db.select({ total: count() }).from(proposals).where(ofAuthor(authorId, status))
  return row?.total ?? 0
}

/** A person's open proposals about one piece. */
export async function listOpenAbout(db: Database, authorId: number, gearId: number) {
  const isOpen = inArray(proposals.status, ['draft', 'pending', 'sent-back'])
  return db
    .select({ id: proposals.id, status: proposals.status })
    .from(proposals)
    .where(and(eq(proposals.authorId, authorId), eq(proposals.gearId, gearId), isOpen))
    .orderBy(desc(proposals.updatedAt))
}

/** What became of earlier proposals, by author. */
export async function listRecords(db: Database, authorIds: readonly number[]) {
  if (authorIds.length === 0) return []
  return db
    .select({
      authorId: proposals.authorId,
      accepted: sql<number>`(count(*) filter (where ${proposals.status} = 'approved'))::int`,
      declined: sql<number>`(count(*) filter (where ${proposals.status} = 'declined'))::int`,
    })
    .from(proposals)
    .where(inArray(proposals.authorId, [...new Set(authorIds)]))
    .groupBy(proposals.authorId)
}
