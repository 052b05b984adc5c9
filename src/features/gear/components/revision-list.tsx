import { getAttribute, type KindKey } from '#shared/kinds/index'
import type { RevisionSummary } from '#shared/schemas/gear'
import { printDate } from '../print-date'

export interface RevisionListProps {
  readonly kind: KindKey
  readonly revisions: readonly RevisionSummary[]
}

/** Who changed what and when. Nothing is ever overwritten. */
export function RevisionList({ kind, revisions }: RevisionListProps) {
  return (
    <section className="mt-10">
      <h2>Revisions</h2>
      <ol className="mt-2">
        {revisions.map(({ number, author, summary, createdAt, changed }) => (
          <li
            key={number}
            className="grid gap-x-6 border-t border-rule py-2 text-sm sm:grid-cols-[4rem_10rem_minmax(0,1fr)]"
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
          </li>
        ))}
      </ol>
    </section>
  )
}
