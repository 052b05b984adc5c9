import { sql } from 'drizzle-orm'
import {
  bigint,
  check,
  date,
  doublePrecision,
  foreignKey,
  index,
  integer,
  jsonb,
  pgTable,
  primaryKey,
  text,
  timestamp,
  uniqueIndex,
  uuid,
  type AnyPgColumn,
} from 'drizzle-orm/pg-core'
import { people } from './people'

/** How well one value is backed. `plusMinus` is in the value's own unit; `date` is the day of the measurement or document. */
export interface StoredProvenance {
  readonly source: 'measured' | 'maker' | 'estimate'
  readonly plusMinus?: number
  readonly evidence?: string
  readonly date: string
  /** A name as it came with imported data; people with an account are named by `authorId`. */
  readonly author?: string
  readonly authorId?: number
  readonly revision: number
}

/** What a piece is called and said of it, beside its specs. */
export interface StoredIdentity {
  readonly brand: string
  readonly model: string
  readonly status: 'current' | 'discontinued' | 'unknown'
  readonly gtin: string | null
  readonly notes: string | null
}

export interface IdentityChange {
  readonly before: Partial<StoredIdentity>
  readonly after: Partial<StoredIdentity>
}

export type StoredSpecs = Record<string, unknown>
export type StoredProvenances = Record<string, StoredProvenance>

const moment = (name: string) => timestamp(name, { withTimezone: true, precision: 3 })

/** One row per piece of gear. `specs` and `provenance` are its newest revision, kept here so that the catalogue is read from one table. */
export const gear = pgTable(
  'gear',
  {
    id: integer('id').primaryKey().generatedAlwaysAsIdentity(),
    slug: text('slug').notNull(),
    kind: text('kind').notNull(),
    brand: text('brand').notNull(),
    model: text('model').notNull(),
    gtin: text('gtin'),
    status: text('status').$type<'current' | 'discontinued' | 'unknown'>().notNull().default('unknown'),
    notes: text('notes'),
    /** A duplicate leads to the piece it is merged into. */
    mergedInto: integer('merged_into').references((): AnyPgColumn => gear.id),
    /** Taken out of the catalogue: it never was, or nobody can say what it is. */
    retiredAt: moment('retired_at'),
    retiredReason: text('retired_reason'),
    headRevision: integer('head_revision').notNull(),
    specs: jsonb('specs').$type<StoredSpecs>().notNull(),
    provenance: jsonb('provenance').$type<StoredProvenances>().notNull(),
    /** What it is found by, written with each change; `searchVersion` tells by which state of the writer. */
    searchName: text('search_name').notNull().default(''),
    searchCode: text('search_code').notNull().default(''),
    searchFullCode: text('search_full_code').notNull().default(''),
    searchTerms: text('search_terms').array().notNull().default([]),
    searchVersion: integer('search_version').notNull().default(0),
    createdAt: moment('created_at').notNull().defaultNow(),
    updatedAt: moment('updated_at').notNull().defaultNow(),
  },
  (table) => [
    index('gear_search_name_idx').using('gin', table.searchName.op('gin_trgm_ops')),
    index('gear_search_terms_idx').using('gin', table.searchTerms),
    index('gear_search_code_idx').on(table.searchCode.op('text_pattern_ops')),
    index('gear_search_full_code_idx').on(table.searchFullCode.op('text_pattern_ops')),
    index('gear_search_version_idx').on(table.searchVersion),
    uniqueIndex('gear_slug_key').on(table.slug),
    uniqueIndex('gear_gtin_key').on(table.gtin),
    index('gear_kind_name_idx').on(table.kind, sql`lower(${table.brand})`, sql`lower(${table.model})`, table.id),
    index('gear_name_idx').on(sql`lower(${table.brand})`, sql`lower(${table.model})`, table.id),
    index('gear_updated_idx').on(table.updatedAt, table.id),
    index('gear_merged_idx').on(table.mergedInto),
    check('gear_not_merged_into_itself', sql`${table.mergedInto} <> ${table.id}`),
    check('gear_retired_whole', sql`(${table.retiredAt} is null) = (${table.retiredReason} is null)`),
    check('gear_slug_form', sql`${table.slug} ~ '^[a-z0-9]+(-[a-z0-9]+)*$' and length(${table.slug}) <= 120`),
    check('gear_kind_form', sql`${table.kind} ~ '^[a-z]+(-[a-z]+)*$'`),
    check(
      'gear_name_length',
      sql`length(${table.brand}) between 1 and 80 and length(${table.model}) between 1 and 120`,
    ),
    check('gear_gtin_form', sql`${table.gtin} ~ '^[0-9]{8,14}$'`),
    check('gear_status_known', sql`${table.status} in ('current', 'discontinued', 'unknown')`),
    check('gear_head_revision_positive', sql`${table.headRevision} >= 1`),
    check(
      'gear_specs_object',
      sql`jsonb_typeof(${table.specs}) = 'object' and jsonb_typeof(${table.provenance}) = 'object'`,
    ),
  ],
)

