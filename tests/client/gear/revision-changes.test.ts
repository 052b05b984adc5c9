import { describe, expect, it } from 'vitest'
import type { Provenance } from '#shared/schemas/gear'
import { findRevisionChanges } from '../../../src/features/gear/find-revision-changes'
import { readComparedRevisions } from '../../../src/features/gear/read-compared-revisions'

const told = (change: Partial<Provenance> = {}): Provenance => ({
  source: 'maker',
  date: '2025-01-01',
  author: 'somebody',
  revision: 1,
  ...change,
})

const first = {
  specs: { powerW: 100, lengthMm: 250, volts: [120] },
  provenance: { powerW: told(), lengthMm: told(), volts: told() },
}

describe('what a revision changed', () => {
  it('is every value that differs, that came and that went, as the kind orders them', () => {
    const second = {
      specs: { powerW: 97, diameterMm: 24, volts: [120] },
      provenance: { powerW: told({ source: 'measured' }), diameterMm: told(), volts: told() },
    }
    const changes = findRevisionChanges('heater', first, second)
    expect(changes.map(({ attribute }) => attribute.key)).toEqual(['lengthMm', 'diameterMm', 'powerW'])
    expect(changes.map(({ before, after }) => [before?.value ?? null, after?.value ?? null])).toEqual([
      [250, null],
      [null, 24],
      [100, 97],
    ])
  })

  it('is also the same value told by somebody else, and says that it is the same', () => {
    const second = { ...first, provenance: { ...first.provenance, powerW: told({ author: 'another', revision: 2 }) } }
    const [change, ...others] = findRevisionChanges('heater', first, second)
    expect(others).toEqual([])
    expect(change).toMatchObject({ isConfirmed: true, after: { value: 100, provenance: { author: 'another' } } })
  })

  it('is not the number of the revision that a value was set by', () => {
    const second = { ...first, provenance: { ...first.provenance, powerW: told({ revision: 2 }) } }
    expect(findRevisionChanges('heater', first, second)).toEqual([])
  })

  it('is everything where there was nothing before', () => {
    expect(findRevisionChanges('heater', null, first).map(({ before }) => before)).toEqual([null, null, null])
  })
})

describe('the revisions that an address sets side by side', () => {
  const read = (query: string, newest = 5) => readComparedRevisions(new URLSearchParams(query), newest)

  it('are the newest and the one before it unless it says otherwise', () => {
    expect(read('')).toEqual({ before: 4, after: 5 })
    expect(read('', 1)).toEqual({ before: 0, after: 1 })
    expect(read('after=3')).toEqual({ before: 2, after: 3 })
    expect(read('before=1&after=4')).toEqual({ before: 1, after: 4 })
  })

  it('stand in order of time, and are always two that there are', () => {
    expect(read('before=4&after=2')).toEqual({ before: 2, after: 4 })
    for (const query of ['after=99', 'before=99&after=x', 'before=5&after=5', 'after=0', 'before=-1'])
      expect(read(query)).toSatisfy(
        ({ before, after }: { before: number; after: number }) => before >= 0 && before < after && after <= 5,
      )
  })
})
