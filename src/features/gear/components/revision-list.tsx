import { Link } from 'react-router-dom'
import { getAttribute, type KindKey } from '#shared/kinds/index'
import type { RevisionSummary } from '#shared/schemas/gear'
import { paths } from '../../../config/paths'
import { printDate } from '../../../lib/print-date'

export interface RevisionListProps {
  readonly kind: KindKey
  readonly revisions: readonly RevisionSummary[]
  readonly slug: string
}

/** Who changed what and when. Nothing is ever overwritten. */
export function RevisionList({ kind, revisions, slug }: RevisionListProps) {
  return (
    <section className="mt-10">
      <h2>Revisions</h2>
      <ol className="mt-2">
        {revisions.map(({ number, author, summary, createdAt, changed }) => (
          <li
            key={number}
            className="grid gap-x-6 border-t border-rule py-2 text-sm sm:grid-cols-[4rem_10rem_minmax(0,1fr)_auto]"
          >
            <span className="font-mono">no. {number}</span>
            <span className="text-ink-soft">
              {printDate(createdAt)}, {author}
            </span>
            <span className="min-w-0">
              {summary ?? 'No summary given'}
              {number > 1 && changed.length > 0 && (
                <span className="block text-ink-soft">
                  Changed: {changed.map((key) => getAttribute(kind, key)?.label ?? key).join(', ')}
                </span>
              )}
            </span>
            <Link
              to={`${paths.gearHistory(slug)}?before=${number - 1}&after=${number}`}
              className="link self-start print:hidden"
              aria-label={number > 1 ? `What revision ${number} changed` : 'What revision 1 says'}
            >
              {number > 1 ? 'what changed' : 'what it says'}
            </Link>
          </li>
        ))}
      </ol>
    </section>
  )
}
