import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { setupFields } from '#shared/kinds/setup-fields'
import { readVisit } from '../../../src/features/finder/link/read-visit'

const read = (query: string, system: 'us' | 'metric' = 'us') => readVisit(new URLSearchParams(query), system)

describe('the address of the finder', () => {
  it('turns a question into a setup, keeps the question, and is then at rest', () => {
    const asked = read('q=heater for a 20 gallon with a 4 x 5 x 12 inch rear chamber, room gets down to 60 F')
    expect(asked.redirect).toBeDefined()
    const settled = read(asked.redirect!)
    expect(settled.redirect).toBeUndefined()
    expect(settled.state.kind).toBe('heater')
    expect(settled.state.asked).toMatch(/^heater for a 20 gallon/)
    expect(settled.problems).toEqual([])
    // 20 US gal of 231 cubic inches and an inch of 25.4 mm, exactly (NIST SP 811, appendix B.8); 60 °F is 140/9 °C.
    expect((settled.setup.tank as { volumeL: number }).volumeL).toBeCloseTo(75.70823568, 6)
    expect((settled.setup.tank as { chambers: object[] }).chambers).toEqual([
      { id: 'rear-1', lengthMm: 101.6, widthMm: 127, waterDepthMm: 304.8 },
    ])
    expect((settled.setup.room as { coldestC: number }).coldestC).toBeCloseTo(140 / 9, 9)
  })

  it('takes a bare number of a link as millimetres, and of a plain form in the person’s own unit', () => {
    const inLink = read('kind=heater&tank.outerLengthMm=610')
    expect(inLink.setup.tank).toMatchObject({ outerLengthMm: 610 })
    const typed = read('kind=heater&typed=us&tank.outerLengthMm=24')
    expect(typed.redirect).toContain('tank.outerLengthMm=24%20in')
    expect(read(typed.redirect!).setup.tank).toMatchObject({ outerLengthMm: 609.6 })
  })

  it('keeps what cannot be read as it was typed, names it, and still reads the rest', () => {
    const { problems, state, setup } = read('kind=heater&tank.volumeL=20 gal&room.coldestC=chilly')
    expect(problems.map(({ path, text }) => [path, text])).toEqual([['room.coldestC', 'chilly']])
    expect(state.raw['room.coldestC']).toBe('chilly')
    expect(setup.tank).toMatchObject({ volumeL: 75.70823568 })
  })

  it('lets a new question add to the setup, and replace its chambers as a whole', () => {
    const before = 'kind=heater&tank.volumeL=20 gal&tank.chambers.0.lengthMm=3 in&tank.chambers.1.lengthMm=6 in'
    const { redirect } = read(`${before}&q=heater, rear chamber 5 x 5 x 10 in`)
    const { state } = read(redirect!)
    expect(state.raw['tank.volumeL']).toBe('20 gal')
    expect(state.raw['tank.chambers.0.lengthMm']).toMatch(/^5/)
    expect(Object.keys(state.raw).some((path) => path.startsWith('tank.chambers.1.'))).toBe(false)
  })

  it('keeps what a question asks of the piece itself as wishes, which the answers are narrowed by', () => {
    const { redirect } = read('q=titanium heater under 200 W for a 20 gallon')
    const { state, filters, problems } = read(redirect!)
    expect(redirect).toContain('wish.powerW=..200')
    expect(state.wishes).toMatchObject({ powerW: '..200' })
    expect(filters).toMatchObject({ powerW: [null, 200], form: 'titanium-rod' })
    expect(problems).toEqual([])
  })

  it('drops the wishes for one kind where a form asks for another, and keeps them otherwise', () => {
    expect(read('kind=light&of=heater&wish.powerW=..200').state.wishes).toEqual({})
    expect(read('kind=heater&of=heater&wish.powerW=..200').filters).toEqual({ powerW: [null, 200] })
  })

  it.each([
    ['wish.powerW=lots', /power.*must be a range/],
    ['wish.powerW=200..100', /power.*lower end/],
    ['wish.shininess=high', /shininess.*is not a filter/],
    ['wish.brand=Anyone', /brand.*is no measure/],
    ['wish.form=titanium-rod,glass-rod', /must be one value/],
  ])('names a wish that cannot be granted: %s', (query, words) => {
    const { problems, filters } = read(`kind=heater&${query}`)
    expect(problems.map(({ path, detail }) => `${path} ${detail}`).join()).toMatch(words)
    expect(filters).toEqual({})
  })

  it('falls back to heaters for an unknown kind and passes over a forged view', () => {
    const { state } = read('kind=dragon&show=everything&check=DROP TABLE&picked=../../etc')
    expect(state).toMatchObject({ kind: 'heater', opened: null, picked: null })
  })

  it('comes to rest after one redirect whatever the address holds', () => {
    const keys = fc.constantFrom(
      ...setupFields.map(({ path }) => path.replace('*', '0')),
      ...[
        'q',
        'kind',
        'asked',
        'show',
        'check',
        'picked',
        'more',
        'cursor',
        'typed',
        'units',
        'utm',
        'tank.nope',
        'of',
        'wish.powerW',
        'wish.nope',
      ],
    )
    const texts = fc.oneof(
      fc.constantFrom('20 gal', '4 1/2 in', '60F', 'us', 'metric', 'heater', 'no', 'soft,lps', '50%', '<b>', '1e99'),
      fc.string({ maxLength: 30 }),
    )
    fc.assert(
      fc.property(fc.array(fc.tuple(keys, texts), { maxLength: 8 }), (entries) => {
        const first = readVisit(new URLSearchParams(entries), 'us')
        if (first.redirect === undefined) return
        expect(read(first.redirect).redirect).toBeUndefined()
      }),
      { numRuns: 300 },
    )
  })

  it('reads ten thousand characters without throwing', () => {
    expect(() => read(`q=${'heater 20 gal '.repeat(720)}`)).not.toThrow()
    expect(read(`kind=heater&name=${'x'.repeat(10_000)}`).problems.length).toBeGreaterThan(0)
  })
})
