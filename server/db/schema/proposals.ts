import { sql } from 'drizzle-orm'
import {
  bigint,
  check,
  doublePrecision,
  index,
  integer,
  jsonb,
  pgTable,
  text,
  timestamp,
  uniqueIndex,
  uuid,
} from 'drizzle-orm/pg-core'
import { gear } from './gear'
import { people } from './people'

const moment = (name: string) => timestamp(name, { withTimezone: true, precision: 3 })

export type ProposalStatus = 'draft' | 'pending' | 'sent-back' | 'approved' | 'declined' | 'withdrawn'

/** One proposed value: canonical, beside what was typed; null in the proposal takes the value away. */
export interface ProposedValue {
  readonly value: unknown
  /** As it was typed, unit included. */
  readonly raw?: string
  readonly source: 'measured' | 'maker' | 'estimate'
  readonly plusMinus?: number
  /** Words or an https address that back it. */
  readonly evidence?: string
  /** Photos and documents that back it, by their ids. */
  readonly files?: readonly string[]
  /** Day of the measurement or document. */
  readonly date: string
}

export type ProposedValues = Record<string, ProposedValue | null>

export interface ProposedIdentity {
  readonly brand?: string
  readonly model?: string
  readonly status?: 'current' | 'discontinued' | 'unknown'
  readonly gtin?: string | null
  readonly notes?: string | null
}

/** A submitted new entry or change. `version` rises with every change of the row and is its ETag. */
export const proposals = pgTable(
  'proposals',
  {
    id: uuid('id').primaryKey().defaultRandom(),
    kind: text('kind').notNull(),
    /** Null: a new piece, until it is approved. */
    gearId: integer('gear_id').references(() => gear.id),
    baseRevision: integer('base_revision'),
    authorId: integer('author_id')
      .notNull()
      .references(() => people.id),
    status: text('status').$type<ProposalStatus>().notNull().default('draft'),
    version: integer('version').notNull().default(1),
    identity: jsonb('identity').$type<ProposedIdentity>().notNull().default({}),
    values: jsonb('values').$type<ProposedValues>().notNull().default({}),
    summary: text('summary'),
    /** What looked unlikely, and what its author said of it. */
    flags: jsonb('flags').$type<unknown[]>().notNull().default([]),
    submittedAt: moment('submitted_at'),
    decidedAt: moment('decided_at'),
    decidedBy: integer('decided_by').references(() => people.id),
    decision: jsonb('decision').$type<Record<string, unknown>>(),
    /** The revision that came of it. */
    revision: integer('revision'),
    leasedBy: integer('leased_by').references(() => people.id),
    leasedUntil: moment('leased_until'),
    createdAt: moment('created_at').notNull().defaultNow(),
    updatedAt: moment('updated_at').notNull().defaultNow(),
  },
  (table) => [
    index('proposals_author_idx').on(table.authorId, table.updatedAt),
    index('proposals_queue_idx').on(table.status, table.submittedAt),
    index('proposals_gear_idx').on(table.gearId, table.status),
    check(
      'proposals_status_known',
      sql`${table.status} in ('draft', 'pending', 'sent-back', 'approved', 'declined', 'withdrawn')`,
    ),
    check('proposals_base_whole', sql`${table.baseRevision} is null or ${table.gearId} is not null`),
    check(
      'proposals_decided_whole',
      sql`(${table.status} in ('approved', 'declined')) = (${table.decidedBy} is not null)`,
    ),
  ],
)

/** What was said about a proposal, and each turn it took: never changed, only added to. */
export const proposalMessages = pgTable(
  'proposal_messages',
  {
    id: bigint('id', { mode: 'number' }).primaryKey().generatedAlwaysAsIdentity(),
    proposalId: uuid('proposal_id')
      .notNull()
      .references(() => proposals.id),
    personId: integer('person_id').references(() => people.id),
    kind: text('kind').notNull(),
    words: text('words'),
    detail: jsonb('detail').$type<Record<string, unknown>>().notNull().default({}),
    at: moment('at').notNull().defaultNow(),
  },
  (table) => [index('proposal_messages_proposal_idx').on(table.proposalId, table.id)],
)

