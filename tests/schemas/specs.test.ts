import { Ajv2020 } from 'ajv/dist/2020.js'
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { z } from 'zod'
import { kindKeys } from '#shared/kinds/index'
import { createSpecsSchema, specsInputSchema, toSpecs } from '#shared/schemas/specs'
import type { KindKey } from '#shared/kinds/index'

function listProblems(kind: KindKey, specs: unknown, schema = createSpecsSchema(kind)): string[] {
  const result = schema.safeParse(specs)
  return (result.error?.issues ?? []).map((issue) => `${issue.path.join('.')}: ${issue.message}`)
}

describe('bare specs', () => {
  it('may leave out anything', () => {
    for (const kind of kindKeys) expect(listProblems(kind, {})).toEqual([])
  })

  it('name what is allowed when a value is not', () => {
    expect(listProblems('heater', { lengthMm: 5 })).toEqual(['lengthMm: must be a number between 10 and 600 mm'])
    expect(listProblems('heater', { lengthMm: '300' })).toEqual(['lengthMm: must be a number between 10 and 600 mm'])
    expect(listProblems('heater', { form: 'copper' })).toEqual([
      'form: must be one of: titanium-rod, glass-rod, polymer-rod, inline',
    ])
    expect(listProblems('heater', { plugs: 1.5 })).toEqual(['plugs: must be a whole number between 0 and 8'])
    expect(listProblems('heater', { volts: [110] })).toEqual(['volts.0: must be one of: 100, 120, 230'])
    expect(listProblems('light', { dimmable: 1 })).toEqual(['dimmable: must be true or false'])
    expect(listProblems('sand', { bulkDensityKgL: 30 })).toEqual([
      'bulkDensityKgL: must be a number between 0.5 and 3 kg/L',
    ])
  })

  it('name every wrong value at once, the unknown ones too', () => {
    const problems = listProblems('heater', { lengthMm: -1, powerW: Number.NaN, colour: 'red', thermostat: 3 })
    expect(problems).toHaveLength(4)
    expect(problems.some((problem) => problem.includes('colour'))).toBe(true)
  })

  it('take mains voltages as numbers, not as the words that offer them', () => {
    expect(listProblems('heater', { volts: [120, 230] })).toEqual([])
    expect(listProblems('heater', { volts: ['120'] })).toHaveLength(1)
  })

  it('refuse a repeated entry in a set', () => {
    expect(listProblems('heater', { volts: [120, 120] })).toEqual(['volts: must not repeat an entry'])
  })

  it('refuse numbers that are none', () => {
    for (const value of [Number.NaN, Number.POSITIVE_INFINITY, null, '1', [1], {}]) {
      expect(listProblems('heater', { powerW: value })).toHaveLength(1)
    }
  })

  it('point into groups', () => {
    expect(listProblems('tank', { chambers: [{ id: 'a' }, { id: 'b c', lengthMm: 'x' }] })).toEqual([
      'chambers.1.id: must be letters, digits, dashes and underscores only',
      'chambers.1.lengthMm: must be a number between 15 and 4000 mm',
    ])
    expect(listProblems('return-pump', { flowCurve: [{ headM: 0, flowLph: 900 }, { headM: 1 }] })).toEqual([
      'flowCurve.1.flowLph: must be a number between 0 and 100000 L/h',
    ])
  })

  it('refuse what contradicts itself, at the value that does', () => {
    expect(listProblems('sand', { grainMinMm: 2, grainMaxMm: 1 })).toEqual([
      'grainMinMm: smallest grain must not be above largest grain',
    ])
  })

  it('accept or refuse anything without throwing', () => {
    fc.assert(
      fc.property(fc.constantFrom(...kindKeys), fc.anything(), (kind, value) => {
        createSpecsSchema(kind).safeParse(value)
        specsInputSchema(kind).safeParse(value)
      }),
    )
  })
})

describe('specs as typed in', () => {
  const problemsOf = (kind: KindKey, specs: unknown) => listProblems(kind, specs, specsInputSchema(kind))

  it('take each value bare or with its source', () => {
    const specs = { powerW: 100, lengthMm: { value: 250, source: 'measured', plusMinus: 1 } }
    expect(problemsOf('heater', specs)).toEqual([])
    expect(toSpecs('heater', specsInputSchema('heater').parse(specs), 'maker')).toEqual({
      powerW: { value: 100, source: 'maker' },
      lengthMm: { value: 250, source: 'measured', plusMinus: 1 },
    })
  })

  it('complain of the form that was meant', () => {
    expect(problemsOf('heater', { lengthMm: 5 })).toEqual(['lengthMm: must be a number between 10 and 600 mm'])
    expect(problemsOf('heater', { lengthMm: { value: 5, source: 'measured' } })).toEqual([
      'lengthMm.value: must be a number between 10 and 600 mm',
    ])
    expect(problemsOf('heater', { lengthMm: { value: 50, source: 'hearsay' } })).toEqual([
      'lengthMm.source: must be one of: measured, maker, estimate',
    ])
    expect(problemsOf('heater', { lengthMm: { value: 50 } })).toHaveLength(1)
  })

  it('have a ± only where there is a unit for it, and never a negative one', () => {
    expect(problemsOf('heater', { form: { value: 'glass-rod', source: 'maker', plusMinus: 1 } })).toHaveLength(1)
    expect(problemsOf('heater', { powerW: { value: 100, source: 'maker', plusMinus: -1 } })).toHaveLength(1)
  })

  it('point at a contradiction inside a value with its source', () => {
    const sourced = { value: [{ id: 'a', lengthMm: 100, openingLengthMm: 120 }], source: 'measured' }
    expect(problemsOf('tank', { chambers: sourced })).toEqual([
      'chambers.value.0.openingLengthMm: an opening must not be larger than its chamber',
    ])
  })
})

describe('JSON Schema of the specs', () => {
  const ajv = new Ajv2020({ strict: false })

  it.each(kindKeys)('of %s compiles and agrees on what it can express', (kind) => {
    for (const schema of [createSpecsSchema(kind), specsInputSchema(kind)]) {
      const validate = ajv.compile(z.toJSONSchema(schema))
      expect(validate({})).toBe(true)
      expect(validate({ noSuchAttribute: 1 })).toBe(false)
    }
  })

  it('holds ranges, options and both forms of a value', () => {
    const bare = ajv.compile(z.toJSONSchema(createSpecsSchema('heater')))
    const input = ajv.compile(z.toJSONSchema(specsInputSchema('heater')))
    expect([bare({ lengthMm: 300, volts: [120] }), bare({ lengthMm: 5 }), bare({ volts: [110] })]).toEqual([
      true,
      false,
      false,
    ])
    expect(input({ lengthMm: 300, powerW: { value: 100, source: 'maker', plusMinus: 5 } })).toBe(true)
    expect(input({ powerW: { value: 100, source: 'hearsay' } })).toBe(false)
  })
})
