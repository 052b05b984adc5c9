import { sql } from 'drizzle-orm'
import {
  bigint,
  boolean,
  check,
  index,
  integer,
  jsonb,
  pgTable,
  primaryKey,
  text,
  timestamp,
  uniqueIndex,
  uuid,
} from 'drizzle-orm/pg-core'

const moment = (name: string) => timestamp(name, { withTimezone: true, precision: 3 })

export type Role = 'member' | 'moderator' | 'admin'

/** Somebody with an account. Deleted, a row keeps its number alone, so that what they contributed keeps an author. */
export const people = pgTable(
  'people',
  {
    id: integer('id').primaryKey().generatedAlwaysAsIdentity(),
    /** Public, and the address of the person's page; null once the account is deleted. */
    name: text('name'),
    email: text('email'),
    emailConfirmedAt: moment('email_confirmed_at'),
    passwordHash: text('password_hash'),
    role: text('role').$type<Role>().notNull().default('member'),
    suspendedAt: moment('suspended_at'),
    suspendedReason: text('suspended_reason'),
    deletedAt: moment('deleted_at'),
    /** Whether notices are sent by e-mail; what concerns the account itself always is. */
    wantsNotices: boolean('wants_notices').notNull().default(true),
    isDemo: boolean('is_demo').notNull().default(false),
    createdAt: moment('created_at').notNull().defaultNow(),
  },
  (table) => [
    uniqueIndex('people_name_key').on(sql`lower(${table.name})`),
    uniqueIndex('people_email_key').on(sql`lower(${table.email})`),
    check('people_role_known', sql`${table.role} in ('member', 'moderator', 'admin')`),
    check(
      'people_deleted_whole',
      sql`(${table.deletedAt} is null) = (${table.name} is not null and ${table.email} is not null and ${table.passwordHash} is not null)`,
    ),
  ],
)

/** Only the SHA-256 of a session's id is kept: what leaks from here signs nobody in. */
export const sessions = pgTable(
  'sessions',
  {
    idHash: text('id_hash').primaryKey(),
    /** What a person's own list calls it by. */
    publicId: uuid('public_id').notNull().defaultRandom(),
    personId: integer('person_id')
      .notNull()
      .references(() => people.id),
    createdAt: moment('created_at').notNull().defaultNow(),
    /** The end by idleness, moved as the session is used; the absolute end is reckoned from `createdAt`. */
    expiresAt: moment('expires_at').notNull(),
    seenAt: moment('seen_at').notNull().defaultNow(),
    agent: text('agent'),
  },
  (table) => [
    uniqueIndex('sessions_public_id_key').on(table.publicId),
    index('sessions_person_idx').on(table.personId),
    index('sessions_expires_idx').on(table.expiresAt),
  ],
)

/** What a link in an e-mail proves, once. Only the SHA-256 of the token is kept. */
export const emailTokens = pgTable(
  'email_tokens',
  {
    tokenHash: text('token_hash').primaryKey(),
    personId: integer('person_id')
      .notNull()
      .references(() => people.id),
    purpose: text('purpose').$type<'confirm' | 'reset' | 'change-email' | 'unsubscribe'>().notNull(),
    /** The address that the link went to, which it confirms. */
    email: text('email').notNull(),
    createdAt: moment('created_at').notNull().defaultNow(),
    expiresAt: moment('expires_at').notNull(),
    usedAt: moment('used_at'),
  },
  (table) => [
    index('email_tokens_person_idx').on(table.personId, table.purpose),
    check('email_tokens_purpose_known', sql`${table.purpose} in ('confirm', 'reset', 'change-email', 'unsubscribe')`),
  ],
)

/** Counts shared by every process: failed sign-ins of an account, mails asked for, writes of a person. */
export const rateCounts = pgTable(
  'rate_counts',
  {
    key: text('key').primaryKey(),
    hits: integer('hits').notNull(),
    resetsAt: moment('resets_at').notNull(),
  },
  (table) => [index('rate_counts_resets_idx').on(table.resetsAt)],
)

/** Who did what, when. Only ever added to: triggers and the application's role see to it. */
export const auditEvents = pgTable(
  'audit_events',
  {
    id: bigint('id', { mode: 'number' }).primaryKey().generatedAlwaysAsIdentity(),
    at: moment('at').notNull().defaultNow(),
    /** Null: the system itself, or somebody without an account. */
    actorId: integer('actor_id').references(() => people.id),
    action: text('action').notNull(),
    subjectType: text('subject_type').notNull(),
    subjectId: text('subject_id').notNull(),
    detail: jsonb('detail').$type<Record<string, unknown>>().notNull().default({}),
    requestId: text('request_id'),
  },
  (table) => [
    index('audit_events_at_idx').on(table.at, table.id),
    index('audit_events_actor_idx').on(table.actorId, table.id),
    index('audit_events_subject_idx').on(table.subjectType, table.subjectId, table.id),
    index('audit_events_action_idx').on(table.action, table.id),
  ],
)

/** A letter, written in the transaction of what it tells of; a worker sends it. */
export const outbox = pgTable(
  'outbox',
  {
    id: uuid('id').primaryKey().defaultRandom(),
    personId: integer('person_id').references(() => people.id),
    recipient: text('recipient').notNull(),
    kind: text('kind').notNull(),
    subject: text('subject').notNull(),
    textBody: text('text_body').notNull(),
    htmlBody: text('html_body').notNull(),
    /** A notice can be unsubscribed from in one click, by this address. */
    unsubscribeUrl: text('unsubscribe_url'),
    status: text('status').$type<'waiting' | 'sent' | 'dead'>().notNull().default('waiting'),
    attempts: integer('attempts').notNull().default(0),
    lastError: text('last_error'),
    createdAt: moment('created_at').notNull().defaultNow(),
    sentAt: moment('sent_at'),
  },
  (table) => [
    index('outbox_status_idx').on(table.status, table.createdAt),
    index('outbox_person_idx').on(table.personId),
    check('outbox_status_known', sql`${table.status} in ('waiting', 'sent', 'dead')`),
  ],
)

/** The stored answer to a POST that may be sent again. `status` is null while the first is on its way. */
export const idempotencyKeys = pgTable(
  'idempotency_keys',
  {
    personId: integer('person_id')
      .notNull()
      .references(() => people.id),
    key: text('key').notNull(),
    requestHash: text('request_hash').notNull(),
    status: integer('status'),
    headers: jsonb('headers').$type<Record<string, string>>(),
    body: text('body'),
    createdAt: moment('created_at').notNull().defaultNow(),
  },
  (table) => [
    primaryKey({ columns: [table.personId, table.key] }),
    index('idempotency_keys_created_idx').on(table.createdAt),
  ],
)

/** Long work that can be left and come back to. */
export const longJobs = pgTable(
  'long_jobs',
  {
    id: uuid('id').primaryKey().defaultRandom(),
    kind: text('kind').notNull(),
    startedBy: integer('started_by')
      .notNull()
      .references(() => people.id),
    subject: jsonb('subject').$type<Record<string, unknown>>().notNull(),
    status: text('status').$type<'waiting' | 'running' | 'done' | 'failed'>().notNull().default('waiting'),
    done: integer('done').notNull().default(0),
    total: integer('total'),
    outcome: jsonb('outcome').$type<Record<string, unknown>>(),
    createdAt: moment('created_at').notNull().defaultNow(),
    endedAt: moment('ended_at'),
  },
  (table) => [
    index('long_jobs_kind_idx').on(table.kind, table.createdAt),
    check('long_jobs_status_known', sql`${table.status} in ('waiting', 'running', 'done', 'failed')`),
  ],
)
