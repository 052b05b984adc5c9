import type { QueueItem } from '#shared/schemas/review'
import type { Actor } from '../../lib/actor'
import type { NameAuthor } from '../people/people.service'
import { presentLease } from '../proposals/proposals.presenter'
import type { QueueRow } from './queue.queries'

export function presentQueueItem(
  row: QueueRow,
  actor: Actor,
  record: QueueItem['record'],
  nameAuthor: NameAuthor,
): QueueItem {
  const { id, kind, slug, identity, gearBrand, gearModel, values, summary, authorId, flags } = row
  return {
    id,
    kind,
    slug,
    brand: identity.brand ?? gearBrand,
    model: identity.model ?? gearModel,
    changed: Object.keys(values),
    summary,
    author: nameAuthor({ authorId }),
    isMine: authorId === actor.id,
    record,
    flags,
    isBehind: row.headRevision !== null && row.headRevision !== row.baseRevision,
    submittedAt: (row.submittedAt ?? new Date(0)).toISOString(),
    lease: presentLease(row, actor, nameAuthor),
  }
}
