import type { z } from 'zod'
import type { KindKey } from '../kinds/index'
import { bareSpecsSchema, slugSchema } from './gear'
import { kindSchema } from './gear-requests'
import { specsInputSchema } from './specs'
import { unfoldIssues } from './unfold-issues'

/** A piece by the slug of a catalogue entry, or by its kind and whatever somebody knows of it. */
export const pieceInputShape = {
  kind: kindSchema.optional(),
  gear: slugSchema.optional(),
  specs: bareSpecsSchema.optional(),
}

export interface PieceRequest {
  readonly kind?: KindKey | undefined
  readonly gear?: string | undefined
  readonly specs?: Record<string, unknown> | undefined
}

/** Holds the specs to the schema of their kind: which schema that is only the kind beside them tells. */
export function checkPieceInput({ kind, gear, specs }: PieceRequest, context: z.RefinementCtx<PieceRequest>): void {
  const complain = (path: PropertyKey[], message: string) => context.addIssue({ code: 'custom', path, message })
  if (gear === undefined && specs === undefined) return complain(['gear'], 'is needed, unless there are specs')
  if (gear !== undefined && specs !== undefined) return complain(['specs'], 'must be left out where gear is named')
  if (specs === undefined) return
  if (kind === undefined) return complain(['kind'], 'is needed beside specs')
  const { error } = specsInputSchema(kind).safeParse(specs)
  for (const { path, message } of unfoldIssues(error?.issues ?? [])) complain(['specs', ...path], message)
}
