import { z } from 'zod'
import { tankId } from '#shared/engine/bench'
import { replacements } from '#shared/engine/swap/replacements'
import type { ReplacementsAnswer, ReplacementsParsed } from '#shared/schemas/replacements'
import { createCursor, readCursor } from '../../lib/cursor'
import { createInvalidError, type Issue } from '../../lib/errors'
import { toPointer } from '../../lib/to-issues'
import type { Catalogue } from '../catalogue/catalogue.service'
import { readSetup } from '../setups/read-setup'

const placeSchema = z.strictObject({ offset: z.int().min(1).max(10_000_000) })

const unknownItem: Issue = { pointer: toPointer(['itemId']), detail: 'is the id of no item of the setup' }

/** What of the catalogue can take the place of one item of a setup, or of its tank, with all that follows from it. */
export async function findReplacements(catalogue: Catalogue, request: ReplacementsParsed): Promise<ReplacementsAnswer> {
  const { setup: parsed, itemId, limit, cursor, verdict, check } = request
  const question = JSON.stringify(['replacements', parsed, itemId, verdict, check])
  const offset = cursor === undefined ? 0 : readCursor(cursor, question, placeSchema).offset
  const snapshot = await catalogue.snapshot()
  const setup = readSetup(snapshot, parsed, ({ items }) =>
    itemId === tankId || items.some(({ id }) => id === itemId) ? [] : [unknownItem],
  )
  const options = { limit, offset, ...(verdict && { verdict }), ...(check !== undefined && { check }) }
  const result = replacements(setup, itemId, snapshot.byKind, options)
  if (!result) throw createInvalidError([unknownItem])
  const end = offset + result.answers.length
  const hasMore = result.answers.length > 0 && end < result.total
  return { ...result, next: hasMore ? createCursor({ offset: end }, question) : null }
}
