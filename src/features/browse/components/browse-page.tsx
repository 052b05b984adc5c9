import { useMemo, useState } from 'react'
import { getKind } from '#shared/kinds/index'
import type { GearItem } from '#shared/schemas/gear'
import { Disclosure } from '../../../components/ui/disclosure'
import { ErrorState } from '../../../components/ui/error-state'
import { LiveStatus } from '../../../components/ui/live-status'
import { toApiError } from '../../../lib/problem'
import { toAddress, useBrowse } from '../hooks/use-browse'
import { useGearPage } from '../hooks/use-gear-page'
import { useMatches } from '../hooks/use-matches'
import { chooseColumns } from '../model/columns'
import { ActiveFilters } from './active-filters'
import { BrowseForm } from './browse-form'
import { ColumnChooser } from './column-chooser'
import { Comparison } from './comparison'
import { FilterFields } from './filter-fields'
import { GearTable } from './gear-table'
import { KindIndex } from './kind-index'
import { ListFooter } from './list-footer'
import { ListSkeleton } from './list-skeleton'
import { NothingFound } from './nothing-found'
import { ProblemNotice } from './problem-notice'

const noItems: GearItem[] = []

/** The catalogue: narrow it down, order it, set pieces side by side. The address holds all of it. */
export function BrowsePage() {
  const browse = useBrowse()
  const { state, visit } = browse
  const { kind, q, filters, compare } = state
  const { page, error, isStale, retry } = useGearPage(state)
  const list = page?.list
  const items = list?.items ?? noItems
  const attributes = useMemo(() => (kind === null ? [] : chooseColumns(kind, state.columns)), [kind, state.columns])
  const matchesOf = useMatches(items, q)
  const isWrongEnd = visit.problems.some(({ end }) => end !== undefined)
  const [isOpen, setIsOpen] = useState(isWrongEnd)

  const plural = kind === null ? 'pieces of gear' : getKind(kind).plural
  const noun = kind === null ? 'piece of gear' : getKind(kind).label
  const count = list && `${list.total} ${list.total === 1 ? noun : plural}`
  const narrowed = Object.keys(filters).length
  const elsewhere = compare.filter((slug) => !items.some((item) => item.slug === slug))
  return (
    <>
      <LiveStatus message={count === undefined || isStale ? '' : `${count} found.`} />
      <h1 className="first-letter:uppercase">{kind === null ? 'Gear' : plural}</h1>
      <p className="mt-1 max-w-prose text-ink-soft">
        {kind === null
          ? 'Every piece that somebody has measured or looked up, with where each number is from.'
          : 'What is known of each, as measured or as its maker says. What nobody has recorded says so.'}
      </p>
      <div className="mt-6">
        <BrowseForm browse={browse}>
          {elsewhere.map((slug) => (
            <input key={slug} type="hidden" name="compare" value={slug} />
          ))}
          <div className="mt-5 border-b border-rule">
            <Disclosure
              summary={narrowed === 0 ? 'Narrow down' : `Narrow down (${narrowed} in use)`}
              isOpen={isOpen || isWrongEnd}
              onToggle={setIsOpen}
            >
              <FilterFields key={kind} browse={browse} facets={list?.facets} />
            </Disclosure>
            {kind !== null && (
              <Disclosure summary="Columns and rows">
                <ColumnChooser key={kind} browse={browse} kind={kind} />
              </Disclosure>
            )}
          </div>
        </BrowseForm>
      </div>
      <ActiveFilters browse={browse} />
      <ProblemNotice browse={browse} isRestarted={page?.isRestarted ?? false} />
      {kind === null && q === '' && narrowed === 0 && <KindIndex facets={list?.facets} />}
      {compare.length > 0 && <Comparison browse={browse} items={items} />}
      <section aria-label="The list" className="mt-8">
        <p className="mb-2 text-sm">
          {count !== undefined && <strong className="font-semibold">{count}</strong>}
          {items.length > 0 && compare.length === 0 && (
            <span className="text-ink-soft print:hidden"> · tick up to four to set them side by side</span>
          )}
        </p>
        {error && !list ? (
          <ErrorState title={toApiError(error).title} onRetry={retry} retryHref={toAddress(state)}>
            {toApiError(error).message} What you chose is kept in the address of this page.
          </ErrorState>
        ) : list === undefined ? (
          <ListSkeleton />
        ) : items.length === 0 ? (
          <NothingFound browse={browse} list={list} />
        ) : (
          <>
            <GearTable
              browse={browse}
              items={items}
              attributes={attributes}
              caption={kind === null ? 'Gear of every kind' : `Catalogue of ${plural}`}
              isStale={isStale}
              matchesOf={matchesOf}
            />
            {list.hint !== null && <p className="mt-2 text-sm text-ink-soft">{list.hint}</p>}
            <ListFooter
              browse={browse}
              list={list}
              attributes={attributes}
              pageNumber={page?.isRestarted ? 1 : (state.from?.page ?? 1)}
            />
          </>
        )}
      </section>
    </>
  )
}
