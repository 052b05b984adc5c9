import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { kindKeys, kinds, type KindKey } from '#shared/kinds/index'
import { limits } from '#shared/limits'
import { listFilterable, listSorts, readGearFilters } from '#shared/schemas/gear-filters'
import type { UnitSystem } from '#shared/units/systems'
import {
  emptyState,
  mostCompared,
  nextSort,
  ownKeys,
  withComparison,
  withoutFilter,
  writeApiQuery,
  writeBrowseState,
  type BrowseState,
} from '../../../src/features/browse/link/browse-state'
import { readVisit } from '../../../src/features/browse/link/read-visit'
import { listColumns } from '../../../src/features/browse/model/columns'
import { firstColumns } from '../../../src/features/browse/model/first-columns'

const read = (query: string, system: UnitSystem = 'us') => readVisit(new URLSearchParams(query), system)

const measures = (kind: KindKey) => listFilterable(kind).filter(({ type }) => type === 'measure')

/** Any state that the page can be brought to. */
const states: fc.Arbitrary<BrowseState> = fc.constantFrom(...kindKeys).chain((kind) => {
  const range = fc
    .tuple(fc.option(fc.integer({ min: 0, max: 5000 })), fc.option(fc.integer({ min: 5001, max: 90000 })))
    .filter(([from, to]) => from !== null || to !== null)
    .map(([from, to]) => `${from ?? ''}..${to ?? ''}`)
  const filters = fc
    .uniqueArray(fc.constantFrom(...listFilterable(kind)), { maxLength: 3 })
    .chain((attributes) =>
      fc.tuple(
        ...attributes.map((attribute) =>
          attribute.type === 'measure'
            ? fc.tuple(fc.constant(attribute.key), fc.oneof(range, fc.constant('unknown')))
            : fc.tuple(
                fc.constant(attribute.key),
                attribute.type === 'boolean'
                  ? fc.constantFrom('true', 'false', 'unknown')
                  : fc
                      .subarray(
                        attribute.options.map(({ value }) => value),
                        { minLength: 1 },
                      )
                      .map((list) => list.join(',')),
              ),
        ),
      ),
    )
    .map((entries) => Object.fromEntries(entries) as Record<string, string>)
  return fc.record({
    kind: fc.constant(kind),
    q: fc.constantFrom('', 'ember 100', 'häfen & co', '100%_\\'),
    filters,
    sort: fc.constantFrom(null, ...listSorts(kind).filter((sort) => sort !== 'relevance')),
    columns: fc.constant(null),
    density: fc.constantFrom('comfortable' as const, 'compact' as const),
    compare: fc.uniqueArray(fc.constantFrom('a-1', 'b-2', 'c', 'd-4'), { maxLength: 4 }),
    from: fc.option(fc.record({ cursor: fc.constant('eyJ4Ijox'), page: fc.integer({ min: 2, max: 40 }) })),
  })
})

