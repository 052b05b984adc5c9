import type { Review } from '../hooks/use-review'
import { DecisionForm } from './decision-form'
import { DecisionSummary } from './decision-summary'
import { LeaseBar } from './lease-bar'
import { RefusalNotice } from './refusal-notice'
import { UnsentWords } from './unsent-words'

export interface DecisionSideProps {
  readonly review: Review
  readonly canPrepare: boolean
  readonly errors: ReadonlyMap<string, string>
}

/** Taking a proposal and deciding it; where that is over, what became of it. */
export function DecisionSide({ review, canPrepare, errors }: DecisionSideProps) {
  const { proposal, readAt, fields, kept, refusal, attempt, hold, isHolding, decide, isDeciding, announce } = review
  const { lease, isMine, can } = proposal
  return (
    <div className="grid gap-5">
      {proposal.status === 'pending' && (
        <LeaseBar
          proposal={proposal}
          readAt={readAt}
          isBusy={isHolding}
          onTake={() => hold('take')}
          onRelease={() => hold('release')}
        />
      )}
      {refusal && <RefusalNotice refusal={refusal} attempt={attempt} />}
      {proposal.decision !== null && <DecisionSummary proposal={proposal} />}
      {canPrepare ? (
        <DecisionForm
          draft={kept.draft}
          fields={fields}
          errors={errors}
          isBusy={isDeciding}
          holder={can.decide ? null : (lease?.holder ?? null)}
          onChange={kept.change}
          onDecide={decide}
        />
      ) : (
        <>
          {proposal.decision === null && <DecisionSummary proposal={proposal} />}
          {isMine && proposal.status === 'pending' && <p>This is your own: somebody else decides it.</p>}
          <UnsentWords proposal={proposal} kept={kept} onSaid={announce} />
        </>
      )}
    </div>
  )
}
