import { useState } from 'react'
import { useQueryClient, useSuspenseQuery } from '@tanstack/react-query'
import { useApp } from '../../../lib/app-context'
import { toApiError } from '../../../lib/problem'
import { proposalQuery } from '../api/get-proposal'
import { useDecision } from '../api/use-decision'
import { useLease } from '../api/use-lease'
import { checkDraft, writeDecision, type Course } from '../model/decision-draft'
import { explainRefusal, type Refusal } from '../model/explain-refusal'
import { listFields } from '../model/list-fields'
import { useKeptDraft } from './use-kept-draft'

/** Everything that a moderator does with one proposal, and what came of it. */
export function useReview(id: string) {
  const { api } = useApp()
  const queryClient = useQueryClient()
  const { data: read, dataUpdatedAt } = useSuspenseQuery(proposalQuery(api, id))
  const { proposal, etag } = read
  const kept = useKeptDraft(id)
  const [refusal, setRefusal] = useState<Refusal | null>(null)
  const [attempt, setAttempt] = useState(0)
  const [outcome, setOutcome] = useState<Course | null>(null)
  const [message, setMessage] = useState('')
  const lease = useLease(id)
  const decision = useDecision(id)
  const fields = listFields(proposal)

  const hold = (wanted: 'take' | 'release') =>
    lease.mutate(wanted, {
      onSuccess: () => setMessage(wanted === 'take' ? 'You hold this now.' : 'You let it go.'),
      onError: (error) => setRefusal({ kind: 'overtaken', detail: toApiError(error).message }),
    })

  const decide = () => {
    const { draft } = kept
    const errors = checkDraft(draft, fields)
    setAttempt((count) => count + 1)
    if (errors.length > 0) return setRefusal({ kind: 'wrong', errors })
    setRefusal(null)
    decision.mutate(
      { request: writeDecision(draft, fields), etag },
      {
        onSuccess: () => {
          kept.drop()
          setOutcome(draft.course)
        },
        // By then the proposal was read anew.
        onError: (error) => {
          const now = queryClient.getQueryData(proposalQuery(api, id).queryKey)
          setRefusal(explainRefusal(error, proposal, now?.proposal ?? null))
        },
      },
    )
  }

  return {
    proposal,
    readAt: dataUpdatedAt,
    fields,
    kept,
    refusal,
    attempt,
    outcome,
    message,
    announce: setMessage,
    hold,
    isHolding: lease.isPending,
    decide,
    isDeciding: decision.isPending,
  }
}

export type Review = ReturnType<typeof useReview>
