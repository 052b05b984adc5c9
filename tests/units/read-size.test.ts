import { describe, expect, it } from 'vitest'
import { readSize, type SizeReading } from '#shared/units/read-size'
import type { UnitSystem } from '#shared/units/systems'

const read = (text: string, system: UnitSystem = 'us'): SizeReading => {
  const reading = readSize(text, system)
  if (!reading.ok) throw new Error(`"${text}" was refused: ${reading.reason}`)
  return reading
}

// 1 in = 25.4 mm, 1 ft = 304.8 mm: NIST SP 811 app. B.
describe('a typed size', () => {
  it.each<[string, UnitSystem, readonly number[]]>([
    ['24 x 18 x 12', 'us', [609.6, 457.2, 304.8]],
    ['24 x 18 x 12', 'metric', [24, 18, 12]],
    ['4 x 5 x 12 inch', 'metric', [101.6, 127, 304.8]],
    ['60×45×40 cm', 'us', [600, 450, 400]],
    ['60*45*40cm', 'us', [600, 450, 400]],
    ['24" by 18" by 12"', 'metric', [609.6, 457.2, 304.8]],
    ['24″×18″×12″', 'metric', [609.6, 457.2, 304.8]],
    ['4 1/2 x 5 x 12 in', 'us', [114.3, 127, 304.8]],
    ['4½X5X12 in', 'us', [114.3, 127, 304.8]],
    ['100 x 120 mm', 'us', [100, 120]],
  ])('reads %s for a %s reader', (text, system, expected) => {
    expect(read(text, system).valuesMm).toEqual(expected)
  })

  it('spreads the next unit, else the last one before, to lengths that have none', () => {
    expect(read('2 ft x 18 in x 12').valuesMm).toEqual([609.6, 457.2, 304.8])
    expect(read('1 m x 40 x 50 cm').valuesMm).toEqual([1000, 400, 500])
    expect(read('1\' 6" x 12 x 3', 'metric').valuesMm).toEqual([457.2, 304.8, 76.2])
  })

  it('says whether a unit had to be assumed, and echoes both systems', () => {
    expect(read('4 x 5 x 12').assumedUnit).toBe(true)
    expect(read('4 x 5 x 12 in').assumedUnit).toBe(false)
    expect(read('4 x 5 x 12').echo.replaceAll('\u00a0', ' ')).toBe('4 × 5 × 12 in = 101.6 × 127 × 304.8 mm')
  })

  it.each([
    ['60', /two or three/],
    ['1x2x3x4', /two or three/],
    ['20 gal x 3', /is a volume/],
    ['a x b', /no number/],
    ['4 x  x 5', /Nothing was typed/],
    ['4 x -5 in', /negative/],
    ['4 x 1,234 in', /two ways/],
    ['', /two or three/],
    ['4x'.repeat(5000), /too long/],
  ])('refuses %j with a reason', (text, reason) => {
    const reading = readSize(text, 'us')
    expect(reading.ok ? '' : reading.reason).toMatch(reason)
  })
})
