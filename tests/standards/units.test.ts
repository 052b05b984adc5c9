import { UcumLhcUtils } from '@lhncbc/ucum-lhc'
import { unit as quantity } from 'mathjs'
import { describe, expect, it } from 'vitest'
import { fromCanonical, toCanonical } from '#shared/units/convert'
import { namedUnits } from '#shared/units/unit-names'
import { canonicalUnits, units, type CanonicalUnit, type Quantity } from '#shared/units/units'

const ucum = UcumLhcUtils.getInstance()

const relativeError = (actual: number, expected: number) => Math.abs(actual - expected) / Math.abs(expected)

describe('published conversions', () => {
  // Each row: a factor or worked value to the digits of its source. UCUM and UN/ECE were read in the published files;
  // NIST is quoted after secondary texts, the SI brochure from memory.
  it.each<[string, number, string, CanonicalUnit, number, number]>([
    ['UCUM [in_i] = 2.54 cm; NIST SP 811 app. B', 1, 'in', 'mm', 25.4, 1e-13],
    ['UCUM [ft_i] = 12 in; NIST SP 811 app. B', 1, 'ft', 'm', 0.3048, 1e-13],
    ['UCUM [gal_us] = 231 in³; NIST Handbook 44 app. C', 1, 'gal', 'L', 3.785411784, 1e-13],
    ['UCUM [gal_br] = 4.54609 L', 1, 'imp gal', 'L', 4.54609, 1e-13],
    ['UN/ECE Rec 20 LBR = 0.45359237 kg', 1, 'lb', 'kg', 0.45359237, 1e-13],
    ['UCUM [psi] = lbf/in², g = 9.80665 m/s²', 1, 'psi', 'kPa', 6.894757293168, 1e-13],
    ['NIST SP 811 app. B.8: Btu(IT)/h = 2.930711 E-01 W', 1, 'Btu/h', 'W', 0.2930711, 2e-7],
    ['12 000 Btu(IT)/h, from UCUM [Btu_IT] = 1055.05585262 J', 12_000, 'Btu/h', 'W', 3516.85284, 1e-8],
    ['231 in³ × 100', 100, 'gal/h', 'L/h', 378.5411784, 1e-12],
    ['231 in³ × 75', 75, 'gal/day', 'L/d', 283.9058838, 1e-12],
    ['231 in³ × 100 / 24', 100, 'gal/day', 'L/h', 15.7725491, 1e-8],
    ['231 in³ / 0.45359237 kg', 1, 'lb/gal', 'kg/L', 0.119826427, 1e-8],
    ['UN/ECE Rec 20 FAH: (77 − 32) · 5/9', 77, '°F', 'C', 25, 1e-13],
    ['UN/ECE Rec 20 FAH: (78 − 32) · 5/9', 78, '°F', 'C', 25.555556, 1e-7],
    ['UN/ECE Rec 20 FAH: (82 − 32) · 5/9', 82, '°F', 'C', 27.777778, 1e-7],
    ['a difference of 4 °F is 4 · 5/9 K', 4, '°F', 'K', 2.222222, 1e-6],
    ['SI brochure: 1 bar = 100 kPa', 1, 'bar', 'kPa', 100, 1e-13],
  ])('%s', (_source, value, symbol, unit, expected, tolerance) => {
    expect(relativeError(toCanonical(value, symbol, unit), expected)).toBeLessThan(tolerance)
  })

  it('give 1000 L/h as 264.172052 US gallons an hour (1000 / 3.785411784)', () => {
    expect(fromCanonical(1000, 'L/h', 'gal/h')).toBeCloseTo(264.172052, 6)
  })

  it('hold 1.2009499255 US gallons in an imperial one (4.54609 / 3.785411784)', () => {
    expect(fromCanonical(toCanonical(1, 'imp gal', 'L'), 'L', 'gal')).toBeCloseTo(1.2009499255, 10)
  })
})

const everyNamedUnit = canonicalUnits.flatMap((unit) =>
  namedUnits[units[unit].quantity].map((named) => [unit, named.symbol, named.ucum] as const),
)