/** A photo or document. Public only once a proposal that names it was approved. */
export const evidenceFiles = pgTable(
  'evidence_files',
  {
    id: uuid('id').primaryKey().defaultRandom(),
    proposalId: uuid('proposal_id').references(() => proposals.id),
    uploaderId: integer('uploader_id')
      .notNull()
      .references(() => people.id),
    kind: text('kind').$type<'photo' | 'document'>().notNull(),
    contentType: text('content_type').notNull(),
    bytes: integer('bytes').notNull(),
    width: integer('width'),
    height: integer('height'),
    sha256: text('sha256').notNull(),
    /** Where it lies in the object store; made up by the server. */
    storageKey: text('storage_key').notNull(),
    thumbnailKey: text('thumbnail_key'),
    /** Its own words: what it shows. */
    caption: text('caption'),
    publishedAt: moment('published_at'),
    createdAt: moment('created_at').notNull().defaultNow(),
  },
  (table) => [
    uniqueIndex('evidence_files_storage_key').on(table.storageKey),
    index('evidence_files_proposal_idx').on(table.proposalId),
    index('evidence_files_orphan_idx')
      .on(table.createdAt)
      .where(sql`${table.proposalId} is null`),
    check('evidence_files_kind_known', sql`${table.kind} in ('photo', 'document')`),
  ],
)

/** "Same number here": somebody else measured a value too. One a person and value. */
export const confirmations = pgTable(
  'confirmations',
  {
    id: integer('id').primaryKey().generatedAlwaysAsIdentity(),
    gearId: integer('gear_id')
      .notNull()
      .references(() => gear.id),
    key: text('key').notNull(),
    personId: integer('person_id')
      .notNull()
      .references(() => people.id),
    /** The value that was confirmed, and what they measured themselves if they said. */
    value: jsonb('value').notNull(),
    measured: doublePrecision('measured'),
    at: moment('at').notNull().defaultNow(),
  },
  (table) => [uniqueIndex('confirmations_once').on(table.gearId, table.key, table.personId)],
)

/** "Something wrong here?", from anybody. */
export const errorReports = pgTable(
  'error_reports',
  {
    id: uuid('id').primaryKey().defaultRandom(),
    gearId: integer('gear_id')
      .notNull()
      .references(() => gear.id),
    key: text('key'),
    words: text('words').notNull(),
    personId: integer('person_id').references(() => people.id),
    status: text('status').$type<'open' | 'settled'>().notNull().default('open'),
    settledBy: integer('settled_by').references(() => people.id),
    settledAt: moment('settled_at'),
    createdAt: moment('created_at').notNull().defaultNow(),
  },
  (table) => [
    index('error_reports_status_idx').on(table.status, table.createdAt),
    index('error_reports_gear_idx').on(table.gearId),
    check('error_reports_status_known', sql`${table.status} in ('open', 'settled')`),
  ],
)

/** A value that went to and fro: sources disagree, and a moderator settles it. */
export const disputes = pgTable(
  'disputes',
  {
    id: uuid('id').primaryKey().defaultRandom(),
    gearId: integer('gear_id')
      .notNull()
      .references(() => gear.id),
    key: text('key').notNull(),
    proposalId: uuid('proposal_id').references(() => proposals.id),
    status: text('status').$type<'open' | 'settled'>().notNull().default('open'),
    words: text('words'),
    settledBy: integer('settled_by').references(() => people.id),
    settledAt: moment('settled_at'),
    createdAt: moment('created_at').notNull().defaultNow(),
  },
  (table) => [
    uniqueIndex('disputes_open_once')
      .on(table.gearId, table.key)
      .where(sql`${table.status} = 'open'`),
    check('disputes_status_known', sql`${table.status} in ('open', 'settled')`),
  ],
)
