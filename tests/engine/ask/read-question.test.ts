import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { readQuestion } from '#shared/engine/ask/read-question'
import type { Question } from '#shared/engine/ask/types'
import { getAttribute } from '#shared/kinds/index'
import { findSetupField } from '#shared/kinds/setup-fields'
import { readSetupLink } from '#shared/schemas/setup-link'
import { unitSystems } from '#shared/units/systems'
import { catalogue } from './phrasings/catalogue'
import { hobbyistPhrasings } from './phrasings/hobbyists'
import { piecePhrasings } from './phrasings/pieces'
import { setupPhrasings } from './phrasings/setups'

const phrasings = [...setupPhrasings, ...piecePhrasings, ...hobbyistPhrasings]
const meaningOf = (question: Question, text: string) => question.understood.find((part) => part.text === text)?.meaning
const meanings = (text: string, system: 'us' | 'metric' = 'us') =>
  readQuestion(text, system, catalogue).understood.map(({ meaning }) => meaning)

describe('what it says it understood', () => {
  it('names each part of the main question in plain words, in the order typed', () => {
    expect(meanings('heater for a 20 gallon with a 4 × 5 × 12 inch rear chamber, flat gets down to 60 °F')).toEqual([
      'a heater',
      'tank of 20 gal',
      'chamber 4 × 5 × 12 in',
      'coldest room 60 °F',
    ])
  })

  it('takes what is ruled out for said of nothing, and shows it as not used', () => {
    const hangOn = readQuestion('heater, 40 gal, no hob filter please', 'us')
    expect(hangOn.fields).not.toHaveProperty(['tank.filtration'])
    expect(hangOn.ignored.join(' ')).toContain('hob')
    expect(readQuestion('light for a 24 x 12 x 12 in tank, not acrylic', 'us').fields).not.toHaveProperty([
      'tank.material',
    ])
    expect(readQuestion('heater for a 40 gal tank with no lid', 'us').fields['tank.lid']?.value).toBe('none')
  })

  it('takes how high a pump lifts for the length of nothing', () => {
    const { filters, ignored } = readQuestion('sump 30x12x16 return pump 4ft head', 'us')
    expect(filters).toEqual({})
    expect(ignored.join(' ')).toContain('4ft head')
  })

  it('says which unit it took where none was typed', () => {
    expect(meanings('tank 60 x 45 x 40', 'metric')).toEqual(['tank 60 × 45 × 40 cm (no unit typed, taken as cm)'])
  })

  it('says when it took the longest side of a chamber as its depth', () => {
    expect(meanings('chamber 12 x 4 x 5 in')).toEqual(['chamber 4 × 5 × 12 in (the longest taken as the depth)'])
  })

  it('says that a size called by a name is the trade’s custom', () => {
    expect(meanings('40 breeder')[0]).toContain('as the trade sells')
  })

  it('gives the stretch of the text that each meaning was read from', () => {
    const question = readQuestion('Flat gets down to 60 °F, tank 24 x 18 x 12 in', 'us')
    expect(meaningOf(question, 'Flat gets down to 60 °F')).toBe('coldest room 60 °F')
    expect(meaningOf(question, 'tank 24 x 18 x 12 in')).toBe('tank 24 × 18 × 12 in')
  })

  it('names the setup field that a part filled', () => {
    expect(readQuestion('20 gallons', 'us').understood[0]?.path).toBe('tank.volumeL')
  })

  it('names the piece that it found in the catalogue', () => {
    const { gear, understood } = readQuestion('does the Tidewright Ember T-90 fit', 'us', catalogue)
    expect(gear).toEqual({ slug: 'tidewright-ember-t-90', brand: 'Tidewright', model: 'Ember T-90' })
    expect(understood[0]).toMatchObject({ text: 'Tidewright Ember T-90', meaning: 'Tidewright Ember T-90' })
  })
})

describe('what it says it ignored', () => {
  it.each([
    ['heater for 20 gallons with a snorkel and a unicorn', ['snorkel', 'unicorn']],
    ['heater for 20 gallons, 4.5 stars', ['4.5 stars']],
    ['does the Tidewright Ember T-90 fit', ['Tidewright Ember T-90']],
    ['stand for a 30 breeder', ['30 breeder']],
    ['Hello, could anyone please help me find a good heater? Thanks!', []],
    ['light for 20 gallons, 6500K', ['6500K']],
    ['heater for 20 gallons, 1.500.000 bubbles', ['1.500.000 bubbles']],
    ['tank of 900000 gallons', ['900000 gallons']],
  ])('keeps the words of "%s" that it could not use', (text, ignored) => {
    expect(readQuestion(text, 'us').ignored).toEqual(ignored)
  })

  it('keeps a second answer to what it has already read', () => {
    expect(readQuestion('20 gallons or 30 gallons', 'us').ignored).toEqual(['30 gallons'])
  })
})

describe('what a question gives to the rest', () => {
  it.each(phrasings.map(([text, system]) => [text, system] as const))(
    'fills only fields and attributes that exist from "%s"',
    (text, system) => {
      const { kind, fields, filters } = readQuestion(text, system, catalogue)
      for (const path of Object.keys(fields)) expect(findSetupField(path), path).toBeDefined()
      for (const key of Object.keys(filters))
        expect(kind === null ? undefined : getAttribute(kind, key), key).toBeDefined()
    },
  )

  it.each(phrasings.map(([text, system]) => [text, system] as const))(
    'writes its fields so that a link reads the same values from "%s"',
    (text, system) => {
      const { fields } = readQuestion(text, system, catalogue)
      const { setup, problems } = readSetupLink(
        Object.entries(fields).map(([path, field]) => [path, field.text]),
        system === 'us' ? 'metric' : 'us',
      )
      expect(problems).toEqual([])
      for (const [path, { value }] of Object.entries(fields)) {
        const found = path.split('.').reduce<unknown>((node, word) => (node as Record<string, unknown>)[word], setup)
        if (typeof value === 'number') expect(found as number, path).toBeCloseTo(value, 6)
        else expect(found, path).toEqual(value)
      }
    },
  )
})

