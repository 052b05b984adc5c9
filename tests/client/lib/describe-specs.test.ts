import { describe, expect, it } from 'vitest'
import { kindKeys } from '#shared/kinds/index'
import { createPrinter } from '#shared/units/print'
import { describeSpecs } from '../../../src/lib/describe-specs'

const heater = { powerW: 100, form: 'glass-rod', lengthMm: 254, diameterMm: 25.4, thermostat: 'built-in' }

describe('specs in one line', () => {
  it('speaks in the person’s own units', () => {
    const plain = (system: 'us' | 'metric') =>
      describeSpecs('heater', heater, createPrinter(system)).replaceAll('\u00a0', ' ')
    expect(plain('us')).toBe('100 W, glass rod, 10 in long, 1 in thick, thermostat built in')
    expect(plain('metric')).toBe('100 W, glass rod, 254 mm long, 25 mm thick, thermostat built in')
  })

  it('leaves out what is not known, for every kind', () => {
    for (const kind of kindKeys) expect(describeSpecs(kind, {}, createPrinter('us'))).toBe('')
  })
})
