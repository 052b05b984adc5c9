import { findCountryCode } from '../kinds/countries'
import { z } from 'zod'
import { setupFields } from '../kinds/setup-fields'
import { limits } from '../limits'
import { unitSystems } from '../units/systems'
import { createFieldSchema } from './attribute-schema'
import { lineSchema } from './gear'
import { checkPieceInput, pieceInputShape } from './piece-input'
import { tankInputSchema } from './tank-input'
import type { Goals, Mains, Room, Setup, Water } from '../engine/types'

/** One section of a setup: every field optional, each checked as its own definition says. */
function createSectionSchema<Section>(section: string, extra: z.core.$ZodLooseShape = {}): z.ZodType<Section, Section> {
  const fields = setupFields.filter(({ path }) => path.startsWith(`${section}.`) && path.split('.').length === 2)
  const shape = Object.fromEntries(
    fields.map(({ attribute: { key }, attribute }) => [key, createFieldSchema(attribute).optional()]),
  )
  return z.strictObject({ ...shape, ...extra }, { error: explainObject }) as unknown as z.ZodType<Section, Section>
}

function explainObject(issue: { readonly code?: string }): string | undefined {
  return issue.code === 'unrecognized_keys' ? undefined : 'must be an object'
}

const turnoverError = 'must be [from, to], in turnovers an hour from 0.1 to 200'

const turnoverSchema = z
  .tuple([z.number().min(0.1).max(200), z.number().min(0.1).max(200)], { error: turnoverError })
  .refine(([from, to]) => from <= to, 'must not fall: [from, to]')

const supportSchema = createSectionSchema<Setup['support']>('support').refine(
  (support) => support?.kind !== undefined,
  { path: ['kind'], error: 'must be stand or furniture' },
)

const itemIdSchema = z
  .string({ error: 'must be text' })
  .max(limits.itemId, `must be at most ${limits.itemId} characters`)
  .regex(/^[A-Za-z0-9][\w-]*$/, 'must be letters, digits, - and _')

const chamberIdSchema = z.string({ error: 'must be the id of a chamber' }).min(1).max(limits.itemId)

export const placeSchema = z.union(
  [
    z.strictObject({ chamber: chamberIdSchema }),
    z.strictObject({ in: z.enum(['display', 'cabinet', 'hang-on', 'outside']) }),
  ],
  { error: 'must be { "chamber": id } or { "in": "display", "cabinet", "hang-on" or "outside" }' },
)

const quantityError = `must be a whole number from 1 to ${limits.quantity}`
export const quantitySchema = z.int({ error: quantityError }).min(1, quantityError).max(limits.quantity, quantityError)

const mountError = 'must be a number between 0 and 5000 mm'

const itemSchema = z
  .strictObject(
    {
      id: itemIdSchema,
      ...pieceInputShape,
      quantity: quantitySchema.default(1),
      state: z.enum(['have', 'planned', 'gone'], { error: 'must be have, planned or gone' }).default('have'),
      place: placeSchema.optional(),
      mountHeightMm: z.number({ error: mountError }).min(0, mountError).max(5000, mountError).optional(),
    },
    { error: explainObject },
  )
  .superRefine(checkPieceInput)

const itemsSchema = z
  .array(itemSchema, { error: 'must be a list' })
  .max(limits.items, `must hold at most ${limits.items} items`)
  .superRefine((items, context) => {
    const seen = new Set<string>()
    items.forEach(({ id }, index) => {
      if (seen.has(id))
        context.addIssue({ code: 'custom', path: [index, 'id'], message: 'is the id of another item too' })
      seen.add(id)
    })
  })

const countryError = 'must be the two capital letters of a country (ISO 3166-1), such as US or GB'

/** What somebody says of their setup. Every number is in the unit that its key names; what is left out is assumed and named. */
export const setupSchema = z.strictObject(
  {
    name: lineSchema(limits.setupName).optional(),
    units: z.enum(unitSystems as ['us', 'metric'], { error: 'must be us or metric' }).default('metric'),
    country: z
      .string({ error: countryError })
      .refine((text) => findCountryCode(text) === text, countryError)
      .optional(),
    tank: tankInputSchema,
    support: supportSchema.optional(),
    room: createSectionSchema<Partial<Room>>('room').optional(),
    mains: createSectionSchema<Partial<Mains>>('mains').optional(),
    water: createSectionSchema<Partial<Water>>('water').optional(),
    goals: createSectionSchema<Partial<Goals>>('goals', { turnoverPerHour: turnoverSchema.optional() }).optional(),
    items: itemsSchema.default([]),
  },
  { error: explainObject },
)

/** As sent: what has a default may be left out. */
export type SetupRequest = z.input<typeof setupSchema>
/** As parsed. */
export type SetupParsed = z.output<typeof setupSchema>
export type ItemParsed = SetupParsed['items'][number]
