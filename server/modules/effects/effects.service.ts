import { fitCheck } from '#shared/engine/fit'
import type { Piece, Setup } from '#shared/engine/types'
import { getKind, isKindKey, type KindKey } from '#shared/kinds/index'
import type { Effects } from '#shared/schemas/proposals'
import { setupSchema } from '#shared/schemas/setup'
import { toSpecs } from '#shared/schemas/specs'
import type { Database } from '../../db/database'
import type { Actor } from '../../lib/actor'
import { AppError } from '../../lib/errors'
import type { Catalogue } from '../catalogue/catalogue.service'
import { mergeValues, type State } from '../gear/gear-revise.service'
import { requireReadable } from '../proposals/read-proposal.service'
import { toNewValues } from '../proposals/to-new-values'
import { readSetup } from '../setups/read-setup'
import type { QuestionBook } from './questions'

/** More are not judged while somebody waits for the page. */
const mostQuestions = 200

function toPiece(kind: KindKey, { specs, provenance }: State): Piece {
  const sourced = Object.entries(specs).map(([key, value]) => {
    const { source = 'estimate', plusMinus } = provenance[key] ?? {}
    return [key, { value, source, ...(plusMinus !== undefined && { plusMinus }) }] as const
  })
  return { kind, specs: toSpecs(kind, Object.fromEntries(sourced), 'estimate') }
}

const judge = (setup: Setup, kind: KindKey, state: State) => fitCheck(setup, toPiece(kind, state)).verdict

/** Whose answers would change verdict were a proposal approved as it stands. */
export async function findEffects(
  db: Database,
  catalogue: Catalogue,
  questions: QuestionBook,
  actor: Actor,
  id: string,
): Promise<Effects> {
  const row = await requireReadable(db, actor, id)
  const { kind, slug, headSpecs, headProvenance, values, authorId } = row
  if (!isKindKey(kind)) throw new AppError('conflict', `The kind ${kind} is no longer kept.`)
  const isNew = headSpecs === null || headProvenance === null
  const before: State = isNew ? { specs: {}, provenance: {} } : { specs: headSpecs, provenance: headProvenance }
  const after = mergeValues(before, toNewValues(values, authorId), (row.headRevision ?? 0) + 1)
  const snapshot = await catalogue.snapshot()
  const asked = (await questions.list(kind, slug)).slice(0, mostQuestions)
  const items = asked.map(({ origin, title, setup: request }) => {
    const setup = readSetup(snapshot, setupSchema.parse(request))
    const question = `${getKind(kind).label} for: ${title}`
    return { origin, question, before: isNew ? null : judge(setup, kind, before), after: judge(setup, kind, after) }
  })
  return { judged: items.length, items: items.filter((item) => item.before !== item.after) }
}
