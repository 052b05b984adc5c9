import { Link } from 'react-router-dom'
import type { ErrorReport } from '#shared/schemas/review'
import { paths } from '../../../config/paths'
import { printMoment } from '../../../lib/print-date'
import { useSettle } from '../api/use-settle'
import { nameKey } from '../model/list-fields'
import { SettleForm } from './settle-form'

export interface ReportCardProps {
  readonly report: ErrorReport
  readonly onSettled: (message: string) => void
}

/** What a reader says is wrong, and what was done about it. */
export function ReportCard({ report: { id, gear, key, words, author, createdAt }, onSettled }: ReportCardProps) {
  const { mutate, isPending, error } = useSettle('reports', id)
  return (
    <li className="border-t-[1.5px] border-ink py-4">
      <h2>
        <Link to={paths.gear(gear.slug)} className="link">
          {gear.brand} · {gear.model}
        </Link>
        {key !== null && <>: {nameKey(gear.kind, key)}</>}
      </h2>
      <p className="text-sm text-ink-soft">
        {author ?? 'Somebody without an account'}, <time dateTime={createdAt}>{printMoment(createdAt)}</time>
      </p>
      <blockquote className="mt-2 max-w-prose border-l-[3px] border-rule pl-3 whitespace-pre-line">{words}</blockquote>
      <SettleForm
        id={`settle-${id}`}
        label="What was done about it?"
        hint="Kept with the report. A wrong number is corrected by a proposal, like any other."
        action="Settle it"
        isBusy={isPending}
        failure={error}
        onSettle={(said) =>
          mutate({ words: said }, { onSuccess: () => onSettled(`The report about ${gear.model} is settled.`) })
        }
      />
    </li>
  )
}
