import type { Provenance } from '#shared/schemas/gear'
import type { NameAuthor } from '../people/people.service'
import type { HistoricValue } from './gear-revise.queries'

/** What backs a value, as everybody reads it. Null for one that was taken away. */
export function presentBacking(row: HistoricValue, nameAuthor: NameAuthor): Omit<Provenance, 'files'> | null {
  const { source, plusMinus, evidence, dated, revision, reviewerId, raw } = row
  if (source === null) return null
  return {
    source,
    ...(plusMinus !== null && { plusMinus }),
    ...(evidence !== null && { evidence }),
    date: dated,
    author: nameAuthor(row),
    revision,
    ...(reviewerId !== null && { reviewer: nameAuthor({ authorId: reviewerId }) }),
    ...(raw !== null && { raw }),
  }
}
