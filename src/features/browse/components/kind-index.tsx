import { Link } from 'react-router-dom'
import { kindKeys, kinds } from '#shared/kinds/index'
import type { GearList } from '#shared/schemas/gear'
import { paths } from '../../../config/paths'

/** Every kind with how many pieces there are of it. */
export function KindIndex({ facets }: { readonly facets: GearList['facets'] | undefined }) {
  const facet = facets?.kind
  const counts = facet?.type === 'options' ? facet.counts : undefined
  return (
    <nav aria-label="Kinds of gear" className="mt-8 print:hidden">
      <ul className="grid grid-cols-2 gap-x-8 sm:grid-cols-3 lg:grid-cols-4">
        {kindKeys.map((key) => (
          <li key={key}>
            <Link
              to={`${paths.gearList}?kind=${key}`}
              className="flex min-h-9 items-baseline justify-between gap-3 border-b border-rule py-1.5 hover:border-action hover:text-action"
            >
              <span className="min-w-0 first-letter:uppercase">{kinds[key].plural}</span>
              <span className="font-mono text-xs text-ink-soft">
                {counts?.find(({ value }) => value === key)?.count ?? (counts ? 0 : '')}
              </span>
            </Link>
          </li>
        ))}
      </ul>
    </nav>
  )
}
