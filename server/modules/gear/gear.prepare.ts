import type { KindKey } from '#shared/kinds/index'
import { specsInputSchema } from '#shared/schemas/specs'
import { createInvalidError } from '../../lib/errors'
import { sanitizeNotes } from '../../lib/sanitize-notes'
import { toIssues } from '../../lib/to-issues'
import { identitySchema, revisionSchema } from './gear-input.schema'
import type { IdentityInput, PieceInput, PreparedPiece, RevisionInput, SpecsState } from './gear.types'
import { createSlug } from './slug'
import { takesPlace } from './value-history'

const noSpecs: SpecsState = { number: 0, specs: {}, provenance: {} }

function mergeRevision(before: SpecsState, revision: RevisionInput): SpecsState {
  const number = before.number + 1
  const specs = { ...before.specs }
  const provenance = { ...before.provenance }
  for (const [key, input] of Object.entries(revision.values)) {
    if (input === null) {
      delete specs[key]
      delete provenance[key]
      continue
    }
    const { value, ...backing } = input
    if (!takesPlace({ source: input.source, standing: 'plain' }, provenance[key])) continue
    specs[key] = value
    provenance[key] = { ...backing, date: revision.date, author: revision.author, revision: number }
  }
  return { number, specs, provenance }
}

/** Values with their source and ±, as the schema of everything that people type wants them. */
function toSourced({ specs, provenance }: SpecsState): Record<string, unknown> {
  const sourced = Object.entries(specs).map(([key, value]) => {
    const backing = provenance[key]
    const plusMinus = backing?.plusMinus
    return [key, { value, source: backing?.source, ...(plusMinus !== undefined && { plusMinus }) }]
  })
  return Object.fromEntries(sourced) as Record<string, unknown>
}

/** The state after `revision`, held to the same schema as everything that people type. Throws AppError `invalid`. */
export function prepareRevision(kind: KindKey, before: SpecsState, revision: RevisionInput): SpecsState {
  const merged = mergeRevision(before, revision)
  const issues = [revisionSchema.safeParse(revision), specsInputSchema(kind).safeParse(toSourced(merged))].flatMap(
    ({ error }) => (error === undefined ? [] : toIssues(error)),
  )
  if (issues.length > 0) throw createInvalidError(issues)
  return merged
}

function prepareIdentity(input: IdentityInput): PreparedPiece['identity'] {
  const { slug = createSlug(input.brand, input.model), kind, brand, model, status, gtin, notes } = input
  const clean = notes === undefined ? undefined : sanitizeNotes(notes)
  const identity = {
    slug,
    kind,
    brand,
    model,
    status,
    ...(gtin !== undefined && { gtin }),
    ...(clean !== undefined && clean !== '' && { notes: clean }),
  }
  const parsed = identitySchema.safeParse(identity)
  if (!parsed.success) throw createInvalidError(toIssues(parsed.error))
  return identity
}

/** A whole piece, checked and ready to be stored. Throws AppError `invalid`, which names every wrong field of one revision. */
export function preparePiece(input: PieceInput): PreparedPiece {
  let state = noSpecs
  const revisions = input.revisions.map((revision) => {
    state = prepareRevision(input.kind, state, revision)
    return { state, input: revision }
  })
  const [first] = revisions
  const head = revisions.at(-1)
  if (first === undefined || head === undefined) {
    throw createInvalidError([{ pointer: '#/revisions', detail: 'must hold at least one revision' }])
  }
  return { identity: prepareIdentity(input), revisions, first, head }
}
