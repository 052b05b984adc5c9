import { isKindKey } from '#shared/kinds/index'
import type { Proposal, ProposalPatch, ProposalRequest } from '#shared/schemas/proposals'
import type { Database } from '../../db/database'
import { runTransaction } from '../../db/retry'
import type { ProposedIdentity, ProposedValues } from '../../db/schema/index'
import type { Actor } from '../../lib/actor'
import { recordAudit } from '../../lib/audit'
import { AppError, createInvalidError } from '../../lib/errors'
import { sanitizeNotes } from '../../lib/sanitize-notes'
import { requireLivePiece } from '../gear/gear.service'
import { checkComplete, findFileIssues } from './check-proposal'
import { findFlags } from './find-flags'
import { requireUndisputed } from './disputes.service'
import { insertMessage, listFiles } from './proposal-talk.queries'
import { listRights, requireContributor } from './proposals.policy'
import { changeProposal, insertProposal, type ProposalRow } from './proposals.queries'
import { getProposal, refuseStale, requireReadable } from './read-proposal.service'

/** The request that a change came with, as its traces name it. */
export interface Trace {
  readonly requestId: string
  /** What links in letters begin with. */
  readonly origin: string
}

type Content = Pick<ProposalRequest, 'identity' | 'values'>

/** Optional members that are absent rather than undefined, and notes that hold nothing which runs. */
function readContent({ identity = {}, values = {} }: Content) {
  const { notes, ...names } = identity
  const clean = typeof notes === 'string' ? sanitizeNotes(notes) || null : notes
  return {
    identity: { ...names, ...(clean !== undefined && { notes: clean }) } as ProposedIdentity,
    values: values as ProposedValues,
  }
}

export async function createProposal(
  db: Database,
  actor: Actor,
  request: ProposalRequest,
  { requestId }: Trace,
): Promise<Proposal> {
  requireContributor(actor)
  const { identity, values } = readContent(request)
  const fileIssues = findFileIssues(values, [], actor.id)
  if (fileIssues.length > 0) throw createInvalidError(fileIssues)
  const id = await runTransaction(db, async (tx) => {
    const piece = request.gear === undefined ? null : await requireLivePiece(tx, request.gear)
    checkBase(request, piece)
    const created = await insertProposal(tx, {
      kind: request.kind,
      gearId: piece?.id ?? null,
      baseRevision: request.baseRevision ?? null,
      authorId: actor.id,
      identity,
      values,
      summary: request.summary ?? null,
      flags: findFlags(request.kind, piece?.specs ?? {}, values, request.flags),
    })
    const event = { action: 'proposal.create', subjectType: 'proposal', subjectId: created }
    await recordAudit(tx, { actorId: actor.id, ...event, detail: { gear: request.gear ?? null }, requestId })
    return created
  })
  return getProposal(db, actor, id)
}

function checkBase(
  { kind, baseRevision }: { readonly kind?: string; readonly baseRevision?: number | undefined },
  piece: { readonly kind: string; readonly headRevision: number } | null,
): void {
  if (piece === null) return
  if (kind !== undefined && kind !== piece.kind) {
    throw createInvalidError([{ pointer: '#/kind', detail: `must be ${piece.kind}, which the piece is` }])
  }
  if (baseRevision !== undefined && baseRevision > piece.headRevision) {
    const detail = `must be a revision that there is: the newest is ${piece.headRevision}`
    throw createInvalidError([{ pointer: '#/baseRevision', detail }])
  }
}

/** The row, where its author may change it from this version on. */
export async function requireAmendable(
  db: Database,
  actor: Actor,
  id: string,
  version: number,
  right: 'amend' | 'submit' | 'withdraw' = 'amend',
): Promise<ProposalRow> {
  const row = await requireReadable(db, actor, id)
  requireContributor(actor)
  if (row.authorId !== actor.id) throw new AppError('forbidden', 'Only its author changes a proposal.')
  if (row.version !== version) await refuseStale(db, actor, id)
  if (!listRights(actor, row, null)[right]) {
    throw new AppError('conflict', `This cannot be done any more: the proposal is ${row.status.replace('-', ' ')}.`)
  }
  return row
}

export const toHead = ({ headSpecs, headProvenance }: ProposalRow) => ({
  specs: headSpecs ?? {},
  provenance: headProvenance ?? {},
})

function checkPatch(row: ProposalRow, { baseRevision }: ProposalPatch): void {
  if (baseRevision === undefined) return
  if (row.gearId === null || row.headRevision === null) {
    throw createInvalidError([{ pointer: '#/baseRevision', detail: 'must be left out for a new piece' }])
  }
  checkBase({ baseRevision }, { kind: row.kind, headRevision: row.headRevision })
}

/** Changes a proposal. One that waits keeps its place in the queue; whoever reviews an older version is told so. */
export async function amendProposal(
  db: Database,
  actor: Actor,
  { id, version }: { readonly id: string; readonly version: number },
  patch: ProposalPatch,
  { requestId }: Trace,
): Promise<Proposal> {
  const row = await requireAmendable(db, actor, id, version)
  checkPatch(row, patch)
  const given = readContent(patch)
  const identity = patch.identity === undefined ? row.identity : given.identity
  const values = patch.values === undefined ? row.values : given.values
  const isPending = row.status === 'pending'
  const head = toHead(row)
  if (isPending) {
    checkComplete({ kind: row.kind, authorId: actor.id, isNew: row.gearId === null, head, identity, values })
    await requireUndisputed(db, { gearId: row.gearId, values, proposalId: id })
  }
  const flags = isKindKey(row.kind) ? findFlags(row.kind, head.specs, values, patch.flags ?? storedFlags(row)) : []
  const isChanged = await runTransaction(db, async (tx) => {
    const fileIssues = findFileIssues(values, await listFiles(tx, id), actor.id)
    if (fileIssues.length > 0) throw createInvalidError(fileIssues)
    const change = {
      identity,
      values,
      flags,
      ...(patch.baseRevision !== undefined && { baseRevision: patch.baseRevision }),
      ...(patch.summary !== undefined && { summary: patch.summary }),
    }
    if (!(await changeProposal(tx, { id, version, statuses: [row.status] }, change))) return false
    if (isPending) await insertMessage(tx, { proposalId: id, personId: actor.id, kind: 'amended' })
    const event = { action: 'proposal.amend', subjectType: 'proposal', subjectId: id }
    await recordAudit(tx, { actorId: actor.id, ...event, detail: { from: version }, requestId })
    return true
  })
  return isChanged ? getProposal(db, actor, id) : refuseStale(db, actor, id)
}

const storedFlags = ({ flags }: ProposalRow) => flags as NonNullable<ProposalPatch['flags']>
