import type { ReactNode } from 'react'
import { useQuery, useSuspenseQuery } from '@tanstack/react-query'
import { Link, useLocation } from 'react-router-dom'
import { isKindKey } from '#shared/kinds/index'
import type { Revision, RevisionList as Revisions } from '#shared/schemas/gear'
import { ErrorState } from '../../../components/ui/error-state'
import { LoadingBlock } from '../../../components/ui/loading-block'
import { Skeleton } from '../../../components/ui/skeleton'
import { paths } from '../../../config/paths'
import { useApp } from '../../../lib/app-context'
import { toApiError } from '../../../lib/problem'
import { usePrinter } from '../../../lib/use-printer'
import { gearQuery } from '../api/get-gear'
import { revisionQuery } from '../api/get-revision'
import { revisionsQuery } from '../api/get-revisions'
import { findRevisionChanges } from '../find-revision-changes'
import { readComparedRevisions } from '../read-compared-revisions'
import { RevisionChanges } from './revision-changes'
import { RevisionChooser } from './revision-chooser'
import { RevisionList } from './revision-list'

function useRevision(slug: string, number: number) {
  const { api } = useApp()
  return useQuery({ ...revisionQuery(api, slug, number), enabled: number > 0 })
}

function SideBySide({ revisions: { slug, items } }: { readonly revisions: Revisions }) {
  const printer = usePrinter()
  const { search } = useLocation()
  const compared = readComparedRevisions(new URLSearchParams(search), items[0]?.number ?? 1)
  const before = useRevision(slug, compared.before)
  const after = useRevision(slug, compared.after)
  const failed = before.error ?? after.error
  const isReady = after.data && (compared.before === 0 || before.data)
  const show = (later: Revision) => {
    const kind = isKindKey(later.kind) ? later.kind : null
    const changes = kind === null ? [] : findRevisionChanges(kind, before.data ?? null, later)
    return <RevisionChanges changes={changes} printer={printer} {...compared} />
  }
  return (
    <section className="mt-8" aria-labelledby="side-by-side">
      <h2 id="side-by-side">
        {compared.before === 0
          ? `What revision ${compared.after} says`
          : `What changed from revision ${compared.before} to ${compared.after}`}
      </h2>
      {items.length > 1 ? (
        <RevisionChooser slug={slug} revisions={items} compared={compared} />
      ) : (
        <p className="mt-1 max-w-prose text-ink-soft">
          There is one revision so far: nothing has been changed since the piece was recorded.
        </p>
      )}
      {failed ? (
        <ErrorState
          title={toApiError(failed).title}
          onRetry={() => {
            void before.refetch()
            void after.refetch()
          }}
        >
          {toApiError(failed).message}
        </ErrorState>
      ) : isReady && after.data ? (
        show(after.data)
      ) : (
        <LoadingBlock label="Loading both revisions">
          <Skeleton className="mt-3 h-40 w-full" />
        </LoadingBlock>
      )}
    </section>
  )
}

export interface HistoryPageProps {
  readonly slug: string
  /** What can be done with the revisions. */
  readonly children?: ReactNode
}

/** Every approved state of a piece, and any two of them side by side. */
export function HistoryPage({ slug, children }: HistoryPageProps) {
  const { api } = useApp()
  const { data: gear } = useSuspenseQuery(gearQuery(api, slug))
  const { data: revisions } = useSuspenseQuery(revisionsQuery(api, slug))
  const kind = isKindKey(gear.kind) ? gear.kind : null
  return (
    <>
      <p className="text-sm text-ink-soft">
        <Link to={paths.gear(slug)} className="link">
          {gear.brand} {gear.model}
        </Link>
      </p>
      <h1 className="mt-1">History</h1>
      <p className="mt-2 max-w-prose">
        Nothing is overwritten: every approved state stays, with who told it and what backs it.
      </p>
      <SideBySide revisions={revisions} />
      {kind && <RevisionList kind={kind} revisions={revisions.items} slug={slug} />}
      {children}
    </>
  )
}