const words = phrasings.flatMap(([text]) => text.split(' '))
const anyText = fc.oneof(
  fc.string({ maxLength: 300, unit: 'grapheme' }),
  fc.string({ maxLength: 300, unit: 'binary' }),
  fc.array(fc.constantFrom(...words), { maxLength: 60 }).map((parts) => parts.join(' ')),
  fc
    .array(fc.constantFrom(...words, '½', '×', '-', '"', "'", '°', '/', ',', '1', ' '), { maxLength: 80 })
    .map((parts) => parts.join('')),
)
const anySystem = fc.constantFrom(...unitSystems)

describe('whatever is typed', () => {
  it('never throws, and every part it understood stands in the text where it says', () => {
    fc.assert(
      fc.property(anyText, anySystem, (text, system) => {
        const question = readQuestion(text, system, catalogue)
        for (const part of question.understood) {
          expect(part.start).toBeGreaterThanOrEqual(0)
          expect(part.end).toBeGreaterThan(part.start)
          expect(text.slice(part.start, part.end)).toBe(part.text)
        }
        for (const ignored of question.ignored) expect(text).toContain(ignored)
      }),
      { numRuns: 1500 },
    )
  })

  it('gives only finite numbers, inside what their fields can hold', () => {
    fc.assert(
      fc.property(anyText, anySystem, (text, system) => {
        const { fields, filters } = readQuestion(text, system)
        for (const [path, { value }] of Object.entries(fields)) {
          const attribute = findSetupField(path)?.attribute
          if (attribute?.type !== 'measure') continue
          expect(value).toBeGreaterThanOrEqual(attribute.plausible[0])
          expect(value).toBeLessThanOrEqual(attribute.plausible[1])
        }
        for (const filter of Object.values(filters)) {
          if (!Array.isArray(filter)) continue
          const [low, high] = filter as [number | null, number | null]
          for (const end of [low, high]) if (end !== null) expect(Number.isFinite(end)).toBe(true)
          if (low !== null && high !== null) expect(low).toBeLessThanOrEqual(high)
        }
      }),
      { numRuns: 1000 },
    )
  })

  it('reads the same text the same way twice', () => {
    fc.assert(
      fc.property(anyText, anySystem, (text, system) => {
        expect(readQuestion(text, system, catalogue)).toEqual(readQuestion(text, system, catalogue))
      }),
      { numRuns: 200 },
    )
  })

  it('reads numbers that carry units alike in both systems', () => {
    const length = fc.integer({ min: 20, max: 60 })
    const unit = fc.constantFrom(['in', 25.4], ['inches', 25.4], ['"', 25.4], ['cm', 10], [' cm', 10]) as fc.Arbitrary<
      [string, number]
    >
    fc.assert(
      fc.property(length, length, length, unit, anySystem, (a, b, c, [name, mm], system) => {
        const { fields } = readQuestion(`tank ${a}${name} x ${b}${name} x ${c}${name}`, system)
        expect(fields['tank.outerLengthMm']?.value).toBeCloseTo(a * mm, 6)
        expect(fields['tank.outerWidthMm']?.value).toBeCloseTo(b * mm, 6)
        expect(fields['tank.outerHeightMm']?.value).toBeCloseTo(c * mm, 6)
      }),
    )
  })

  it('reads parts joined in any order as it reads them alone', () => {
    const parts = [
      '20 gallons',
      'chamber 4 x 5 x 12 in',
      'room drops to 60 °F',
      'keep it at 78 °F',
      'rimless',
      'SPS',
      '230 V',
    ] as const
    const alone = parts.map((part) => Object.entries(readQuestion(part, 'us').fields)).flat()
    fc.assert(
      fc.property(
        fc.shuffledSubarray([...parts], { minLength: parts.length }),
        fc.constantFrom('; ', '. ', '\n'),
        (order, join) => {
          expect(readQuestion(order.join(join), 'us').fields).toEqual(Object.fromEntries(alone))
        },
      ),
    )
  })

  it.each([
    ['one word', 'a'.repeat(10_000)],
    ['digits', '1'.repeat(10_000)],
    ['numbers', '1 '.repeat(5000)],
    ['fractions', '1/'.repeat(5000)],
    ['mixed numbers', '1 1/'.repeat(2500)],
    ['a row without end', '4 x '.repeat(2500)],
    ['hyphens', '1-'.repeat(5000)],
    ['chambers', 'chamber 4x5x12 '.repeat(650)],
    ['kinds', 'heater light '.repeat(750)],
    ['feet', '1\' 1" '.repeat(1600)],
    ['spaces', ' '.repeat(10_000)],
    ['number words', 'hundred and '.repeat(800)],
    ['misspellings', Array.from({ length: 1200 }, (_, at) => `heate${String.fromCharCode(97 + (at % 26))}x`).join(' ')],
  ])('takes 10 000 characters of %s in its stride', (_, text) => {
    // Well under a second where time grows with the length; half a minute and more where it grows with its square.
    const started = performance.now()
    readQuestion(text, 'us', catalogue)
    expect(performance.now() - started).toBeLessThan(5000)
  })
})
