import { getKind, isKindKey } from '#shared/kinds/index'
import type { Attribute, MeasureAttribute } from '#shared/kinds/types'
import type { Gear } from '#shared/schemas/gear'
import { units, type CanonicalUnit } from '#shared/units/units'

/**
 * Common codes of UN/ECE Recommendation 20, which schema.org asks for in `unitCode`. Units without one there are given
 * by their UCUM code behind a prefix, as schema.org allows for codes of another system.
 */
const commonCodes: Readonly<Partial<Record<CanonicalUnit, string>>> = {
  mm: 'MMT',
  m: 'MTR',
  L: 'LTR',
  W: 'WTT',
  C: 'CEL',
  K: 'KEL',
  kg: 'KGM',
  kPa: 'KPA',
  V: 'VLT',
  A: 'AMP',
  nm: 'C45',
  h: 'HUR',
  count: 'C62',
}

function writeMeasure({ key, label, unit }: MeasureAttribute, value: unknown) {
  return {
    '@type': 'PropertyValue',
    propertyID: key,
    name: label,
    value,
    unitCode: commonCodes[unit] ?? `UCUM:${units[unit].ucum}`,
  }
}

function writeProperty(attribute: Attribute, value: unknown): object[] {
  if (attribute.type === 'measure') return [writeMeasure(attribute, value)]
  const { key, label } = attribute
  if (attribute.type === 'choice' || attribute.type === 'boolean' || attribute.type === 'text')
    return [{ '@type': 'PropertyValue', propertyID: key, name: label, value }]
  if (attribute.type === 'set' || attribute.type === 'texts')
    return Array.isArray(value) && value.length > 0
      ? [{ '@type': 'PropertyValue', propertyID: key, name: label, value: value.join(', ') }]
      : []
  return []
}

/** The piece as a schema.org Product, every spec a property with its unit. */
export function writeJsonLd(gear: Gear): object {
  const kind = isKindKey(gear.kind) ? getKind(gear.kind) : null
  const attributes = kind?.attributes ?? []
  return {
    '@context': 'https://schema.org',
    '@type': 'Product',
    name: `${gear.brand} ${gear.model}`,
    model: gear.model,
    brand: { '@type': 'Brand', name: gear.brand },
    category: kind?.label ?? gear.kind,
    ...(gear.gtin !== null && { gtin: gear.gtin }),
    additionalProperty: attributes.flatMap((attribute) => {
      const value = gear.specs[attribute.key]
      return value === undefined ? [] : writeProperty(attribute, value)
    }),
  }
}
