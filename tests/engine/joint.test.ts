import { describe, expect, it } from 'vitest'
import { fit } from '#shared/engine/fit'
import { item, piece, wholeSetup } from './build'

const page = { limit: 10, offset: 0 }
const kit = (slug: string, parameters: readonly string[] | undefined, more: Readonly<Record<string, unknown>> = {}) =>
  piece('test-kit', { parameters, madeFor: ['reef'], testsEach: 50, ...more }, slug)

const singles = [kit('nitrite', ['nitrite']), kit('ammonia', ['ammonia']), kit('nitrate', ['nitrate', 'phosphate'])]

describe('test kits that only together measure what the cycle takes', () => {
  it('are one answer of several pieces, which fits and comes first', () => {
    const { answers, counts, total } = fit(wholeSetup(), 'test-kit', singles, page)
    expect(answers[0]).toMatchObject({ verdict: 'fits', gear: null, knockOns: [] })
    expect(answers[0]?.pieces.map(({ gear, quantity }) => [gear?.slug, quantity])).toEqual([
      ['nitrite', 1],
      ['ammonia', 1],
      ['nitrate', 1],
    ])
    expect(answers[0]?.summary).toContain(
      'Three together: Inventmark nitrite, Inventmark ammonia and Inventmark nitrate',
    )
    expect(answers[0]?.specs['parameters']?.value).toEqual(['nitrite', 'ammonia', 'nitrate', 'phosphate'])
    expect(counts).toEqual({ fits: 1, changes: 3, no: 0, unknown: 0 })
    expect([answers.length, total]).toEqual([4, 4])
  })

  it('are as few as will do: two, where a kit measures two', () => {
    const pieces = [...singles, kit('pair', ['ammonia', 'nitrite'])]
    const [first] = fit(wholeSetup(), 'test-kit', pieces, page).answers
    expect(first?.pieces.map(({ gear }) => gear?.slug)).toEqual(['nitrate', 'pair'])
  })

  it('complete what the kits of the setup leave out', () => {
    const setup = wholeSetup({}, { items: [item('kit', kit('there', ['ammonia']))] })
    const [first] = fit(setup, 'test-kit', singles, page).answers
    expect(first?.pieces.map(({ gear }) => gear?.slug)).toEqual(['nitrite', 'nitrate'])
  })

  it('are not looked for where one kit does it alone, where one is missing, or where all together do not', () => {
    const count = (pieces: typeof singles, items: Parameters<typeof item>[1][] = []) =>
      fit(
        wholeSetup({}, { items: items.map((what, index) => item(`kit-${index}`, what)) }),
        'test-kit',
        pieces,
        page,
      ).answers.filter(({ pieces: found }) => found.length > 1).length
    expect(count([...singles, kit('all', ['ammonia', 'nitrite', 'nitrate'])])).toBe(0)
    expect(count(singles.slice(0, 2))).toBe(0)
    expect(count(singles, [kit('there', ['ammonia', 'nitrite'])])).toBe(0)
  })

  it('leave out kits for fresh water, and those of which nobody recorded what they measure', () => {
    const fresh = kit('fresh', ['ammonia'], { madeFor: ['freshwater'] })
    const pieces = [fresh, singles[0]!, singles[2]!, kit('blank', undefined)]
    expect(fit(wholeSetup(), 'test-kit', pieces, page).answers.every(({ pieces: found }) => found.length === 1)).toBe(
      true,
    )
  })

  it('keep their place from page to page', () => {
    const all = fit(wholeSetup(), 'test-kit', singles, page).answers
    const paged = [0, 1, 2, 3].flatMap((offset) => fit(wholeSetup(), 'test-kit', singles, { limit: 1, offset }).answers)
    expect(paged).toEqual(all)
  })
})