/** A numbered, complete and immutable state of a piece's specs. A trigger refuses to change or remove a row. */
export const gearRevisions = pgTable(
  'gear_revisions',
  {
    gearId: integer('gear_id')
      .notNull()
      .references(() => gear.id),
    number: integer('number').notNull(),
    specs: jsonb('specs').$type<StoredSpecs>().notNull(),
    summary: text('summary'),
    author: text('author'),
    authorId: integer('author_id').references(() => people.id),
    /** What it is called, where the revision changed that: both sides, so that it can be taken back. */
    identity: jsonb('identity').$type<IdentityChange>(),
    /** Who approved it. */
    reviewerId: integer('reviewer_id').references(() => people.id),
    proposalId: uuid('proposal_id'),
    createdAt: moment('created_at').notNull().defaultNow(),
  },
  (table) => [
    primaryKey({ columns: [table.gearId, table.number] }),
    index('gear_revisions_author_idx').on(table.authorId, table.createdAt),
    check('gear_revisions_author_given', sql`num_nonnulls(${table.author}, ${table.authorId}) = 1`),
    check('gear_revisions_number_positive', sql`${table.number} >= 1`),
    check('gear_revisions_specs_object', sql`jsonb_typeof(${table.specs}) = 'object'`),
  ],
)

/** Each value that a revision set, with what backs it. A null value: the revision removed it. Immutable like the revisions. */
export const gearValues = pgTable(
  'gear_values',
  {
    gearId: integer('gear_id').notNull(),
    revision: integer('revision').notNull(),
    key: text('key').notNull(),
    value: jsonb('value'),
    source: text('source').$type<StoredProvenance['source']>(),
    plusMinus: doublePrecision('plus_minus'),
    evidence: text('evidence'),
    dated: date('dated', { mode: 'string' }).notNull(),
    author: text('author'),
    authorId: integer('author_id').references(() => people.id),
    /** Ids of the photos and documents behind it. */
    files: uuid('files').array().notNull().default([]),
    /** As it was typed. */
    raw: text('raw'),
    /**
     * `plain`: used unless a better source stands · `chosen`: settled a dispute, and used until something at least as good
     * follows · `reset`: nothing before it counts any longer
     */
    standing: text('standing').$type<'plain' | 'chosen' | 'reset'>().notNull().default('plain'),
  },
  (table) => [
    primaryKey({ columns: [table.gearId, table.revision, table.key] }),
    foreignKey({
      name: 'gear_values_revision_fk',
      columns: [table.gearId, table.revision],
      foreignColumns: [gearRevisions.gearId, gearRevisions.number],
    }),
    index('gear_values_author_idx').on(table.authorId),
    check('gear_values_author_given', sql`num_nonnulls(${table.author}, ${table.authorId}) = 1`),
    check('gear_values_source_known', sql`${table.source} in ('measured', 'maker', 'estimate')`),
    check('gear_values_removed_whole', sql`(${table.value} is null) = (${table.source} is null)`),
    check('gear_values_standing_known', sql`${table.standing} in ('plain', 'chosen', 'reset')`),
    check('gear_values_plus_minus_positive', sql`${table.plusMinus} >= 0`),
  ],
)

/** One row, raised by a trigger with every change of `gear`, so that a process can tell cheaply whether its copy is still true. */
export const catalogueVersion = pgTable(
  'catalogue_version',
  {
    id: integer('id').primaryKey(),
    version: bigint('version', { mode: 'number' }).notNull(),
  },
  (table) => [check('catalogue_version_single', sql`${table.id} = 1`)],
)
