import { squash } from '#shared/search/normalise'
import type { GearFilter } from '#shared/schemas/gear-filters'
import type { CatalogueEntry } from '../catalogue/build-snapshot'
import type { Test } from './gear-facets'

/** Stored in millimetres but typed in inches: 10 in is 254 mm however it was rounded on the way. */
const rounding = 1e-9

function holds(filter: GearFilter, value: unknown): boolean {
  switch (filter.type) {
    case 'unknown':
      return value === undefined
    case 'options':
      return Array.isArray(value)
        ? value.some((each) => filter.values.includes(each as never))
        : filter.values.includes(value as never)
    case 'range': {
      if (typeof value !== 'number') return false
      const slack = Math.abs(value) * rounding
      return (
        (filter.from === null || value >= filter.from - slack) && (filter.to === null || value <= filter.to + slack)
      )
    }
  }
}

/** A filter as a test of one piece. Brands are compared by their letters alone: "halcyrène" is Halcyrene. */
export function toTest(filter: GearFilter): Test {
  const { key } = filter
  if (key === 'brand' && filter.type === 'options') {
    const brands = new Set(filter.values.map((brand) => squash(String(brand))))
    const known = new Map<string, boolean>()
    const passes = ({ gear: { brand } }: CatalogueEntry) => {
      const before = known.get(brand) ?? brands.has(squash(brand))
      known.set(brand, before)
      return before
    }
    return { key, passes }
  }
  if (key === 'status') return { key, passes: ({ status }) => holds(filter, status) }
  return { key, passes: ({ piece }) => holds(filter, piece.specs[key]?.value) }
}
