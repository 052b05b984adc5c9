import type { EvidenceRef } from '#shared/schemas/gear'
import type { Proposal, ProposalItem, ProposedField } from '#shared/schemas/proposals'
import type { Actor } from '../../lib/actor'
import type { HistoricValue } from '../gear/gear-history.service'
import { presentBacking } from '../gear/value.presenter'
import type { NameAuthor } from '../people/people.service'
import { listConflicts, type ComparedValue } from './compare-with-record'
import type { StoredFlag } from './find-flags'
import { listRights } from './proposals.policy'
import type { FileRow, MessageRow } from './proposal-talk.queries'
import type { ProposalRow } from './proposals.queries'

export interface StoredDecision {
  readonly decision: 'approve' | 'send-back' | 'decline'
  readonly reasonCode: string | null
  readonly words: string | null
  readonly fields: Readonly<Record<string, { decision: 'approve' | 'decline'; words: string | null }>>
  readonly by: number
  readonly at: string
}

export const readDecision = ({ decision }: Pick<ProposalRow, 'decision'>) =>
  decision as unknown as StoredDecision | null

const toText = (moment: Date | null): string | null => moment?.toISOString() ?? null

/** Who holds it now; a lease that ran out is none. */
export function findHolder({ leasedBy, leasedUntil }: Pick<ProposalRow, 'leasedBy' | 'leasedUntil'>): number | null {
  return leasedUntil !== null && leasedUntil.getTime() > Date.now() ? leasedBy : null
}

export function presentLease(row: Pick<ProposalRow, 'leasedBy' | 'leasedUntil'>, actor: Actor, nameAuthor: NameAuthor) {
  const holder = findHolder(row)
  if (holder === null || row.leasedUntil === null) return null
  const name = nameAuthor({ authorId: holder })
  return { holder: name, isMine: holder === actor.id, until: row.leasedUntil.toISOString() }
}

export function presentProposalItem(row: ProposalRow): ProposalItem {
  const { id, kind, slug, gearBrand, gearModel, headRevision, status, identity, values, summary } = row
  const isThere = slug !== null && gearBrand !== null && gearModel !== null && headRevision !== null
  return {
    id,
    kind,
    gear: isThere ? { slug, brand: gearBrand, model: gearModel, revision: headRevision } : null,
    brand: identity.brand ?? gearBrand,
    model: identity.model ?? gearModel,
    status,
    changed: Object.keys(values),
    summary,
    submittedAt: toText(row.submittedAt),
    decidedAt: toText(row.decidedAt),
    updatedAt: row.updatedAt.toISOString(),
    words: readDecision(row)?.words ?? null,
  }
}

function presentField(proposed: ProposedField['proposed'], compared: ComparedValue, nameAuthor: NameAuthor) {
  const toRecorded = (row: HistoricValue | null) =>
    row === null ? null : { value: row.value, ...presentBacking(row, nameAuthor) }
  return { base: toRecorded(compared.base), now: toRecorded(compared.now), proposed, state: compared.state }
}

function presentDecision(row: ProposalRow, nameAuthor: NameAuthor): Proposal['decision'] {
  const stored = readDecision(row)
  if (stored === null) return null
  const { decision, reasonCode, words, fields, by, at } = stored
  return { decision, reasonCode, words, fields, by: nameAuthor({ authorId: by }), at }
}

export const presentFile = ({ id, kind, contentType, width, height, caption }: FileRow): EvidenceRef => ({
  id,
  kind,
  contentType,
  width,
  height,
  caption,
})

function presentIdentityNow(row: ProposalRow): Proposal['identityNow'] {
  const { gearBrand: brand, gearModel: model, gearStatus: status, gearGtin: gtin, gearNotes: notes } = row
  return brand === null || model === null || status === null ? null : { brand, model, status, gtin, notes }
}

export interface WholeProposal {
  readonly row: ProposalRow
  readonly compared: ReadonlyMap<string, ComparedValue>
  readonly messages: readonly MessageRow[]
  readonly files: readonly FileRow[]
  readonly record: { readonly accepted: number; readonly declined: number }
}

export function presentProposal(actor: Actor, whole: WholeProposal, nameAuthor: NameAuthor): Proposal {
  const { row, compared, messages, files, record } = whole
  const values = row.values as Proposal['values']
  const fields = [...compared].map(([key, one]) => [key, presentField(values[key] ?? null, one, nameAuthor)] as const)
  return {
    ...presentProposalItem(row),
    version: row.version,
    author: nameAuthor({ authorId: row.authorId }),
    isMine: row.authorId === actor.id,
    record,
    baseRevision: row.baseRevision,
    identityNow: presentIdentityNow(row),
    identity: row.identity,
    values,
    fields: Object.fromEntries(fields),
    conflicts: row.status === 'approved' ? [] : listConflicts(compared),
    flags: row.flags as StoredFlag[],
    files: files.map(presentFile),
    messages: messages.map(({ id, personId, kind, words, at }) => ({
      id,
      author: nameAuthor({ authorId: personId }),
      kind: kind as Proposal['messages'][number]['kind'],
      words,
      at: at.toISOString(),
    })),
    lease: presentLease(row, actor, nameAuthor),
    decision: presentDecision(row, nameAuthor),
    revision: row.revision,
    createdAt: row.createdAt.toISOString(),
    can: listRights(actor, row, findHolder(row)),
  }
}
