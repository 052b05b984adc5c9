import { useState } from 'react'
import { useQuery } from '@tanstack/react-query'
import { Button } from '../../../components/ui/button'
import { useApp } from '../../../lib/app-context'
import { printMoment } from '../../../lib/print-date'
import { toApiError } from '../../../lib/problem'
import { ownSessionsQuery } from '../api/account-queries'
import { describeAgent } from '../model/describe-agent'
import { DoneLine } from './done-line'

export function SessionList() {
  const { api, queryClient } = useApp()
  const query = ownSessionsQuery(api)
  const { data } = useQuery(query)
  const [message, setMessage] = useState('')

  async function end(id: string): Promise<void> {
    try {
      await api.delete(`/me/sessions/${id}`)
      setMessage('That session has ended.')
    } catch (error) {
      setMessage(toApiError(error).message)
    }
    await queryClient.invalidateQueries({ queryKey: query.queryKey })
  }

  return (
    <>
      <ul className="divide-y divide-rule">
        {data?.items.map(({ id, agent, startedAt, seenAt, isThis }) => (
          <li key={id} className="flex flex-wrap items-center justify-between gap-3 py-3">
            <div className="min-w-0">
              <p className="font-semibold">
                {describeAgent(agent)}
                {isThis && ', this one'}
              </p>
              <p className="font-mono text-xs text-ink-soft">since {printMoment(startedAt)}</p>
              <p className="font-mono text-xs text-ink-soft">last used {printMoment(seenAt)}</p>
            </div>
            {!isThis && (
              <Button
                size="sm"
                aria-label={`End the session since ${printMoment(startedAt)}`}
                onClick={() => void end(id)}
              >
                End
              </Button>
            )}
          </li>
        ))}
      </ul>
      <DoneLine message={message} />
    </>
  )
}
