import { z } from 'zod'
import { units } from '../units/units'
import type { Attribute, FieldAttribute, GroupAttribute, MeasureAttribute, Option } from '../kinds/types'

const maxGroupEntries = 40
const maxTexts = 60

/** "between 10 and 600 mm"; shares and counts are named without a unit. */
export function describeRange({ unit, plausible: [low, high] }: MeasureAttribute): string {
  const label = unit === 'fraction' || unit === 'ratio' ? '' : units[unit].metric
  return `between ${low} and ${high}${label ? ` ${label}` : ''}`
}

function createMeasureSchema(attribute: MeasureAttribute): z.ZodType<number> {
  const range = describeRange(attribute)
  const [low, high] = attribute.plausible
  const whole = attribute.unit === 'count'
  const error = `must be ${whole ? 'a whole number' : 'a number'} ${range}`
  const schema = (whole ? z.int({ error }) : z.number({ error })).min(low, { error }).max(high, { error })
  return schema.describe(attribute.guide ?? attribute.label)
}

function createOptionSchema(options: readonly Option[], numeric: true | undefined): z.ZodType<string | number> {
  const values = options.map((option) => option.value)
  const error = `must be one of: ${values.join(', ')}`
  if (!numeric) return z.enum(values, { error })
  return z.union(
    values.map((value) => z.literal(Number(value))),
    { error },
  )
}

function createTextSchema(maxLength: number, word: true | undefined): z.ZodType<string> {
  const error = `must be one line of at most ${maxLength} characters`
  const schema = z
    .string({ error })
    .max(maxLength, { error })
    // Not a pattern: the API document would write its flag into it.
    .refine((text) => !/\p{Cc}/u.test(text), { error })
    .refine((text) => text.trim() !== '', { error: 'must not be empty' })
  return word ? schema.regex(/^[\w-]+$/, { error: 'must be letters, digits, dashes and underscores only' }) : schema
}

function createListSchema<T>(entry: z.ZodType<T>, max: number): z.ZodType<T[]> {
  return z
    .array(entry, { error: 'must be a list' })
    .max(max, { error: `must have at most ${max} entries` })
    .refine((list) => new Set(list).size === list.length, {
      error: 'must not repeat an entry',
    })
    .meta({ uniqueItems: true })
}

function createGroupSchema(group: GroupAttribute): z.ZodType {
  const shape = Object.fromEntries(
    group.fields.map((field) => {
      const schema = createAttributeSchema(field)
      return [field.key, group.required.includes(field.key) ? schema : schema.optional()]
    }),
  )
  const names = group.fields.map((field) => field.key).join(', ')
  const one = z.strictObject(shape, {
    error: (issue) =>
      issue.code === 'unrecognized_keys'
        ? `has unknown fields: ${(issue.keys ?? []).join(', ')}; known are ${names}`
        : `must be an object of ${names}`,
  })
  if (!group.many) return one
  return z.array(one, { error: 'must be a list' }).max(maxGroupEntries, {
    error: `must have at most ${maxGroupEntries} entries`,
  })
}

/** Checks the bare value of one field: a number in its canonical unit, an option, a set, a text, true or false. */
export function createFieldSchema(attribute: FieldAttribute): z.ZodType {
  switch (attribute.type) {
    case 'measure':
      return createMeasureSchema(attribute)
    case 'choice':
      return createOptionSchema(attribute.options, attribute.numeric)
    case 'set':
      return createListSchema(createOptionSchema(attribute.options, attribute.numeric), attribute.options.length)
    case 'boolean':
      return z.boolean({ error: 'must be true or false' })
    case 'text':
      return createTextSchema(attribute.maxLength, attribute.word)
    case 'texts':
      return createListSchema(createTextSchema(attribute.maxLength, undefined), maxTexts)
  }
}

/** Checks the bare value of one attribute: a field, or a group of them. */
export function createAttributeSchema(attribute: Attribute): z.ZodType {
  return attribute.type === 'group' ? createGroupSchema(attribute) : createFieldSchema(attribute)
}
