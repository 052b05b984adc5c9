import type { z } from 'zod'
import type { FieldAttribute, MeasureAttribute } from '../kinds/types'
import { findCountryCode } from '../kinds/countries'
import { readMeasure } from '../units/read'
import { findShownUnit } from '../units/convert'
import type { UnitSystem } from '../units/systems'
import { createFieldSchema } from './attribute-schema'

/** What one typed text means; `text` is how the canonical link writes it. */
export type LinkValue =
  | { readonly ok: true; readonly value: unknown; readonly text: string }
  | { readonly ok: false; readonly detail: string }

const bareNumber = /^-?\d+(\.\d+)?$/
const yes = ['yes', 'true', '1', 'on']
const no = ['no', 'false', '0', 'off']

/** How a link says "none of them", which is not the same as saying nothing. */
const emptySet = 'none'

/**
 * A bare number in a link is in the canonical unit. `typedIn` is the system of a form that was sent without a script:
 * there a bare number is in the person's own unit, and the canonical link writes that unit beside it.
 */
function readLinkMeasure(
  text: string,
  attribute: MeasureAttribute,
  system: UnitSystem,
  typedIn: UnitSystem | undefined,
): LinkValue {
  const { unit } = attribute
  if (typedIn === undefined && bareNumber.test(text)) return { ok: true, value: Number(text), text }
  const reading = readMeasure(text, unit, typedIn ?? system)
  if (!reading.ok) return { ok: false, detail: reading.reason }
  if (!reading.assumedUnit) return { ok: true, value: reading.value, text }
  if (typedIn !== undefined) return { ok: true, value: reading.value, text: spellUnit(text, attribute, typedIn) }
  const canonical = readMeasure(text, unit, 'metric')
  return canonical.ok ? { ok: true, value: canonical.value, text } : { ok: false, detail: canonical.reason }
}

function readOption(text: string, numeric: true | undefined): string | number {
  return numeric && bareNumber.test(text) ? Number(text) : text
}

function splitList(text: string): string[] {
  return text === emptySet ? [] : text.split(',').map((part) => part.trim())
}

function readBoolean(text: string): LinkValue {
  const lower = text.toLowerCase()
  if (yes.includes(lower)) return { ok: true, value: true, text: 'yes' }
  if (no.includes(lower)) return { ok: true, value: false, text: 'no' }
  return { ok: false, detail: 'must be yes or no' }
}

/** The country that is meant, however it is written. */
function readCountry(text: string): LinkValue {
  const code = findCountryCode(text)
  return code === undefined
    ? { ok: false, detail: 'must be the two letters of a country, such as US or GB' }
    : { ok: true, value: code, text: code }
}

function readByType(
  text: string,
  attribute: FieldAttribute,
  system: UnitSystem,
  typedIn: UnitSystem | undefined,
): LinkValue {
  switch (attribute.type) {
    case 'measure':
      return readLinkMeasure(text, attribute, system, typedIn)
    case 'choice':
      return { ok: true, value: readOption(text, attribute.numeric), text }
    case 'set': {
      const parts = splitList(text)
      return {
        ok: true,
        value: parts.map((part) => readOption(part, attribute.numeric)),
        text: parts.join(',') || emptySet,
      }
    }
    case 'boolean':
      return readBoolean(text)
    case 'text':
      return attribute.key === 'country' ? readCountry(text) : { ok: true, value: text, text }
    case 'texts':
      return { ok: true, value: splitList(text), text }
  }
}

const schemas = new WeakMap<FieldAttribute, z.ZodType>()

/** A page reads dozens of fields with every visit; their schemas are made once. */
function getFieldSchema(attribute: FieldAttribute): z.ZodType {
  const schema = schemas.get(attribute) ?? createFieldSchema(attribute)
  schemas.set(attribute, schema)
  return schema
}

/** A bare number of a form with the unit that it was meant in; anything else as it is. */
export function spellUnit(text: string, { unit }: MeasureAttribute, typedIn: UnitSystem | undefined): string {
  if (typedIn === undefined) return text
  const reading = readMeasure(text, unit, typedIn)
  return reading.ok && reading.assumedUnit ? `${text.trim()} ${findShownUnit(unit, typedIn).symbol}`.trim() : text
}

/** Reads what was typed for one field, and holds it to the field's own limits. Never throws. */
export function readLinkValue(
  typed: string,
  attribute: FieldAttribute,
  system: UnitSystem,
  typedIn?: UnitSystem,
): LinkValue {
  const read = readByType(typed.trim(), attribute, system, typedIn)
  if (!read.ok) return read
  const parsed = getFieldSchema(attribute).safeParse(read.value)
  return parsed.success
    ? read
    : { ok: false, detail: parsed.error.issues[0]?.message ?? 'is not a value for this field' }
}
