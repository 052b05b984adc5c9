import { useQueries } from '@tanstack/react-query'
import { getKind, isKindKey } from '#shared/kinds/index'
import type { Gear } from '#shared/schemas/gear'
import type { RawSetup } from '../../../components/setup/edit-raw'
import { gearEntryQuery } from '../../../components/setup/gear-entry'
import { listItems } from '../../../components/setup/items-raw'
import { useApp } from '../../../lib/app-context'
import { describeSpecs } from '../../../lib/describe-specs'
import { usePrinter } from '../../../lib/use-printer'
import { capitalise } from '../../../lib/capitalise'

export interface NamedItem {
  readonly name: string
  readonly about?: string
}

export interface NamedItems {
  readonly of: (id: string) => NamedItem
  readonly tank: Gear | undefined
}

/** Slugs that a setup's link names, its tank's with them. */
export const listSlugs = (raw: RawSetup): readonly string[] => [
  ...new Set([raw['tank.gear'], ...listItems(raw).map(({ slug }) => slug)].filter((slug) => typeof slug === 'string')),
]

/** What the pieces of a setup are called: by the catalogue, else by their kind. */
export function useNamedItems(raw: RawSetup): NamedItems {
  const { api } = useApp()
  const printer = usePrinter()
  const slugs = listSlugs(raw)
  const entries = useQueries({ queries: slugs.map((slug) => gearEntryQuery(api, slug)) })
  const bySlug = new Map(slugs.map((slug, at) => [slug, entries[at]?.data]))
  const items = new Map(listItems(raw).map((item) => [item.id, item]))
  return {
    tank: bySlug.get(raw['tank.gear'] ?? ''),
    of: (id) => {
      const item = items.get(id)
      const entry = bySlug.get(item?.slug ?? '')
      const about = entry && isKindKey(entry.kind) && describeSpecs(entry.kind, entry.specs, printer)
      const kind = item?.kind ? getKind(item.kind).label : id
      const name = entry ? `${entry.brand} · ${entry.model}` : (item?.slug ?? capitalise(kind))
      return { name, ...(about && { about: `${capitalise(kind)}: ${about}` }) }
    },
  }
}
