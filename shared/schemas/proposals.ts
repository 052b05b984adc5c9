import { z } from 'zod'
import type { KindKey } from '../kinds/index'
import { limits } from '../limits'
import { evidenceRefSchema, gearStatuses, lineSchema, provenanceSchema, slugSchema } from './gear'
import { cursorSchema, kindSchema } from './gear-requests'
import { gtinSchema } from './gtin'
import { findValueIssues, proposedValueSchema, proposedValuesSchema, type ProposedValues } from './proposed-values'
import { wordsSchema } from './text-fields'

export const proposalStatuses = ['draft', 'pending', 'sent-back', 'approved', 'declined', 'withdrawn'] as const

/** Brand and model are needed once a new piece is submitted; a change names only what it changes. */
export const proposedIdentitySchema = z.strictObject({
  brand: lineSchema(limits.brand).optional(),
  model: lineSchema(limits.model).optional(),
  status: z.enum(gearStatuses, { error: `must be one of: ${gearStatuses.join(', ')}` }).optional(),
  gtin: gtinSchema.nullable().optional(),
  notes: z.string({ error: 'must be text' }).max(limits.notes).nullable().optional(),
})

/** A warning, and why its author lets the number stand. */
export const flagInputSchema = z.strictObject({
  /** Dotted, inside the specs: `lengthMm`, `chambers.0.widthMm`. */
  path: lineSchema(limits.sort * 2),
  rule: z.enum(['usual', 'slip', 'pair'], { error: 'must be one of: usual, slip, pair' }),
  value: z.number().optional(),
  reason: lineSchema(limits.reason).nullable(),
})

const baseRevisionSchema = z.int({ error: 'must be the number of a revision' }).min(1)

const contentShape = {
  /** The revision that the values were changed from. */
  baseRevision: baseRevisionSchema.optional(),
  identity: proposedIdentitySchema.optional(),
  values: proposedValuesSchema.optional(),
  summary: lineSchema(limits.summary).nullable().optional(),
  flags: z.array(flagInputSchema).max(200).optional(),
}

type Content = { values?: ProposedValues | undefined }

function checkValues(kind: KindKey, { values = {} }: Content, context: z.RefinementCtx): void {
  for (const { path, message } of findValueIssues(kind, values)) {
    context.addIssue({ code: 'custom', path: ['values', ...path], message })
  }
}

export const proposalRequestSchema = z
  .strictObject({ kind: kindSchema, gear: slugSchema.optional(), ...contentShape })
  .superRefine((request, context) => {
    checkValues(request.kind, request, context)
    if ((request.gear === undefined) !== (request.baseRevision === undefined)) {
      const message = request.gear === undefined ? 'must be left out for a new piece' : 'is needed beside gear'
      context.addIssue({ code: 'custom', path: ['baseRevision'], message })
    }
  })

/** What is left out stays; `values`, `identity` and `flags` replace what was there as a whole. */
export const proposalPatchSchema = z.strictObject(contentShape)

export const createProposalPatchSchema = (kind: KindKey) =>
  proposalPatchSchema.superRefine((patch, context) => checkValues(kind, patch, context))

export const messageRequestSchema = z.strictObject({ words: wordsSchema(limits.words) })

export const proposalsQuerySchema = z.strictObject({
  status: z.enum(proposalStatuses, { error: `must be one of: ${proposalStatuses.join(', ')}` }).optional(),
  cursor: cursorSchema.optional(),
})

const pieceRefSchema = z.object({
  slug: z.string(),
  brand: z.string(),
  model: z.string(),
  /** Its newest revision. */
  revision: z.number().int(),
})

export const proposalItemSchema = z.object({
  id: z.string(),
  kind: z.string(),
  /** Null: a new piece, until it is approved. */
  gear: pieceRefSchema.nullable(),
  /** What the piece is or would be called. */
  brand: z.string().nullable(),
  model: z.string().nullable(),
  status: z.enum(proposalStatuses),
  /** Keys whose value would change. */
  changed: z.array(z.string()),
  summary: z.string().nullable(),
  submittedAt: z.string().nullable(),
  decidedAt: z.string().nullable(),
  updatedAt: z.string(),
  /** The words of the last decision. */
  words: z.string().nullable(),
})

