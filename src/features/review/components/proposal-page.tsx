import { useLocation } from 'react-router-dom'
import { LiveStatus } from '../../../components/ui/live-status'
import { useFieldKeys } from '../hooks/use-field-keys'
import { useKeysChoice } from '../hooks/use-keys-choice'
import { useReview } from '../hooks/use-review'
import { useShortcuts } from '../hooks/use-shortcuts'
import { DecisionSide } from './decision-side'
import { EffectList } from './effect-list'
import { FieldList } from './field-list'
import { KeyLegend } from './key-legend'
import { Outcome } from './outcome'
import { ProposalHead } from './proposal-head'
import { Talk } from './talk'

/** One proposal on the desk: old, new and evidence side by side, and the decision. */
export function ProposalPage({ id }: { readonly id: string }) {
  const { search } = useLocation()
  const review = useReview(id)
  const { proposal, readAt, refusal, outcome, message, announce } = review
  const { can, lease, status, isMine } = proposal
  const isHeldByAnother = lease !== null && !lease.isMine
  const canPrepare = outcome === null && (can.decide || (status === 'pending' && isHeldByAnother && !isMine && can.say))
  const errors = new Map(
    refusal?.kind === 'wrong' ? refusal.errors.map(({ fieldId, message: text }) => [fieldId, text]) : [],
  )
  const shortcuts = useFieldKeys(review)
  const [isOn] = useKeysChoice()
  useShortcuts(shortcuts, isOn)
  return (
    <>
      <ProposalHead proposal={proposal} readAt={readAt} search={search} />
      <LiveStatus message={message} />
      <div className="mt-3">
        <KeyLegend shortcuts={shortcuts} />
      </div>
      {outcome && (
        <div className="mt-6">
          <Outcome proposal={proposal} course={outcome} search={search} />
        </div>
      )}
      <div className="lg:grid lg:grid-cols-[minmax(0,1fr)_20rem] lg:gap-x-10">
        <div className="min-w-0">
          <FieldList review={review} canChoose={canPrepare} errors={errors} />
          <EffectList id={id} version={proposal.version} />
          <Talk proposal={proposal} onSaid={announce} />
        </div>
        <aside
          aria-label="Decision"
          className="mt-10 lg:sticky lg:top-4 lg:mt-6 lg:max-h-[calc(100dvh-2rem)] lg:self-start lg:overflow-y-auto lg:p-1"
        >
          <DecisionSide review={review} canPrepare={canPrepare} errors={errors} />
        </aside>
      </div>
    </>
  )
}
