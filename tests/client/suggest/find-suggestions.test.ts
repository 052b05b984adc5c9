import { describe, expect, it } from 'vitest'
import type { GearItem } from '#shared/schemas/gear'
import { findSuggestions } from '../../../src/components/suggest/find-suggestions'

const brands = [
  { name: 'Inventéd', count: 3 },
  { name: 'Madeup', count: 1 },
]

const piece: GearItem = {
  slug: 'madeup-warm-100',
  kind: 'heater',
  brand: 'Madeup',
  model: 'Warm 100',
  gtin: null,
  status: 'current',
  revision: 1,
  updatedAt: '2025-03-03T00:00:00.000Z',
  specs: {},
}

const suggest = (text: string, page: 'question' | 'gear' = 'gear') =>
  findSuggestions(text, { page, kind: null }, brands, [])

describe('suggestions while somebody types', () => {
  it('find a kind by the beginning of its name or with a slip in it', () => {
    expect(suggest('heat')[0]).toMatchObject({ id: 'kind-heater', href: '/gear?kind=heater' })
    expect(suggest('wavemakr')[0]?.id).toBe('kind-wavemaker')
  })

  it('ask about a kind in the question box, so that the setup stays, and open its list in the catalogue', () => {
    expect(suggest('heater', 'question')[0]).toMatchObject({ text: 'heater' })
    expect(suggest('heater', 'question')[0]).not.toHaveProperty('href')
  })

  it('find a brand whatever its accents, and say how many pieces it has', () => {
    expect(suggest('invented')).toContainEqual(
      expect.objectContaining({ label: 'Inventéd', detail: '3 pieces', href: '/gear?brand=Invent%C3%A9d' }),
    )
  })

  it('lead from a piece that the search found to its sheet', () => {
    const found = findSuggestions('warm', { page: 'gear', kind: null }, [], [piece])
    expect(found).toContainEqual({
      id: 'piece-madeup-warm-100',
      label: 'Madeup Warm 100',
      detail: 'heater',
      href: '/gear/madeup-warm-100',
    })
  })

  it('keep out of single letters and of sentences', () => {
    expect(suggest('h')).toEqual([])
    expect(suggest('heater for a 20 gallon with a rear chamber of 4 x 5 x 12 inches')).toEqual([])
  })
})