describe('the address of the catalogue', () => {
  it('holds every state: written and read again it is the same, and spelt the same', () => {
    fc.assert(
      fc.property(states, fc.constantFrom<UnitSystem>('us', 'metric'), (state, system) => {
        const address = writeBrowseState(state)
        const visit = read(address, system)
        expect(visit.state).toEqual(state)
        expect(visit.problems).toEqual([])
        expect(visit.redirect).toBeUndefined()
      }),
    )
  })

  it('asks the API only what the API can read', () => {
    fc.assert(
      fc.property(states, (state) => {
        const texts = Object.fromEntries(new URLSearchParams(writeApiQuery(state)))
        const own: readonly string[] = ['kind', 'q', 'sort', 'cursor']
        const filters = Object.fromEntries(Object.entries(texts).filter(([key]) => !own.includes(key)))
        expect(readGearFilters(state.kind ?? undefined, filters).issues).toEqual([])
      }),
    )
  })

  it('settles after one redirect, whatever somebody writes into it', () => {
    const key = fc.oneof(
      fc.constantFrom(...ownKeys, 'of', 'powerW', 'powerW.from', 'powerW.to', 'lengthMm.from', 'form', 'brand', 'zzz'),
      fc.string({ maxLength: 8 }),
    )
    const text = fc.oneof(
      fc.string({ unit: 'binary', maxLength: 12 }),
      fc.constantFrom(
        'heater',
        'tank',
        '50..150',
        '150..50',
        '10 in',
        'soon',
        'unknown',
        'glass-rod',
        '-powerW',
        '',
        '..',
      ),
    )
    fc.assert(
      fc.property(fc.array(fc.tuple(key, text), { maxLength: 8 }), (pairs) => {
        const first = read(new URLSearchParams(pairs).toString())
        const second = read(first.redirect ?? new URLSearchParams(pairs).toString())
        expect(second.redirect).toBeUndefined()
        expect(second.state).toEqual(first.state)
      }),
      { numRuns: 400 },
    )
  })

  it('takes a form’s ends of a range in the visitor’s own unit, or in any that is typed', () => {
    // NIST SP 811, B.8: 1 in = 25.4 mm exactly.
    expect(read('kind=heater&lengthMm.from=10&lengthMm.to=1+ft').redirect).toBe('kind=heater&lengthMm=254..304.8')
    expect(read('kind=heater&lengthMm.from=250&lengthMm.to=', 'metric').redirect).toBe('kind=heater&lengthMm=250..')
    expect(read('kind=heater&lengthMm.from=&lengthMm.to=').redirect).toBe('kind=heater')
  })

  it('keeps an end that cannot be read, uses the other, and says why', () => {
    const { state, problems, redirect } = read('kind=heater&lengthMm.from=10&lengthMm.to=soon')
    expect(state.filters).toEqual({ lengthMm: '254..' })
    expect(problems).toEqual([expect.objectContaining({ key: 'lengthMm', end: 'to', text: 'soon' })])
    expect(redirect).toBe('kind=heater&lengthMm=254..&lengthMm.to=soon')
    expect(read(redirect ?? '').redirect).toBeUndefined()
  })

  it('joins the choices that a form sends one by one', () => {
    expect(read('kind=heater&form=glass-rod&form=titanium-rod').redirect).toBe(
      'kind=heater&form=glass-rod,titanium-rod',
    )
  })

  it('explains both ends of a range that nothing can pass, in the visitor’s unit', () => {
    const { state, problems } = read('kind=heater&lengthMm=304.8..254')
    expect(state.filters).toEqual({})
    expect(problems[0]?.detail).toBe('nothing is at least 12\u00a0in and at most 10\u00a0in at once')
  })

  it('names filters, kinds and orders that do not exist, and shows the rest', () => {
    const { state, problems } = read('kind=heater&wattage=5&sort=colour&powerW=..100')
    expect(state).toEqual({ ...emptyState, kind: 'heater', filters: { powerW: '..100' } })
    expect(problems.map(({ key }) => key)).toEqual(['wattage', 'sort'])
    expect(read('kind=toaster').problems).toEqual([expect.objectContaining({ key: 'kind', text: 'toaster' })])
  })

  it('lets go of one kind’s filters, order and columns when another kind is chosen in the form', () => {
    const { state, problems } = read(
      'of=heater&kind=tank&q=reef&powerW.from=50&form=glass-rod&sort=-powerW&cols=form&brand=Invented',
    )
    expect(problems).toEqual([])
    expect(state).toEqual({ ...emptyState, kind: 'tank', q: 'reef', filters: { brand: 'Invented' } })
  })

  it('compares no more than four, and says so', () => {
    const { state, problems, redirect } = read('compare=a,b,c,d,e')
    expect(state.compare).toEqual(['a', 'b', 'c', 'd'])
    // Whoever is sent elsewhere would never read why.
    expect(redirect).toBeUndefined()
    expect(problems.map(({ key }) => key)).toEqual(['compare'])
  })

  it('cuts what is searched for to what the API takes, and drops what no text holds', () => {
    expect(read(`q=${'a'.repeat(500)}`).state.q).toHaveLength(limits.searchText)
    expect(read('q=%00').state.q).toBe('')
  })

  it('says nothing of columns that are the usual ones', () => {
    const usual = firstColumns.heater.map((key) => `cols=${key}`).join('&')
    expect(read(`kind=heater&${usual}`).redirect).toBe('kind=heater')
    expect(read('kind=heater&cols=powerW&cols=volts').redirect).toBe('kind=heater&cols=powerW,volts')
  })
})

describe('steps from one state to another', () => {
  it('orders up, then down, then as it was', () => {
    expect([nextSort(null, 'powerW'), nextSort('powerW', 'powerW'), nextSort('-powerW', 'powerW')]).toEqual([
      'powerW',
      '-powerW',
      null,
    ])
  })

  it('goes back to the beginning of the list when a filter is let go of', () => {
    const state = { ...emptyState, filters: { powerW: '..5', form: 'x' }, from: { cursor: 'c', page: 3 } }
    expect(withoutFilter(state, 'powerW')).toEqual({ ...emptyState, filters: { form: 'x' } })
    expect(withoutFilter({ ...state, q: 'x', sort: 'relevance' }, 'q')).toMatchObject({ q: '', sort: null, from: null })
  })

  it('puts a piece beside others once, up to four', () => {
    const five = ['a', 'b', 'c', 'd', 'e'].reduce((state, slug) => withComparison(state, slug, true), emptyState)
    expect(five.compare).toHaveLength(mostCompared)
    expect(withComparison(five, 'b', false).compare).toEqual(['a', 'c', 'd'])
  })
})

describe('the keys of the address', () => {
  it.each(kindKeys)('mean one thing each for %s', (kind) => {
    const reserved: readonly string[] = [...ownKeys, 'of', 'limit', 'brand', 'status']
    expect(kinds[kind].attributes.filter(({ key }) => reserved.includes(key))).toEqual([])
    expect(measures(kind).filter(({ key }) => key.includes('.'))).toEqual([])
  })

  it.each(kindKeys)('name columns that %s has, at most six at first', (kind) => {
    const keys = listColumns(kind).map(({ key }) => key)
    expect(firstColumns[kind].filter((key) => !keys.includes(key))).toEqual([])
    expect(new Set(firstColumns[kind]).size).toBe(firstColumns[kind].length)
    expect(firstColumns[kind].length).toBeGreaterThan(0)
    expect(firstColumns[kind].length).toBeLessThanOrEqual(6)
  })
})