/** UCUM converts kelvin scales with their offset; a difference is the change between two points. */
const convertByUcum = (value: number, from: string, to: string): number => {
  const result = ucum.convertUnitTo(from, value, to)
  if (result.status !== 'succeeded' || result.toVal === null) throw new Error(`${from} to ${to}: ${String(result.msg)}`)
  return result.toVal
}

describe('the UCUM reference implementation (ucum-lhc 7.1.10)', () => {
  it.each(canonicalUnits)('accepts the code of %s', (unit) => {
    expect(ucum.validateUnitString(units[unit].ucum).status).toBe('valid')
  })

  it.each(everyNamedUnit)('agrees for %s typed in "%s" (%s)', (unit, symbol, code) => {
    const target = units[unit].ucum
    const isDifference = unit === 'K'
    const expected =
      convertByUcum(77, code, target) - (isDifference && code !== target ? convertByUcum(0, code, target) : 0)
    expect(relativeError(toCanonical(77, symbol, unit), expected)).toBeLessThan(1e-12)
  })
})

describe('mathjs 15.2.0', () => {
  const names: Partial<Record<Quantity, Readonly<Record<string, string>>>> = {
    length: { mm: 'mm', cm: 'cm', m: 'm', in: 'in', ft: 'ft', yd: 'yd' },
    volume: { L: 'L', mL: 'mL', 'm³': 'm^3', gal: 'gallon', qt: 'quart' },
    power: { W: 'W', kW: 'kW', 'Btu/h': 'BTU/hour' },
    flow: { 'L/h': 'L/hour', 'L/min': 'L/minute', 'L/day': 'L/day', 'L/week': 'L/week', 'gal/h': 'gallon/hour' },
    temperature: { '°C': 'degC', '°F': 'degF', K: 'K' },
    mass: { kg: 'kg', g: 'g', lb: 'lbm', oz: 'oz' },
    density: { 'kg/L': 'kg/L', 'kg/m³': 'kg/m^3', 'lb/gal': 'lbm/gallon' },
    pressure: { kPa: 'kPa', psi: 'psi', bar: 'bar', MPa: 'MPa' },
  }
  const targets: readonly (readonly [CanonicalUnit, string])[] = [
    ['mm', 'mm'],
    ['m', 'm'],
    ['L', 'L'],
    ['W', 'W'],
    ['L/h', 'L/hour'],
    ['L/d', 'L/day'],
    ['L/wk', 'L/week'],
    ['C', 'degC'],
    ['kg', 'kg'],
    ['kg/L', 'kg/L'],
    ['kPa', 'kPa'],
  ]
  const rows = targets.flatMap(([unit, target]) =>
    Object.entries(names[units[unit].quantity] ?? {}).map(([symbol, name]) => [unit, symbol, name, target] as const),
  )

  it.each(rows)('agrees for %s typed in "%s"', (unit, symbol, name, target) => {
    // Its psi is rounded, 6e-11 off; its other units here are exact.
    const tolerance = symbol === 'psi' ? 1e-10 : 1e-12
    expect(relativeError(toCanonical(77, symbol, unit), quantity(77, name).toNumber(target))).toBeLessThan(tolerance)
  })
})

describe('the named units', () => {
  it('throw for a symbol of another quantity', () => {
    expect(() => toCanonical(1, 'gal', 'mm')).toThrow(RangeError)
    expect(() => fromCanonical(1, 'L', 'in')).toThrow(RangeError)
  })

  it.each(Object.keys(namedUnits) as Quantity[])('of %s are each spelled one way for one unit', (name) => {
    const spellings = namedUnits[name].flatMap((named) => [named.symbol.toLowerCase(), ...new Set(named.spellings)])
    const byUnit = namedUnits[name].map((named) => new Set([named.symbol.toLowerCase(), ...named.spellings]))
    for (const spelling of spellings) expect(byUnit.filter((each) => each.has(spelling))).toHaveLength(1)
  })
})
