import { useQueries } from '@tanstack/react-query'
import { Link } from 'react-router-dom'
import { isKindKey, kinds, type KindKey } from '#shared/kinds/index'
import type { GearItem } from '#shared/schemas/gear'
import { paths } from '../../../config/paths'
import { useApp } from '../../../lib/app-context'
import { roleTitles } from '../../../lib/role-titles'
import { comparedPieceQuery } from '../api/compared-piece'
import type { Browse } from '../hooks/use-browse'
import { withComparison } from '../link/browse-state'
import { comparePieces } from '../model/compare-pieces'
import { DifferenceLines } from './difference-lines'
import { DifferenceWords } from './difference-words'
import { letters, PieceLetter } from './piece-letter'

export interface ComparisonProps {
  readonly browse: Browse
  /** Rows that are on the page anyway. */
  readonly items: readonly GearItem[]
}

function usePieces(slugs: readonly string[], items: readonly GearItem[]): readonly GearItem[] {
  const { api } = useApp()
  const found = slugs.map((slug) => items.find((item) => item.slug === slug))
  const fetched = useQueries({
    queries: slugs.map((slug, at) => ({ ...comparedPieceQuery(api, slug), enabled: found[at] === undefined })),
  })
  return slugs.flatMap((_, at) => found[at] ?? fetched[at]?.data ?? [])
}

function Differences({
  kind,
  pieces,
  browse,
}: {
  readonly kind: KindKey
  readonly pieces: readonly GearItem[]
  readonly browse: Browse
}) {
  const { printer } = browse
  return comparePieces(kind, pieces, printer).map(({ role, differences, alike, unknown }) => (
    <section key={role} className="mt-6">
      <h3 className="border-b border-ink pb-1 text-base">{roleTitles[role]}</h3>
      {differences.length === 0 && <p className="mt-2 text-sm">No difference that is recorded.</p>}
      <div className="mt-3 grid grid-cols-1 gap-x-10 gap-y-5 md:grid-cols-2">
        {differences.map((difference) =>
          difference.type === 'measure' ? (
            <DifferenceLines key={difference.attribute.key} difference={difference} pieces={pieces} printer={printer} />
          ) : (
            <DifferenceWords key={difference.attribute.key} difference={difference} pieces={pieces} />
          ),
        )}
      </div>
      {alike.length > 0 && (
        <p className="mt-4 text-sm">
          <span className="text-ink-soft">The same in all:</span> {alike.join('; ')}.
        </p>
      )}
      {unknown.length > 0 && (
        <p className="mt-1 text-sm text-ink-soft">Not recorded yet for any of them: {unknown.join(', ')}.</p>
      )}
    </section>
  ))
}

/** Up to four pieces side by side, their measures drawn to one scale. */
export function Comparison({ browse, items }: ComparisonProps) {
  const { state, hrefOf } = browse
  const pieces = usePieces(state.compare, items)
  const [first] = pieces
  const kind = first && isKindKey(first.kind) ? first.kind : null
  const isOneKind = pieces.every((piece) => piece.kind === first?.kind)
  return (
    <section aria-labelledby="comparison" className="mt-8 border-[1.5px] border-ink bg-sheet px-4 py-4 md:px-6">
      <div className="flex flex-wrap items-baseline justify-between gap-x-6 gap-y-1">
        <h2 id="comparison">Side by side</h2>
        <Link to={hrefOf({ compare: [] })} preventScrollReset className="link text-sm print:hidden">
          Put all back
        </Link>
      </div>
      <ol className="mt-3 grid grid-cols-1 gap-x-8 gap-y-2 sm:grid-cols-2">
        {pieces.map((piece, at) => (
          <li key={piece.slug} className="flex items-baseline gap-2.5">
            <PieceLetter at={at} />
            <span className="min-w-0">
              <Link
                to={paths.gear(piece.slug)}
                className="font-semibold underline-offset-4 hover:text-action hover:underline"
              >
                {piece.brand} {piece.model}
              </Link>{' '}
              <Link
                to={hrefOf(withComparison(state, piece.slug, false))}
                preventScrollReset
                className="link text-sm whitespace-nowrap print:hidden"
                aria-label={`Put ${piece.brand} ${piece.model} back`}
              >
                put back
              </Link>
            </span>
          </li>
        ))}
      </ol>
      {pieces.length < state.compare.length && (
        <p className="mt-2 text-sm text-ink-soft">
          {state.compare.length - pieces.length} of the pieces in this link cannot be shown.
        </p>
      )}
      {pieces.length < 2 && <p className="mt-3 text-sm">Tick another piece in the list to see how they differ.</p>}
      {pieces.length >= 2 && !isOneKind && (
        <p className="mt-3 text-sm">
          These are of different kinds (
          {[...new Set(pieces.map((piece) => (isKindKey(piece.kind) ? kinds[piece.kind].label : piece.kind)))].join(
            ', ',
          )}
          ), which share no measures. Pieces of one kind can be set side by side.
        </p>
      )}
      {pieces.length >= 2 && isOneKind && kind && <Differences kind={kind} pieces={pieces} browse={browse} />}
      <p className="sr-only">
        {pieces.map((piece, at) => `${letters[at]} is ${piece.brand} ${piece.model}`).join(', ')}.
      </p>
    </section>
  )
}
