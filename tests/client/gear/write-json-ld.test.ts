import { describe, expect, it } from 'vitest'
import type { Gear } from '#shared/schemas/gear'
import { writeJsonLd } from '../../../src/features/gear/write-json-ld'

const gear: Gear = {
  slug: 'invented-100',
  kind: 'heater',
  brand: 'Invented',
  model: '100',
  gtin: null,
  status: 'current',
  revision: 1,
  updatedAt: '2025-01-01T00:00:00.000Z',
  createdAt: '2025-01-01T00:00:00.000Z',
  notes: null,
  provenance: {},
  confirmations: {},
  sources: {},
  disputed: [],
  specs: { powerW: 100, lengthMm: 250, form: 'glass-rod', madeFor: ['reef', 'plants'] },
}

describe('a piece as structured data', () => {
  it('is a schema.org Product whose measures carry UN/ECE Recommendation 20 codes (WTT watt, MMT millimetre; from memory)', () => {
    const product = writeJsonLd(gear) as { '@type': string; additionalProperty: Record<string, unknown>[] }
    expect(product['@type']).toBe('Product')
    const property = (id: string) => product.additionalProperty.find(({ propertyID }) => propertyID === id)
    expect(property('powerW')).toMatchObject({ '@type': 'PropertyValue', value: 100, unitCode: 'WTT' })
    expect(property('lengthMm')).toMatchObject({ value: 250, unitCode: 'MMT' })
    expect(property('form')).toMatchObject({ value: 'glass-rod' })
    expect(property('madeFor')).toMatchObject({ value: 'reef, plants' })
  })

  it('leaves out what nobody recorded', () => {
    const product = writeJsonLd({ ...gear, specs: {} }) as { additionalProperty: unknown[] }
    expect(product.additionalProperty).toEqual([])
    expect(product).not.toHaveProperty('gtin')
  })
})
