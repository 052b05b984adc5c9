import { isKindKey, type KindKey } from '#shared/kinds/index'
import { specsInputSchema } from '#shared/schemas/specs'
import type { Database } from '../../db/database'
import { findUniqueViolation } from '../../db/errors'
import type { ProposedIdentity, StoredIdentity, StoredProvenance, StoredProvenances } from '../../db/schema/index'
import { AppError, type Issue } from '../../lib/errors'
import { toIssues } from '../../lib/to-issues'
import { insertPiece, insertRevision, listIdentityChanges, updatePiece, type NewValue } from './gear-revise.queries'
import { lockHeadById } from './gear-writes.queries'
import { createSlug } from './slug'
import { takesPlace } from './value-history'

export type Head = NonNullable<Awaited<ReturnType<typeof lockHeadById>>>

/** A person's change of a piece, approved by another. */
export interface Change {
  readonly authorId: number
  readonly reviewerId: number | null
  readonly proposalId: string | null
  readonly summary: string | null
  readonly identity: ProposedIdentity
  readonly values: readonly NewValue[]
}

export interface State {
  readonly specs: Record<string, unknown>
  readonly provenance: StoredProvenances
}

function toBacking(row: NewValue, source: StoredProvenance['source'], revision: number): StoredProvenance {
  const { plusMinus, evidence, dated, author, authorId } = row
  return {
    source,
    ...(typeof plusMinus === 'number' && { plusMinus }),
    ...(typeof evidence === 'string' && { evidence }),
    date: dated,
    ...(typeof author === 'string' ? { author } : typeof authorId === 'number' ? { authorId } : {}),
    revision,
  }
}

/** The state once the rows came: a value that stands behind the one in use changes nothing of it. */
export function mergeValues(before: State, rows: readonly NewValue[], revision: number): State {
  const specs = { ...before.specs }
  const provenance: Record<string, StoredProvenance> = { ...before.provenance }
  for (const row of rows) {
    const { key, value, source, standing = 'plain' } = row
    if (source === null || source === undefined) {
      delete specs[key]
      delete provenance[key]
    } else if (takesPlace({ source, standing }, provenance[key])) {
      specs[key] = value
      provenance[key] = toBacking(row, source, revision)
    }
  }
  return { specs, provenance }
}

/** What is wrong with a whole state, by the keys of its values. */
export function findStateIssues(kind: KindKey, { specs, provenance }: State): Issue[] {
  const sourced = Object.fromEntries(
    Object.entries(specs).map(([key, value]) => [key, { value, source: provenance[key]?.source ?? 'estimate' }]),
  )
  const { error } = specsInputSchema(kind).safeParse(sourced)
  return error === undefined ? [] : toIssues(error)
}

function checkState(kind: string, state: State): void {
  if (!isKindKey(kind)) throw new Error(`The kind ${kind} is no longer known`)
  const issues = findStateIssues(kind, state)
  if (issues.length === 0) return
  const detail = 'Together with what is on record now, these values contradict each other. Nothing was changed.'
  throw new AppError('conflict', detail, issues)
}

function describeIdentity(before: StoredIdentity, change: ProposedIdentity) {
  const after: StoredIdentity = { ...before, ...change }
  const keys = (Object.keys(after) as (keyof StoredIdentity)[]).filter((key) => after[key] !== before[key])
  const pick = (identity: StoredIdentity) => Object.fromEntries(keys.map((key) => [key, identity[key]]))
  return { after, changed: keys.length === 0 ? null : { before: pick(before), after: pick(after) } }
}

function explainTaken(error: unknown): never {
  const constraint = findUniqueViolation(error)
  if (constraint === null || !constraint.startsWith('gear_')) throw error
  const what = constraint.includes('gtin') ? 'this GTIN' : 'this brand and model'
  throw new AppError('conflict', `Another piece of gear has ${what}; look for the duplicate first.`, [], {
    cause: error,
  })
}

const unnamed: StoredIdentity = { brand: '', model: '', status: 'unknown', gtin: null, notes: null }

/** Adds a piece with its first revision, in the caller's transaction. */
export async function addPiece(tx: Database, kind: string, change: Change) {
  const { after: identity } = describeIdentity(unnamed, change.identity)
  const { values, identity: _, ...rest } = change
  const state = mergeValues({ specs: {}, provenance: {} }, values, 1)
  checkState(kind, state)
  const slug = createSlug(identity.brand, identity.model)
  const gearId = await insertPiece(tx, slug, { kind, identity, number: 1, ...state }).catch(explainTaken)
  await insertRevision(tx, { ...rest, gearId, number: 1, specs: state.specs, identity: null, values })
  return { gearId, slug, number: 1 }
}

/** Adds a revision to a head that is locked, in the caller's transaction; answers its number. */
export async function revisePiece(tx: Database, head: Head, change: Change): Promise<number> {
  const { brand, model, status, gtin, notes } = head
  const { after, changed } = describeIdentity({ brand, model, status, gtin, notes }, change.identity)
  const { values, identity: _, ...rest } = change
  const number = head.number + 1
  const state = mergeValues(head, values, number)
  checkState(head.kind, state)
  await insertRevision(tx, { ...rest, gearId: head.id, number, specs: state.specs, identity: changed, values })
  await updatePiece(tx, head.id, { kind: head.kind, identity: after, number, ...state }).catch(explainTaken)
  return number
}

/** Takes a piece's lock, so that nobody else builds on the same head. */
export async function lockPiece(tx: Database, id: number): Promise<Head> {
  const head = await lockHeadById(tx, id)
  if (head === null) throw new Error(`There is no piece ${id}`)
  return head
}

/** What it would take to call a piece again as it was called at a revision: later changes of names, undone. */
export async function readIdentityAt(tx: Database, head: Head, revision: number): Promise<ProposedIdentity> {
  const changes = (await listIdentityChanges(tx, head.id)).filter(({ number }) => number > revision)
  const { brand, model, status, gtin, notes } = head
  const now: StoredIdentity = { brand, model, status, gtin, notes }
  const then = changes.toReversed().reduce<StoredIdentity>((state, { identity }) => {
    return { ...state, ...identity?.before }
  }, now)
  const { changed } = describeIdentity(now, then)
  return changed?.after ?? {}
}
