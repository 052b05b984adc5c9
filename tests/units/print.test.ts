import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { countDecimals } from '#shared/units/digits'
import { describeExample } from '#shared/units/examples'
import { createPrinter } from '#shared/units/print'
import { readMeasure } from '#shared/units/read'
import { readSize } from '#shared/units/read-size'
import { unitSystems } from '#shared/units/systems'
import { fromShown, toShown } from '#shared/units/convert'
import { canonicalUnits, units, type CanonicalUnit } from '#shared/units/units'

const us = createPrinter('us')
const metric = createPrinter('metric')
const plain = (text: string) => text.replaceAll('\u00a0', ' ')

describe('a printed measure', () => {
  // Values by hand from the factors of NIST SP 811 app. B; the number of digits is this project's own choice.
  it.each<[number, CanonicalUnit, string, string]>([
    [114.3, 'mm', '4.5 in', '114 mm'],
    [6, 'mm', '0.24 in', '6 mm'],
    [1.27, 'mm', '0.05 in', '1.3 mm'],
    [0.25, 'mm', '0.0098 in', '0.25 mm'],
    [3048, 'mm', '120 in', '3048 mm'],
    [1.8288, 'm', '6 ft', '1.83 m'],
    [75.70823568, 'L', '20 gal', '75.7 L'],
    [170, 'L', '45 gal', '170 L'],
    [25.5, 'C', '78 °F', '25.5 °C'],
    [-2, 'C', '28 °F', '−2 °C'],
    [1135.6235352, 'L/h', '300 gal/h', '1136 L/h'],
    [283.9058838, 'L/d', '75 gal/day', '284 L/day'],
    [9, 'kg', '19.8 lb', '9 kg'],
    [37.85411784, 'L/wk', '10 gal/week', '38 L/week'],
    [5, 'K', '9 °F', '5 °C'],
    [1.1, 'kg/L', '9.2 lb/gal', '1.1 kg/L'],
    [280, 'kPa', '41 psi', '280 kPa'],
    [34.5, 'ppt', '34.5 ppt', '34.5 ppt'],
    [250, 'ppm', '250 ppm', '250 ppm'],
    [8.25, 'dKH', '8.3 dKH', '8.3 dKH'],
    [90, 'umol/s', '90 µmol/s', '90 µmol/s'],
    [120, 'V', '120 V', '120 V'],
    [0.83, 'A', '0.83 A', '0.83 A'],
    [450, 'nm', '450 nm', '450 nm'],
    [6.5, 'h', '6.5 h', '6.5 h'],
    [100, 'W', '100 W', '100 W'],
    [0.355, 'fraction', '36%', '36%'],
    [8.24, '/h', '8.2/h', '8.2/h'],
    [3, 'ratio', '3 : 1', '3 : 1'],
    [90, 'deg', '90°', '90°'],
    [4, 'count', '4', '4'],
    [120, 'umol/m2/s', '120 µmol/m²/s', '120 µmol/m²/s'],
  ])('%d %s is %s or %s', (value, unit, inUs, inMetric) => {
    expect(plain(us.measure(value, unit))).toBe(inUs)
    expect(plain(metric.measure(value, unit))).toBe(inMetric)
  })

  it('keeps its unit on the line of its number', () => {
    expect(us.length(114.3)).toBe('4.5\u00a0in')
    expect(us.size([101.6, 127, 304.8])).toBe('4\u00a0×\u00a05\u00a0×\u00a012\u00a0in')
  })

  it('can be finer than usual, or exact enough to edit', () => {
    expect(plain(metric.length(114.3, { finer: 1 }))).toBe('114.3 mm')
    expect(plain(us.temperature(25.5, { finer: 1 }))).toBe('77.9 °F')
    expect(plain(us.length(300, { exact: true }))).toBe('11.81102 in')
  })

  it('rounds a tie away from zero even where binary stores it low', () => {
    expect(metric.number(3.175, 'mm', { finer: 1 })).toBe('3.18')
    expect(metric.number(1.005, 'kg/L')).toBe('1.01')
  })

  it('has no offset as a difference of temperatures', () => {
    expect(plain(us.difference(2.2222222, 'C'))).toBe('4 °F')
    expect(plain(metric.difference(2.2222222, 'C'))).toBe('2.2 °C')
    expect(plain(us.difference(25.4, 'mm'))).toBe('1 in')
  })

  it('joins a range, or shows one value where both ends print alike', () => {
    expect(plain(us.pair([101.6, 304.8], 'mm'))).toBe('4–12 in')
    expect(plain(us.pair([304.8, 304.9], 'mm'))).toBe('12 in')
    expect(plain(metric.pair([-2, 4], 'C'))).toBe('−2 to 4 °C')
  })

  it('tells two values apart that the usual digits would print alike', () => {
    expect(us.apart(304.8, 305.5, 'mm').map(plain)).toEqual(['12 in', '12.03 in'])
    expect(us.apart(304.8, 254, 'mm').map(plain)).toEqual(['12 in', '10 in'])
    expect(us.apart(304.8, 304.8, 'mm').map(plain)).toEqual(['12 in', '12 in'])
  })

  it('names the helpers after their quantities', () => {
    expect(plain(us.volume(37.85411784))).toBe('10 gal')
    expect(plain(metric.power(49.6))).toBe('50 W')
    expect(plain(us.mass(45.359237))).toBe('100 lb')
    expect(plain(metric.flow(1000))).toBe('1000 L/h')
  })

  it('prints a dash for what is not a finite number', () => {
    expect(plain(us.length(NaN))).toBe('– in')
    expect(plain(us.power(Infinity))).toBe('– W')
  })
})