export const proposalListSchema = z.object({
  items: z.array(proposalItemSchema),
  total: z.number().int(),
  next: z.string().nullable(),
})

/** A value on record with what backs it. */
export const recordedValueSchema = z.object({ value: z.unknown(), ...provenanceSchema.partial().shape })

export const proposedFieldSchema = z.object({
  /** On record at the base revision, and now; null: not known. */
  base: recordedValueSchema.nullable(),
  now: recordedValueSchema.nullable(),
  proposed: proposedValueSchema.nullable(),
  /**
   * `change`: nobody else touched it · `conflict`: changed on both sides since the base, to be chosen explicitly ·
   * `settled`: already on record as proposed · `shadowed`: kept as a further source; a better one stays in use
   */
  state: z.enum(['change', 'conflict', 'settled', 'shadowed']),
})

export const flagSchema = z.object({
  path: z.string(),
  rule: z.enum(['usual', 'slip', 'pair']),
  value: z.number(),
  /** Null: nobody said why. */
  reason: z.string().nullable(),
})

export const messageSchema = z.object({
  id: z.number().int(),
  author: z.string(),
  /** What happened: `message` is words alone. */
  kind: z.enum(['message', 'submitted', 'amended', 'sent-back', 'approved', 'declined', 'withdrawn']),
  words: z.string().nullable(),
  at: z.string(),
})

export const leaseSchema = z.object({ holder: z.string(), isMine: z.boolean(), until: z.string() })

export const decisionSchema = z.object({
  decision: z.enum(['approve', 'send-back', 'decline']),
  reasonCode: z.string().nullable(),
  words: z.string().nullable(),
  fields: z.record(z.string(), z.object({ decision: z.enum(['approve', 'decline']), words: z.string().nullable() })),
  by: z.string(),
  at: z.string(),
})

export const proposalSchema = proposalItemSchema.extend({
  version: z.number().int(),
  author: z.string(),
  isMine: z.boolean(),
  /** What became of the author's earlier proposals. */
  record: z.object({ accepted: z.number().int(), declined: z.number().int() }),
  baseRevision: z.number().int().nullable(),
  /** Identity as it is now; null for a new piece. */
  identityNow: z
    .object({
      brand: z.string(),
      model: z.string(),
      status: z.enum(gearStatuses),
      gtin: z.string().nullable(),
      notes: z.string().nullable(),
    })
    .nullable(),
  identity: proposedIdentitySchema,
  values: proposedValuesSchema,
  /** By the keys of `values`. */
  fields: z.record(z.string(), proposedFieldSchema),
  /** Keys of `fields` in conflict. */
  conflicts: z.array(z.string()),
  flags: z.array(flagSchema),
  files: z.array(evidenceRefSchema),
  messages: z.array(messageSchema),
  lease: leaseSchema.nullable(),
  decision: decisionSchema.nullable(),
  /** The revision that came of it. */
  revision: z.number().int().nullable(),
  createdAt: z.string(),
  can: z.object({
    amend: z.boolean(),
    submit: z.boolean(),
    withdraw: z.boolean(),
    say: z.boolean(),
    lease: z.boolean(),
    decide: z.boolean(),
  }),
})

/** Verdicts that would change were the proposal approved. `before` is null for a piece that is not there yet. */
export const effectsSchema = z.object({
  judged: z.number().int(),
  items: z.array(
    z.object({
      /** Who asks: `demo` today. */
      origin: z.string(),
      question: z.string(),
      before: z.enum(['fits', 'changes', 'no', 'unknown']).nullable(),
      after: z.enum(['fits', 'changes', 'no', 'unknown']),
    }),
  ),
})

export type ProposalStatus = (typeof proposalStatuses)[number]
export type ProposalRequest = z.infer<typeof proposalRequestSchema>
export type ProposalPatch = z.infer<typeof proposalPatchSchema>
export type ProposalItem = z.infer<typeof proposalItemSchema>
export type ProposalList = z.infer<typeof proposalListSchema>
export type ProposedField = z.infer<typeof proposedFieldSchema>
export type Proposal = z.infer<typeof proposalSchema>
export type Effects = z.infer<typeof effectsSchema>
