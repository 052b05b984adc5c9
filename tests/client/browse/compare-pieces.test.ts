import { describe, expect, it } from 'vitest'
import type { GearItem } from '#shared/schemas/gear'
import { createPrinter } from '#shared/units/print'
import { comparePieces } from '../../../src/features/browse/model/compare-pieces'

const piece = (slug: string, specs: GearItem['specs']): GearItem => ({
  slug,
  kind: 'heater',
  brand: 'Invented',
  model: slug,
  gtin: null,
  status: 'current',
  revision: 1,
  updatedAt: '2025-03-03T00:00:00.000Z',
  specs,
})

const a = piece('a', { powerW: 100, lengthMm: 254, form: 'glass-rod', thermostat: 'built-in', cordMm: 1800 })
const b = piece('b', { powerW: 100, lengthMm: 300, form: 'titanium-rod', thermostat: 'built-in' })
const metric = createPrinter('metric')

describe('pieces side by side', () => {
  const roles = comparePieces('heater', [a, b], metric)
  const [check, difference] = roles

  it('are told apart by what decides first, then by what is compared', () => {
    expect(roles.map(({ role }) => role)).toEqual(['check', 'difference'])
    expect(check?.differences.map(({ attribute }) => attribute.key)).toEqual(['form', 'lengthMm'])
    expect(difference?.differences.map(({ attribute }) => attribute.key)).toEqual(['cordMm'])
  })

  it('say once what is the same in all', () => {
    expect(check?.alike).toEqual(['thermostat built in', 'power 100\u00a0W'])
  })

  it('keep what is not recorded apart from a number, and name what is recorded of none', () => {
    expect(difference?.differences[0]).toMatchObject({ type: 'measure', values: [1800, null] })
    expect(check?.unknown).toContain('diameter')
  })
})
