import { useMutation } from '@tanstack/react-query'
import { useSearchParams } from 'react-router-dom'
import { Button } from '../../../components/ui/button'
import { EmptyState } from '../../../components/ui/empty-state'
import { ErrorState } from '../../../components/ui/error-state'
import { useApp } from '../../../lib/app-context'
import { toApiError } from '../../../lib/problem'

/** Where a letter's link leads: opening it changes nothing, since mail programs open links by themselves. */
export function UnsubscribePage() {
  const { api } = useApp()
  const [search] = useSearchParams()
  const token = search.get('token') ?? ''
  const stop = useMutation({
    mutationFn: () => api.send('POST', `/unsubscribe?${new URLSearchParams({ token }).toString()}`),
  })
  return (
    <div className="space-y-6">
      <h1>No more notices</h1>
      {stop.isSuccess ? (
        <div role="status">
          <EmptyState title="You get no more notices by e-mail">
            Letters about your account itself, such as a new password, still come. You can have notices again on your
            account page.
          </EmptyState>
        </div>
      ) : (
        <>
          <p className="max-w-prose">
            Press the button to end notices about your proposals by e-mail. You can still read all of them here.
          </p>
          {stop.isError && (
            <ErrorState title={toApiError(stop.error).title}>{toApiError(stop.error).message}</ErrorState>
          )}
          <Button variant="primary" isBusy={stop.isPending} onClick={() => stop.mutate()}>
            End notices by e-mail
          </Button>
        </>
      )}
    </div>
  )
}
