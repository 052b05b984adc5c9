import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { squash, toTokens } from '../../shared/search/normalise'
import { expandMeasure, writeMeasureTerms } from '../../shared/search/unit-words'

describe('the one spelling of names and questions', () => {
  it.each([
    ['Ember 100 W', 'ember 100w'],
    ['100 watts', '100w'],
    ['0,15 kW', '0.15kw'],
    ['½"', '0.5in'],
    ['1/2in', '0.5in'],
    ['1 1/2 inches', '1.5in'],
    ['4¼″', '4.25in'],
    ['13 mm', '13mm'],
    ['1,000 L/h', '1000lph'],
    ['10 gallons per hour', '10gph'],
    ['25 °C', '25c'],
    ['20 lbs', '20lb'],
    ['T-90', 't90'],
    ['RO/DI', 'ro di'],
    ['NH₃', 'nh3'],
    ['60 × 45', '60 45'],
    ['60cm x 45 cm', '60cm 45cm'],
    ['Ærø Łódź Straße', 'aero lodz strasse'],
    ['ＥＭＢＥＲ', 'ember'],
    ['!!! ???', ''],
  ])('of %j is %j', (text, tokens) => {
    expect(toTokens(text).join(' ')).toBe(tokens)
  })

  it('makes one code of a model however its parts are joined', () => {
    expect(new Set(['T-90', 't90', 'T 90', 'T–90', 'T.90'].map(squash))).toEqual(new Set(['t90']))
  })

  it('never throws, and leaves only small letters and digits', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'binary', maxLength: 300 }), (text) => {
        const tokens = toTokens(text)
        expect(tokens.every((token) => /^[\p{L}\p{N}.]+$/u.test(token))).toBe(true)
        expect(tokens.join(' ')).not.toMatch(/\p{Lu}/u)
      }),
    )
  })

  it('takes no longer for 10 000 characters than for a few hundred', () => {
    for (const hard of [
      '1 '.repeat(5000),
      '1/2'.repeat(3000),
      '"'.repeat(10_000),
      '9'.repeat(10_000),
      'a-1'.repeat(3000),
    ]) {
      const before = performance.now()
      toTokens(hard)
      expect(performance.now() - before).toBeLessThan(200)
    }
  })
})

describe('measures', () => {
  // 1 in = 25.4 mm and 1 US gal = 3.785411784 L by definition (NIST Handbook 44, appendix C).
  it.each([
    [254, 'mm', ['254mm', '10in']],
    [75.708, 'L', ['76l', '20gal']],
    [100, 'W', ['100w']],
    [9.07, 'kg', ['9kg', '20lb']],
    [12.7, 'mm', ['13mm', '0.5in']],
  ] as const)('of %d %s read in both systems', (value, unit, terms) => {
    expect(writeMeasureTerms(value, unit)).toEqual(terms)
  })

  it('meet in a common spelling whichever unit was typed', () => {
    for (const typed of ['25.4cm', '10in', '254mm']) expect(expandMeasure(typed)).toContain('10in')
    expect(expandMeasure('0.5kw')).toContain('500w')
    expect(expandMeasure('h10')).toEqual(['h10'])
  })
})
