import { reasons } from '#shared/schemas/review-choices'
import type { Proposal } from '#shared/schemas/proposals'
import { capitalise } from '../../../lib/capitalise'
import { printMoment } from '../../../lib/print-date'
import { nameKey } from '../model/list-fields'

export interface DecisionSummaryProps {
  readonly proposal: Pick<Proposal, 'decision' | 'kind' | 'status' | 'revision'>
}

const decided = { approve: 'Approved', 'send-back': 'Sent back', decline: 'Declined' } as const
const reasonWords: Readonly<Record<string, string>> = { ...reasons['send-back'], ...reasons.decline }

const undecided: Readonly<Partial<Record<Proposal['status'], string>>> = {
  draft: 'Not sent in yet.',
  withdrawn: 'Withdrawn by its author.',
}

/** What became of a proposal, by whom and why. */
export function DecisionSummary({ proposal: { decision, kind, status, revision } }: DecisionSummaryProps) {
  if (decision === null || status === 'withdrawn' || status === 'draft')
    return <p className="font-semibold">{undecided[status] ?? 'Waits to be decided.'}</p>
  const declined = Object.entries(decision.fields).filter(([, field]) => field.decision === 'decline')
  const reason = decision.reasonCode === null ? undefined : reasonWords[decision.reasonCode]
  return (
    <div className="border-l-[5px] border-ink bg-sheet px-4 py-3">
      <p>
        <strong className="font-semibold">
          {status === 'pending' ? 'Sent back before, and sent in again' : decided[decision.decision]}
        </strong>{' '}
        by {decision.by}, {printMoment(decision.at)}
        {revision !== null && <>: revision {revision}</>}
      </p>
      {reason !== undefined && <p>{reason}.</p>}
      {decision.words !== null && <p className="max-w-prose whitespace-pre-line">{decision.words}</p>}
      {declined.map(([key, field]) => (
        <p key={key} className="text-sm">
          {capitalise(nameKey(kind, key))} was declined{field.words !== null && `: ${field.words}`}
        </p>
      ))}
    </div>
  )
}
