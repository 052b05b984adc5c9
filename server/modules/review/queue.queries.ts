import { and, asc, count, desc, eq, lte, sql, type SQL } from 'drizzle-orm'
import type { QueueQuery } from '#shared/schemas/review'
import type { Database } from '../../db/database'
import { gear, proposals } from '../../db/schema/index'

const flagCount = sql<number>`jsonb_array_length(${proposals.flags})`
const acceptedCount = sql<number>`(select count(*) from proposals p where p.author_id = ${proposals.authorId} and p.status = 'approved')::int`

const columns = {
  id: proposals.id,
  kind: proposals.kind,
  slug: gear.slug,
  gearBrand: gear.brand,
  gearModel: gear.model,
  headRevision: gear.headRevision,
  baseRevision: proposals.baseRevision,
  identity: proposals.identity,
  values: proposals.values,
  summary: proposals.summary,
  authorId: proposals.authorId,
  flags: flagCount,
  accepted: acceptedCount,
  submittedAt: proposals.submittedAt,
  leasedBy: proposals.leasedBy,
  leasedUntil: proposals.leasedUntil,
}

const hoursByAge = { day: 24, week: 168, month: 720 } as const

type Filters = Pick<QueueQuery, 'kind' | 'age' | 'flagged'>

function isAsked({ kind, age, flagged }: Filters): SQL | undefined {
  const waitsLonger = (hours: number) => lte(proposals.submittedAt, sql`now() - ${hours} * interval '1 hour'`)
  return and(
    eq(proposals.status, 'pending'),
    kind === undefined ? undefined : eq(proposals.kind, kind),
    age === undefined ? undefined : waitsLonger(hoursByAge[age]),
    flagged === undefined ? undefined : flagged === 'yes' ? sql`${flagCount} > 0` : sql`${flagCount} = 0`,
  )
}

const orders = {
  oldest: [asc(proposals.submittedAt), asc(proposals.id)],
  newest: [desc(proposals.submittedAt), asc(proposals.id)],
  flagged: [desc(flagCount), asc(proposals.submittedAt), asc(proposals.id)],
  newcomers: [asc(acceptedCount), asc(proposals.submittedAt), asc(proposals.id)],
} as const

/** A queue moves while it is read: it is paged by how far one has come. */
export async function listQueue(db: Database, query: QueueQuery, offset: number, limit: number) {
  return db
    .select(columns)
    .from(proposals)
    .leftJoin(gear, eq(gear.id, proposals.gearId))
    .where(isAsked(query))
    .orderBy(...orders[query.sort])
    .offset(offset)
    .limit(limit)
}

export type QueueRow = Awaited<ReturnType<typeof listQueue>>[number]

export async function countQueue(db: Database, query: Filters): Promise<number> {
  const [row] = await db.select({ total: count() }).from(proposals).where(isAsked(query))
  return row?.total ?? 0
}

export async function countKinds(db: Database) {
  return db
    .select({ kind: proposals.kind, count: count() })
    .from(proposals)
    .where(eq(proposals.status, 'pending'))
    .groupBy(proposals.kind)
    .orderBy(asc(proposals.kind))
}

const waitedHours = sql`extract(epoch from ${proposals.decidedAt} - ${proposals.submittedAt}) / 3600`
const percentile = (share: number) =>
  sql<number | null>`percentile_cont(${share}) within group (order by ${waitedHours})`

/** How long those waited that were decided in the last days. */
export async function readWaited(db: Database, days: number) {
  const [row] = await db
    .select({ decided: count(), p50: percentile(0.5), p75: percentile(0.75), p95: percentile(0.95) })
    .from(proposals)
    .where(sql`${proposals.decidedAt} > now() - ${days} * interval '1 day' and ${proposals.submittedAt} is not null`)
  return row ?? { decided: 0, p50: null, p75: null, p95: null }
}

export async function readWaiting(db: Database) {
  const [row] = await db
    .select({ waiting: count(), oldestAt: sql<string | null>`min(${proposals.submittedAt})` })
    .from(proposals)
    .where(eq(proposals.status, 'pending'))
  return row ?? { waiting: 0, oldestAt: null }
}
