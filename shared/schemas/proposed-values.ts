import { z } from 'zod'
import { getAttribute, getKind, type KindKey } from '../kinds/index'
import type { Attribute } from '../kinds/types'
import { limits } from '../limits'
import { createAttributeSchema } from './attribute-schema'
import { lineSchema } from './gear'
import { sourceSchema } from './specs'
import { hasOnlyHttpsAddresses, pastDaySchema } from './text-fields'
import { unfoldIssues } from './unfold-issues'

export const evidenceSchema = lineSchema(limits.evidence).refine(
  hasOnlyHttpsAddresses,
  'must be words, or an address that begins with https://',
)

export const proposedValueSchema = z.strictObject({
  /** In the canonical unit that the key names. */
  value: z.unknown().refine((value) => value !== undefined && value !== null, 'is needed'),
  /** As it was typed, unit included. */
  raw: lineSchema(limits.raw).optional(),
  source: sourceSchema,
  plusMinus: z.number({ error: 'must be a number' }).min(0, 'must not be negative').optional(),
  /** Words or an https address that back it. */
  evidence: evidenceSchema.optional(),
  /** Ids of photos and documents. */
  files: z
    .array(z.uuid('must be the id of a file'))
    .max(limits.filesPerValue, `must be at most ${limits.filesPerValue} files`)
    .optional(),
  /** Day of the measurement or document. */
  date: pastDaySchema,
})

/** By attribute key; null takes a value away. */
export const proposedValuesSchema = z.record(z.string(), proposedValueSchema.nullable())

export type ProposedValue = z.infer<typeof proposedValueSchema>
export type ProposedValues = z.infer<typeof proposedValuesSchema>

interface FoundIssue {
  readonly path: PropertyKey[]
  readonly message: string
}

function checkPlusMinus(attribute: Attribute, plusMinus: number | undefined): FoundIssue[] {
  if (plusMinus === undefined) return []
  if (attribute.type !== 'measure') return [{ path: ['plusMinus'], message: 'must be left out: this is no measure' }]
  const [low, high] = attribute.plausible
  const message = `must be at most ${high - low}, in the unit of the value`
  return plusMinus > high - low ? [{ path: ['plusMinus'], message }] : []
}

function checkValue(kind: KindKey, key: string, proposed: ProposedValue | null): FoundIssue[] {
  const attribute = getAttribute(kind, key)
  if (attribute === undefined) {
    const known = getKind(kind).attributes.map((each) => each.key)
    const message = `is nothing that is kept of the kind ${getKind(kind).label}; known are ${known.join(', ')}`
    return [{ path: [], message }]
  }
  if (proposed === null) return []
  const { error } = createAttributeSchema(attribute).safeParse(proposed.value)
  const wrong = unfoldIssues(error?.issues ?? []).map(({ path, message }) => ({ path: ['value', ...path], message }))
  return [...wrong, ...checkPlusMinus(attribute, proposed.plusMinus)]
}

/** What is wrong with values of a kind, each by its path from the values. */
export function findValueIssues(kind: KindKey, values: ProposedValues): FoundIssue[] {
  return Object.entries(values).flatMap(([key, proposed]) =>
    checkValue(kind, key, proposed).map(({ path, message }) => ({ path: [key, ...path], message })),
  )
}
