import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { readMeasure, type Reading } from '#shared/units/read'
import { unitSystems, type UnitSystem } from '#shared/units/systems'
import { canonicalUnits, type CanonicalUnit } from '#shared/units/units'

const read = (text: string, unit: CanonicalUnit, system: UnitSystem = 'us'): Reading => {
  const reading = readMeasure(text, unit, system)
  if (!reading.ok) throw new Error(`"${text}" was refused: ${reading.reason}`)
  return reading
}

const refusalOf = (text: string, unit: CanonicalUnit, system: UnitSystem = 'us'): string => {
  const reading = readMeasure(text, unit, system)
  if (reading.ok) throw new Error(`"${text}" was read as ${reading.value}`)
  return reading.reason
}

const plain = (text: string) => text.replaceAll('\u00a0', ' ')

// Inch 25.4 mm, US gallon 231 in³, imperial gallon 4.54609 L, pound 0.45359237 kg, psi 6894.757293168 Pa: NIST SP 811
// app. B and NIST Handbook 44 app. C. The products are worked here by hand from those.
describe('a typed measure', () => {
  it.each<[string, CanonicalUnit, number]>([
    ['4 1/2"', 'mm', 114.3],
    ['4-1/2 in', 'mm', 114.3],
    ['4–1/2 in', 'mm', 114.3],
    ['11½ in', 'mm', 292.1],
    ['11 1⁄2 in.', 'mm', 292.1],
    ['¾"', 'mm', 19.05],
    ['1/3 in', 'mm', 25.4 / 3],
    ['1\' 6"', 'mm', 457.2],
    ['1′ 6″', 'mm', 457.2],
    ['1’ 6”', 'mm', 457.2],
    ["1' 6''", 'mm', 457.2],
    ['5\'-6"', 'mm', 1676.4],
    ['1 ft 6', 'mm', 457.2],
    ['2 ft 3 1/2 in', 'mm', 698.5],
    ['30cm', 'mm', 300],
    ['0.3 Metres', 'mm', 300],
    ['１２ in', 'mm', 304.8],
    ['12\u00a0in', 'mm', 304.8],
    ['12\u200b inches', 'mm', 304.8],
    ['6 ft', 'm', 1.8288],
    ['20 gal', 'L', 75.70823568],
    ['20 gallons', 'L', 75.70823568],
    ['20 US gallons', 'L', 75.70823568],
    ['10 imp gal', 'L', 45.4609],
    ['10 UK gallons', 'L', 45.4609],
    ['75l', 'L', 75],
    ['77F', 'C', 25],
    ['77 °F', 'C', 25],
    ['77º f', 'C', 25],
    ['25,5 C', 'C', 25.5],
    ['20℃', 'C', 20],
    ['−2 C', 'C', -2],
    ['-40 F', 'C', -40],
    ['9 F', 'K', 5],
    ['300 gph', 'L/h', 1135.6235352],
    ['300 gallons per hour', 'L/h', 1135.6235352],
    ['24 gpd', 'L/h', 3.785411784],
    ['75 gallons a day', 'L/d', 283.9058838],
    ['10 L/min', 'L/h', 600],
    ['7 L/day', 'L/wk', 49],
    ['40 psi', 'kPa', 275.79029172672],
    ['2.8 bar', 'kPa', 280],
    ['100 watts', 'W', 100],
    ['1.5 kW', 'W', 1500],
    ['16 lb 8 oz', 'kg', 7.484274105],
    ['1h 30min', 'h', 1.5],
    ['50%', 'fraction', 0.5],
    ['3:1', 'ratio', 3],
    ['3 to 1', 'ratio', 3],
    ['8x', '/h', 8],
    ['8 times per hour', '/h', 8],
    ['120 μmol m⁻² s⁻¹', 'umol/m2/s', 120],
    ['120 PAR', 'umol/m2/s', 120],
    ['90°', 'deg', 90],
    ['35 ‰', 'ppt', 35],
    ['4 outlets', 'count', 4],
  ])('reads %s as %s', (text, unit, expected) => {
    for (const system of unitSystems) {
      const reading = read(text, unit, system)
      expect(reading.value).toBeCloseTo(expected, 9)
      expect(reading.assumedUnit).toBe(false)
    }
  })

  it('takes the unit of the person where none is typed, and says so', () => {
    expect(read('4 1/2', 'mm', 'us')).toMatchObject({ value: 114.3, unitRead: 'in', assumedUnit: true })
    expect(read('114', 'mm', 'metric')).toMatchObject({ value: 114, unitRead: 'mm', assumedUnit: true })
    expect(read('77 degrees', 'C', 'us')).toMatchObject({ value: 25, unitRead: '°F', assumedUnit: true })
    expect(read('25°', 'C', 'metric')).toMatchObject({ value: 25, unitRead: '°C', assumedUnit: true })
    expect(read('50', 'fraction')).toMatchObject({ value: 0.5, unitRead: '%', assumedUnit: true })
  })

  it('keeps binary noise out of the stored value', () => {
    expect(read('1.5 in', 'mm').value).toBe(38.1)
    expect(read('8.2 in', 'mm').value).toBe(208.28)
  })

  it('echoes what was understood in the units of both systems', () => {
    expect(plain(read('4-1/2"', 'mm').echo)).toBe('4 1/2 in = 114.3 mm')
    expect(plain(read('1\' 6"', 'mm').echo)).toBe('1 ft 6 in = 18 in = 457.2 mm')
    expect(plain(read('30 cm', 'mm', 'metric').echo)).toBe('30 cm = 300 mm = 11.81 in')
    expect(plain(read('77F', 'C').echo)).toBe('77 °F = 25 °C')
    expect(plain(read('100 watts', 'W').echo)).toBe('100 W')
    expect(plain(read('-0', 'C', 'metric').echo)).toBe('0 °C = 32 °F')
  })
})