const anyValue = fc.double({ min: 0.001, max: 100_000, noNaN: true })
const anyUnit = fc.constantFrom(...canonicalUnits)
const anySystem = fc.constantFrom(...unitSystems)

describe('printing and reading', () => {
  it('never prints a minus before nought', () => {
    fc.assert(
      fc.property(fc.double({ min: -1, max: 0, noNaN: true }), anyUnit, anySystem, (value, unit, system) => {
        expect(createPrinter(system).measure(value, unit)).not.toMatch(/^[-\u2212]0(?![.\d])/)
      }),
    )
  })

  it('come back within half of the last digit printed', () => {
    fc.assert(
      fc.property(anyValue, anyUnit, anySystem, (value, unit, system) => {
        const counted = unit === 'count' ? Math.ceil(value) : value
        const shown = toShown(counted, unit, system)
        const decimals = countDecimals(shown, units[unit][system])
        const reading = readMeasure(createPrinter(system).measure(counted, unit), unit, system)
        expect(reading).toMatchObject({ ok: true, assumedUnit: unit === 'count' })
        if (!reading.ok) return
        const away = Math.abs(toShown(reading.value, unit, system) - shown)
        expect(away).toBeLessThanOrEqual(0.5 * 10 ** -decimals * (1 + 1e-9) + 1e-9)
      }),
      { numRuns: 1000 },
    )
  })

  it('lose less than a millionth where printed exactly', () => {
    fc.assert(
      fc.property(anyValue, anyUnit, anySystem, (value, unit, system) => {
        fc.pre(unit !== 'count')
        const reading = readMeasure(createPrinter(system).measure(value, unit, { exact: true }), unit, system)
        const scale = unit === 'C' ? value + 32 : value
        expect(reading.ok && Math.abs(reading.value - value) / scale).toBeLessThan(1e-6)
      }),
      { numRuns: 1000 },
    )
  })

  it('agree between the unit systems', () => {
    fc.assert(
      fc.property(anyValue, anyUnit, (value, unit) => {
        const viaUs = fromShown(toShown(value, unit, 'us'), unit, 'us')
        const viaMetric = fromShown(toShown(value, unit, 'metric'), unit, 'metric')
        expect(Math.abs(viaUs - viaMetric)).toBeLessThan(1e-11 * Math.max(value, 100))
      }),
    )
  })

  it('bring a printed size back within half of its last digit', () => {
    const lengths = fc.array(fc.double({ min: 30, max: 2500, noNaN: true }), { minLength: 2, maxLength: 3 })
    fc.assert(
      fc.property(lengths, anySystem, (valuesMm, system) => {
        const reading = readSize(createPrinter(system).size(valuesMm), system)
        expect(reading.ok).toBe(true)
        if (!reading.ok) return
        expect(reading.valuesMm).toHaveLength(valuesMm.length)
        for (const [index, mm] of reading.valuesMm.entries()) {
          // Half a tenth of an inch, or half an inch from 100 in up.
          const halfDigit = system === 'metric' ? 0.5 : (valuesMm[index] ?? 0) < 2540 ? 1.27 : 12.7
          expect(Math.abs(mm - (valuesMm[index] ?? NaN))).toBeLessThanOrEqual(halfDigit + 1e-9)
        }
      }),
    )
  })
})

describe('an example to type', () => {
  it.each(canonicalUnits)('for %s reads back with its unit in both systems', (unit) => {
    for (const system of unitSystems) {
      const reading = readMeasure(describeExample(unit, system), unit, system)
      expect(reading).toMatchObject({ ok: true, assumedUnit: unit === 'count' })
    }
  })
})
