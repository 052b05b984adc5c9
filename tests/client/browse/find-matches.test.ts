import { describe, expect, it } from 'vitest'
import { findMatches } from '../../../src/features/browse/model/find-matches'

const named = [
  { slug: 'a', name: 'Madeup Warm 100' },
  { slug: 'b', name: 'Invented Cold 25' },
]

const mark = (text: string, slug = 'a') => {
  const { name } = named.find((each) => each.slug === slug) ?? { name: '' }
  return (findMatches(named, text).get(slug) ?? []).map(({ start, end }) => name.slice(start, end))
}

describe('marks in names', () => {
  it('stand on each word that was searched for, in any order', () => {
    expect(mark('100 madeup')).toEqual(['Madeup', '100'])
  })

  it('stand on what a slip was meant for, and on nothing else', () => {
    expect(mark('madeep').join('')).toMatch(/^Made/)
    expect(mark('madeup', 'b')).toEqual([])
    expect(mark('')).toEqual([])
  })

  it('never overlap and are in order', () => {
    const spans = findMatches(named, 'madeup made warm arm 100 00').get('a') ?? []
    expect(spans.every(({ start, end }, at) => start < end && start > (spans[at - 1]?.end ?? -1))).toBe(true)
  })
})