describe('what cannot be read', () => {
  it.each<[string, CanonicalUnit, RegExp]>([
    ['', 'mm', /Nothing was typed/],
    [' \u00a0 ', 'mm', /Nothing was typed/],
    ['1,234', 'mm', /two ways: write 1\.234 or 1234/],
    ['1,234.5 in', 'mm', /two ways|thousands/],
    ['1.234,5 mm', 'mm', /thousands/],
    ['1 234 mm', 'mm', /without spaces/],
    ['4.5 1/2 in', 'mm', /side by side/],
    ['4-5 in', 'mm', /range/],
    ['-4 in', 'mm', /cannot be negative/],
    ['−1 %', 'fraction', /cannot be negative/],
    ['20 gal', 'mm', /"20 gal" is a volume; a length is expected, such as 4 1\/2 in/],
    ['12 in', 'L', /"12 in" is a length; a volume is expected, such as 20 gal/],
    ['100 W', 'C', /is a power; a temperature/],
    ['4 fathoms', 'mm', /"fathoms" is not a known unit/],
    ['5² mm', 'mm', /not a known unit/],
    ['1e3 mm', 'mm', /not a known unit/],
    ['NaN', 'mm', /no number/],
    ['Infinity', 'mm', /no number/],
    ['1/0 in', 'mm', /zero/],
    ['4 5/2 in', 'mm', /not less than one/],
    ['1\' 12"', 'mm', /whole ft or more/],
    ['2.5', 'count', /whole number/],
    ['0.5', 'fraction', /two ways/],
    ['9'.repeat(60), 'mm', /too large/],
    ['1'.repeat(10_000), 'mm', /too long/],
    ['\ufdfa'.repeat(100), 'mm', /too long/],
  ])('%j is refused with a reason', (text, unit, reason) => {
    expect(refusalOf(text, unit)).toMatch(reason)
  })

  it('is explained by an example in the units of the person', () => {
    expect(refusalOf('20 gal', 'mm', 'us')).toContain('4 1/2 in')
    expect(refusalOf('20 gal', 'mm', 'metric')).toContain('114 mm')
  })

  it('leaves a decimal comma readable beside a whole part of nought or with other than three decimals', () => {
    expect(read('0,125 in', 'mm').value).toBe(3.175)
    expect(read('1,25 in', 'mm').value).toBe(31.75)
  })
})

describe('any text at all', () => {
  const pieces = [...'0123456789', ...` ,./-'"½²₂°%×:x`, ' 1/2', 'ft', 'in', 'cm', 'gal', ' per ', ' a day', '\u2044']
  const scraps = fc.array(fc.constantFrom(...pieces), { maxLength: 40 }).map((parts) => parts.join(''))

  it('gives a finite value or a reason, and never throws', () => {
    fc.assert(
      fc.property(
        fc.oneof(fc.string({ unit: 'binary', maxLength: 130 }), scraps),
        fc.constantFrom(...canonicalUnits),
        fc.constantFrom(...unitSystems),
        (text, unit, system) => {
          const reading = readMeasure(text, unit, system)
          if (reading.ok) expect(Number.isFinite(reading.value)).toBe(true)
          else expect(reading.reason).toMatch(/\.$/)
        },
      ),
      { numRuns: 2000 },
    )
  })

  it.each([
    ['spaces', ' '],
    ['digits', '7'],
    ['dashes', '- '],
    ['quarters', '¼'],
    ['primes', "'"],
    ['fractions', '1/'],
  ])('of a million characters (%s) is refused at once', (_name, piece) => {
    const started = performance.now()
    expect(readMeasure(piece.repeat(1_000_000 / piece.length), 'mm', 'us').ok).toBe(false)
    expect(performance.now() - started).toBeLessThan(100)
  })
})
