import { describe, expect, it } from 'vitest'
import fc from 'fast-check'
import { kindKeys } from '#shared/kinds/index'
import { readPasted } from '../../../src/features/propose/paste/read-pasted'

const read = (text: string, kind: Parameters<typeof readPasted>[1] = 'heater') => {
  const { mapped, unread } = readPasted(text, kind, 'us')
  return { values: Object.fromEntries(mapped.map(({ key, text: value }) => [key, value])), unread }
}

describe('a pasted table', () => {
  it('of lines with colons fills the fields that they name, spelling and all', () => {
    const { values, unread } = read('Length: 12 in\nDiameter: 7/8"\nWattage: 100W\nShips in: two days')
    expect(values).toEqual({ lengthMm: '12 in', diameterMm: '7/8"', powerW: '100W' })
    expect(unread).toEqual(['Ships in: two days'])
  })

  it('of cells with tabs or semicolons is read alike', () => {
    const expected = { lengthMm: '30,5 cm', powerW: '100 W', form: 'titanium-rod' }
    expect(read('Length\t30,5 cm\nPower\t100 W\nForm\tTitanium rod').values).toEqual(expected)
    expect(read('Length;30,5 cm\nPower;100 W\nForm;Titanium rod').values).toEqual(expected)
  })

  it('with its labels in one row and its values in the next is turned', () => {
    expect(read('Length\tDiameter\tPower\n305 mm\t22 mm\t100 W').values).toEqual({
      lengthMm: '305 mm',
      diameterMm: '22 mm',
      powerW: '100 W',
    })
  })

  it('of a page is read without its markup, and nothing of a script is', () => {
    const page =
      '<table><tr><th>Length</th><td>12&nbsp;in</td></tr><tr><th>Power</th><td><b>100</b> W</td></tr></table>' +
      '<script>Diameter: 7 mm</script>'
    expect(read(page)).toEqual({ values: { lengthMm: '12 in', powerW: '100 W' }, unread: [] })
  })

  it('with units beside the labels takes them along', () => {
    expect(read('Length (mm): 305\nCable length [m]: 1.8').values).toEqual({ lengthMm: '305 mm', cordMm: '1.8 m' })
  })

  it('tells the sides of a size apart, whatever their order and unit', () => {
    const sides = { outerLengthMm: '60 cm', outerWidthMm: '45 cm', outerHeightMm: '40 cm' }
    expect(read('Dimensions: 60 x 45 x 40 cm', 'tank').values).toEqual(sides)
    expect(read('Dimensions (H x W x D): 40 × 60 × 45 cm', 'tank').values).toEqual(sides)
    expect(read('Size: 7/8" x 12"').values).toEqual({ lengthMm: '12"', diameterMm: '7/8"' })
  })

  it('reads both ends of a range', () => {
    expect(read('Tank volume: 20-40 gal').values).toEqual({ ratedVolumeMinL: '20 gal', ratedVolumeMaxL: '40 gal' })
  })

  it('takes one measure out of two that say the same', () => {
    expect(read('Length: approx. 12 in (305 mm)').values).toEqual({ lengthMm: '12 in' })
  })

  it('reads mains voltages as the outlets that they fit', () => {
    expect(read('Voltage: 100-240 V').values).toEqual({ volts: '100,120,230' })
    expect(read('Voltage: 110 V').values).toEqual({ volts: '120' })
  })

  it('names the piece too', () => {
    expect(read('Manufacturer: Invented Works\nModel: Ember 100\nEAN: 2000000000015').values).toEqual({
      brand: 'Invented Works',
      model: 'Ember 100',
      gtin: '2000000000015',
    })
  })

  it('keeps the first of two lines for one field and lists the other', () => {
    expect(read('Length: 12 in\nLength: 13 in')).toEqual({ values: { lengthMm: '12 in' }, unread: ['Length: 13 in'] })
  })

  it('refuses what a field cannot be: the line is listed instead', () => {
    expect(read('Length: 20 gal\nPower: plenty')).toEqual({ values: {}, unread: ['Length: 20 gal', 'Power: plenty'] })
  })

  it('loses no line and throws at none', () => {
    fc.assert(
      fc.property(fc.string({ maxLength: 200 }), fc.constantFrom(...kindKeys), (text, kind) => {
        const { mapped, unread } = readPasted(text, kind, 'metric')
        expect(new Set(mapped.map(({ key }) => key)).size).toBe(mapped.length)
        if (/[a-z0-9]/i.test(text.replace(/<[^>]*>?|&\w+;/g, '')))
          expect(mapped.length + unread.length).toBeGreaterThan(0)
      }),
    )
  })
})
