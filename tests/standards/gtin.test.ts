import { describe, expect, it } from 'vitest'
import { computeGtinCheckDigit, gtinSchema, isGtin, padGtin } from '#shared/schemas/gtin'

describe('check digit of a GTIN, GS1 General Specifications section 7.9', () => {
  it.each([
    ['629104150021', 3, 'GS1, “How to calculate a check digit manually”'],
    ['730001100001', 7, 'GS1 Sweden'],
    ['890400021003', 7, 'GS1 India'],
    ['4098765000022', 3, 'a GTIN-14 computed by the same rule'],
    ['950110153000', 3, 'GS1 General Specifications'],
  ])('of %s is %d (%s)', (digits, checkDigit) => {
    expect(computeGtinCheckDigit(digits)).toBe(checkDigit)
    expect(isGtin(`${digits}${checkDigit}`)).toBe(true)
  })

  it('is right for 8 and 12 digits and is missed where one digit is wrong', () => {
    // Computed by the rule: UPC-A 036000291452 and GTIN-8 73513537 are the usual textbook examples.
    expect(isGtin('036000291452')).toBe(true)
    expect(isGtin('73513537')).toBe(true)
    expect(isGtin('6291041500214')).toBe(false)
    for (let digit = 0; digit <= 9; digit++) expect(isGtin(`03600029145${digit}`)).toBe(digit === 2)
  })

  it.each(['', '1234567', '123456789', '629104150021O', ' 6291041500213', '6291041500213\n', '٦٢٩١٠٤١٥'])(
    'does not make a GTIN of %o',
    (text) => {
      expect(isGtin(text)).toBe(false)
      expect(gtinSchema.safeParse(text).success).toBe(false)
    },
  )

  it('compares GTINs of different lengths as 14 digits', () => {
    expect(padGtin('036000291452')).toBe(padGtin('0036000291452'))
  })
})
