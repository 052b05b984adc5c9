import { z } from 'zod'
import { findSetupField } from '../kinds/setup-fields'
import { createFieldSchema } from './attribute-schema'
import { slugSchema } from './gear'
import { specsInputSchema } from './specs'
import { unfoldIssues } from './unfold-issues'

/** Spec keys of a tank beside these, bare or as `{ value, source, plusMinus? }`. */
export interface TankRequest {
  readonly gear?: string
  readonly volumeL?: number
  readonly [key: string]: unknown
}

const ownSchema = z.strictObject({ gear: slugSchema.optional(), volumeL: createVolumeSchema().optional() })

function createVolumeSchema(): z.ZodType {
  const field = findSetupField('tank.volumeL')
  if (field === undefined) throw new Error('A setup has no field for the volume of its tank')
  return createFieldSchema(field.attribute)
}

function createJsonSchema(): Record<string, unknown> {
  const { $schema: _own, ...own } = z.toJSONSchema(ownSchema)
  const { $schema: _specs, ...specs } = z.toJSONSchema(specsInputSchema('tank'))
  return { ...specs, properties: { ...own.properties, ...specs.properties } }
}

/**
 * A tank by its own specs, by the slug of a catalogue entry (own specs go before that entry's), or by its volume alone.
 * Checked in two halves, since an object that is held to rules across its fields cannot be extended.
 */
export const tankInputSchema = z
  .unknown()
  .superRefine((input, context) => {
    if (typeof input !== 'object' || input === null || Array.isArray(input)) {
      context.addIssue({ code: 'custom', message: 'must be an object' })
      return
    }
    const { gear, volumeL, ...specs } = input as Record<string, unknown>
    for (const { error } of [ownSchema.safeParse({ gear, volumeL }), specsInputSchema('tank').safeParse(specs)]) {
      for (const { path, message } of unfoldIssues(error?.issues ?? [])) {
        context.addIssue({ code: 'custom', path, message })
      }
    }
  })
  .meta(createJsonSchema()) as unknown as z.ZodType<TankRequest, TankRequest>
