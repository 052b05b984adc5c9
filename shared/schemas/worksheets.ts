import { z } from 'zod'
import type { SetupSection, Worksheet, WorksheetField, WorksheetList } from '../engine/worksheets/types'
import { unitSystems } from '../units/systems'
import { createFieldSchema } from './attribute-schema'
import { setupSchema } from './setup'

/** What is asked for, as a tree: objects by key; under `*` the entries of a list. */
type Tree = Map<string, Tree | WorksheetField>

const isTree = (node: Tree | WorksheetField | undefined): node is Tree => node instanceof Map

function growTree(fields: readonly WorksheetField[]): Tree {
  const tree: Tree = new Map()
  for (const field of fields) {
    const words = field.path.split('.')
    const last = words.pop() ?? ''
    let branch = tree
    for (const word of words) {
      const found = branch.get(word)
      const next = isTree(found) ? found : new Map<string, Tree | WorksheetField>()
      branch.set(word, next)
      branch = next
    }
    branch.set(last, field)
  }
  return tree
}

const isNeeded = (node: Tree | WorksheetField): boolean =>
  isTree(node) ? [...node.values()].some(isNeeded) : node.isRequired === true

const explainObject = (issue: { readonly code?: string }) =>
  issue.code === 'unrecognized_keys' ? undefined : 'must be an object'

function createShape(path: string, tree: Tree, lists: readonly WorksheetList[]): Record<string, z.ZodType> {
  return Object.fromEntries(
    [...tree].map(([key, node]) => {
      const schema = createNode(path === '' ? key : `${path}.${key}`, node, lists)
      return [key, isNeeded(node) ? schema : schema.optional()]
    }),
  )
}

function createNode(path: string, node: Tree | WorksheetField, lists: readonly WorksheetList[]): z.ZodType {
  if (!isTree(node)) return createFieldSchema(node.attribute)
  const entry = node.get('*')
  if (!isTree(entry)) return z.strictObject(createShape(path, node, lists), { error: explainObject })
  const { least = 0, most = 0, label = 'entry' } = lists.find((list) => list.path === path) ?? {}
  const error = `must be a list of ${least} to ${most} ${label}s`
  return z
    .array(z.strictObject(createShape(`${path}.*`, entry, lists), { error: explainObject }), { error })
    .min(least, { error })
    .max(most, { error })
}

const sectionSchemas: Readonly<Record<SetupSection, z.ZodType>> = {
  tank: setupSchema.shape.tank,
  room: setupSchema.shape.room,
  goals: setupSchema.shape.goals,
}

const schemas = new WeakMap<Worksheet, z.ZodObject>()

/** What a worksheet is sent: its own inputs, the parts of a setup that it takes, and the units for its words. */
export function createWorksheetSchema(sheet: Worksheet): z.ZodObject {
  const known = schemas.get(sheet)
  if (known) return known
  const sections = sheet.setup?.sections ?? []
  const schema = z.strictObject(
    {
      ...Object.fromEntries(sections.map((section) => [section, sectionSchemas[section]])),
      ...createShape('', growTree(sheet.fields), sheet.lists ?? []),
      units: z.enum(unitSystems as ['us', 'metric'], { error: 'must be us or metric' }).optional(),
    },
    { error: explainObject },
  )
  schemas.set(sheet, schema)
  return schema
}

const basisSchema = z.object({ type: z.enum(['physics', 'standard', 'practice']), source: z.string() })

/** Title and formula in words; `text` is the formula with the numbers put in, in SI units; `unit` is a UCUM code. */
const stepSchema = z.object({
  title: z.string(),
  formula: z.string(),
  text: z.string(),
  value: z.number().nullable(),
  unit: z.string(),
  source: z.string().optional(),
})

export const workingSchema = z.object({
  /** By the keys that the list of worksheets names, each in the unit that its key names. */
  result: z.record(z.string(), z.unknown()),
  steps: z.array(stepSchema),
  basis: basisSchema,
  cautions: z.array(z.string()),
  assumptions: z.array(z.object({ key: z.string(), value: z.unknown(), message: z.string() })),
})

export type WorkingAnswer = z.infer<typeof workingSchema>

export const worksheetListSchema = z.object({
  items: z.array(
    z.object({
      name: z.string(),
      title: z.string(),
      intro: z.string(),
      basis: basisSchema,
      /** `unit` is a UCUM code; null for words and for more than a number. */
      results: z.array(z.object({ key: z.string(), label: z.string(), unit: z.string().nullable() })),
      inputs: z.record(z.string(), z.unknown()),
      example: z.record(z.string(), z.unknown()),
    }),
  ),
})

export type WorksheetListAnswer = z.infer<typeof worksheetListSchema>
