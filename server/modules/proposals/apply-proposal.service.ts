import type { DecisionRequest } from '#shared/schemas/review'
import type { Database } from '../../db/database'
import type { Actor } from '../../lib/actor'
import { AppError } from '../../lib/errors'
import { readHistory } from '../gear/gear-history.service'
import { addPiece, lockPiece, revisePiece, type Change, type Head } from '../gear/gear-revise.service'
import { chooseFields } from './choose-fields'
import { compareWithRecord } from './compare-with-record'
import { recordOutcome } from './decide.queries'
import { publishFiles } from './proposal-talk.queries'
import type { ProposalRow } from './proposals.queries'
import { toNewValues } from './to-new-values'

async function writeChange(tx: Database, { kind }: ProposalRow, head: Head | null, change: Change) {
  if (head === null) return addPiece(tx, kind, change)
  if (head.mergedInto !== null || head.retiredAt !== null) {
    throw new AppError('conflict', 'The piece was merged or retired meanwhile. Nothing was decided.')
  }
  return { gearId: head.id, slug: head.slug, number: await revisePiece(tx, head, change) }
}

/** Puts what is approved on record, in the decision's transaction, and makes the files public that back it. */
export async function applyProposal(
  tx: Database,
  reviewer: Actor,
  row: ProposalRow,
  fields: DecisionRequest['fields'],
): Promise<{ readonly slug: string; readonly revision: number }> {
  const head = row.gearId === null ? null : await lockPiece(tx, row.gearId)
  const history = await readHistory(tx, row.gearId)
  const chosen = chooseFields(row, compareWithRecord(history, row.baseRevision, row.values), fields)
  const { gearId, slug, number } = await writeChange(tx, row, head, {
    authorId: row.authorId,
    reviewerId: reviewer.id,
    proposalId: row.id,
    summary: row.summary,
    identity: chosen.identity,
    values: toNewValues(chosen.values, row.authorId),
  })
  await recordOutcome(tx, row.id, gearId, number)
  await publishFiles(
    tx,
    row.id,
    Object.values(chosen.values).flatMap((proposed) => proposed?.files ?? []),
  )
  return { slug, revision: number }
}
