import { z } from 'zod'
import { fit, fitCheck } from '#shared/engine/fit'
import type { Answer, ChamberInput, Setup } from '#shared/engine/types'
import type { FitAnswer } from '#shared/schemas/answer'
import type { FitCheckParsed, FitParsed } from '#shared/schemas/fit'
import { createCursor, readCursor } from '../../lib/cursor'
import type { Issue } from '../../lib/errors'
import { toPointer } from '../../lib/to-issues'
import type { Catalogue } from '../catalogue/catalogue.service'
import { expandJudgedPiece } from '../setups/expand-setup'
import { readSetup } from '../setups/read-setup'
import { filterPieces } from './filter-pieces'

const placeSchema = z.strictObject({ offset: z.int().min(1).max(10_000_000) })

/** Everything of a kind in the catalogue, judged in place of the setup's own. */
export async function findFits(catalogue: Catalogue, request: FitParsed): Promise<FitAnswer> {
  const { setup: parsed, kind, filters, limit, cursor, verdict, check, missing, scales } = request
  const question = JSON.stringify(['fit', parsed, kind, filters, verdict, check, missing])
  const offset = cursor === undefined ? 0 : readCursor(cursor, question, placeSchema).offset
  const snapshot = await catalogue.snapshot()
  const setup = readSetup(snapshot, parsed)
  const options = {
    limit,
    offset,
    scales,
    ...(verdict && { verdict }),
    ...(check !== undefined && { check }),
    ...(missing !== undefined && { missing }),
  }
  const result = fit(setup, kind, filterPieces(snapshot.byKind[kind], filters), options)
  const end = offset + result.answers.length
  const hasMore = result.answers.length > 0 && end < result.total
  return { ...result, next: hasMore ? createCursor({ offset: end }, question) : null }
}

function findUnknownItems({ setup, instead = [] }: FitCheckParsed): Issue[] {
  const ids = new Set(setup.items.map(({ id }) => id))
  return instead.flatMap((id, index) =>
    ids.has(id) ? [] : [{ pointer: toPointer(['instead', index]), detail: 'is the id of no item of the setup' }],
  )
}

function findUnknownPlace({ place }: FitCheckParsed, { tank }: Setup): Issue[] {
  if (place === undefined || 'in' in place) return []
  const chambers = (tank.specs.chambers?.value ?? []) as readonly ChamberInput[]
  if (chambers.some(({ id }) => id === place.chamber)) return []
  return [{ pointer: toPointer(['place', 'chamber']), detail: 'is the id of no chamber of the tank' }]
}

/** One piece, from the catalogue or as somebody describes it, judged in a setup. */
export async function checkFit(catalogue: Catalogue, request: FitCheckParsed): Promise<Answer> {
  const { setup: parsed, piece: pieceRequest, quantity, place, instead, beside } = request
  const snapshot = await catalogue.snapshot()
  const { expanded: piece, issues } = expandJudgedPiece(snapshot, pieceRequest)
  const setup = readSetup(snapshot, parsed, (expanded) => [
    ...issues,
    ...findUnknownItems(request),
    ...findUnknownPlace(request, expanded),
  ])
  return fitCheck(setup, piece, {
    ...(quantity !== undefined && { quantity }),
    ...(place !== undefined && { place }),
    ...(instead !== undefined && { instead }),
    ...(beside !== undefined && { beside }),
  })
}
