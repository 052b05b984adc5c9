import { z } from 'zod'
import { findInconsistencies } from '../kinds/consistency'
import { getKind } from '../kinds/index'
import { createAttributeSchema } from './attribute-schema'
import type { KindKey } from '../kinds/index'
import type { Attribute, BareSpecs } from '../kinds/types'
import type { Source, Specs, Value } from '../engine/types'

export const sourceSchema = z.enum(['measured', 'maker', 'estimate'], {
  error: 'must be one of: measured, maker, estimate',
})

type Shape = Record<string, z.ZodOptional<z.ZodType>>
type SpecsSchema = z.ZodType<Record<string, unknown>>

const isObject = (value: unknown): value is Record<string, unknown> =>
  typeof value === 'object' && value !== null && !Array.isArray(value)

/** No group has a field called `value`, so an object with one is a value with its source. */
const isSourced = (value: unknown): value is Value => isObject(value) && 'value' in value

function createShape(kind: KindKey, createSchema: (attribute: Attribute) => z.ZodType): Shape {
  return Object.fromEntries(
    getKind(kind).attributes.map((attribute) => [attribute.key, createSchema(attribute).optional()]),
  )
}

function createSchema(kind: KindKey, shape: Shape, toBare: (specs: BareSpecs) => BareSpecs): SpecsSchema {
  const { label } = getKind(kind)
  const unknownOf = (keys: readonly string[] = []) =>
    `has no such ${keys.length === 1 ? 'attribute' : 'attributes'} for the kind ${label}: ${keys.join(', ')}; known are ${Object.keys(shape).join(', ')}`
  return z
    .strictObject(shape, {
      error: (issue) =>
        issue.code === 'unrecognized_keys' ? unknownOf(issue.keys) : 'must be an object of attributes',
    })
    .superRefine((specs, context) => {
      for (const { path, detail } of findInconsistencies(kind, toBare(specs))) {
        const words = path.split('.').map((word) => (/^\d+$/.test(word) ? Number(word) : word))
        const [key = '', ...rest] = words
        const inside = isSourced((specs as BareSpecs)[String(key)]) ? ['value', ...rest] : rest
        context.addIssue({
          code: 'custom',
          path: [key, ...inside],
          message: detail,
        })
      }
    })
}

/** A value with its source; ± only where there is a unit for it to be in. */
function createSourcedSchema(attribute: Attribute, bare: z.ZodType): z.ZodType {
  const base = { value: bare, source: sourceSchema }
  if (attribute.type !== 'measure') return z.strictObject(base)
  const [low, high] = attribute.plausible
  const error = `must be a number between 0 and ${high - low}, in the unit of the value`
  return z.strictObject({
    ...base,
    plusMinus: z
      .number({ error })
      .min(0, { error })
      .max(high - low, { error })
      .optional(),
  })
}

/**
 * Either form, checked by the one that was meant: a plain union would answer a wrong number with the complaints of
 * both. The JSON Schema is that of the union.
 */
function createInputSchema(attribute: Attribute): z.ZodType {
  const bare = createAttributeSchema(attribute)
  const sourced = createSourcedSchema(attribute, bare)
  const { $schema: _, ...jsonSchema } = z.toJSONSchema(z.union([bare, sourced]))
  return z
    .unknown()
    .superRefine((value, context) => {
      const result = (isSourced(value) ? sourced : bare).safeParse(value)
      for (const issue of result.error?.issues ?? []) {
        context.addIssue({
          code: 'custom',
          path: issue.path,
          message: issue.message,
        })
      }
    })
    .meta(jsonSchema)
}

const toBareSpecs = (specs: BareSpecs): BareSpecs =>
  Object.fromEntries(Object.entries(specs).map(([key, value]) => [key, isSourced(value) ? value.value : value]))

function memoize(create: (kind: KindKey) => SpecsSchema): (kind: KindKey) => SpecsSchema {
  const schemas = new Map<KindKey, SpecsSchema>()
  return (kind) => {
    const schema = schemas.get(kind) ?? create(kind)
    schemas.set(kind, schema)
    return schema
  }
}

/** Bare values of one kind in canonical units: every attribute optional, nothing unknown, nothing that contradicts itself. */
export const createSpecsSchema = memoize((kind) =>
  createSchema(kind, createShape(kind, createAttributeSchema), (specs) => specs),
)

/** As `createSpecsSchema`, each value either bare or as `{ value, source, plusMinus? }`. */
export const specsInputSchema = memoize((kind) => createSchema(kind, createShape(kind, createInputSchema), toBareSpecs))

/** Parsed input as the engine reads it; bare values take `defaultSource`. */
export function toSpecs(kind: KindKey, parsed: BareSpecs, defaultSource: Source): Specs {
  return Object.fromEntries(
    getKind(kind).attributes.flatMap(({ key }): [string, Value][] => {
      const value = parsed[key]
      if (value === undefined) return []
      return [[key, isSourced(value) ? value : { value, source: defaultSource }]]
    }),
  )
}
