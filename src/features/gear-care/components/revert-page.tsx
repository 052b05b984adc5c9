import { useQuery } from '@tanstack/react-query'
import { useSearchParams } from 'react-router-dom'
import { limits } from '#shared/limits'
import { ErrorState } from '../../../components/ui/error-state'
import { useApp } from '../../../lib/app-context'
import { toApiError } from '../../../lib/problem'
import { jobQuery, useRevert } from '../api/revert-person'
import { JobProgress } from './job-progress'
import { WordsForm } from './words-form'

function Job({ id }: { readonly id: string }) {
  const { api } = useApp()
  const { data, error, refetch } = useQuery(jobQuery(api, id))
  if (data) return <JobProgress job={data} />
  if (!error) return <p className="mt-4">Looking how far it has come.</p>
  return (
    <ErrorState title={toApiError(error).title} onRetry={() => void refetch()}>
      {toApiError(error).message} The work itself goes on.
    </ErrorState>
  )
}

/** Takes back everything that one person changed, as new revisions. Its address shows how far that has come. */
export function RevertPage({ name }: { readonly name: string }) {
  const [params, setParams] = useSearchParams()
  const job = params.get('job')
  const { mutate, isPending, error } = useRevert(name)
  return (
    <>
      <h1>Revert what {name} changed</h1>
      <p className="mt-2 max-w-prose">
        Every value that {name} set and that is still in use goes back to what it was before. Each piece gets a new
        revision that says so; nothing is erased, and any revision can be made the present state again.
      </p>
      {job === null ? (
        <div className="mt-6">
          <WordsForm
            id="revert-words"
            label="Why?"
            hint="Stands as the summary of every revision that comes of it."
            action={`Revert what ${name} changed`}
            maxLength={limits.summary}
            isBusy={isPending}
            failure={error}
            onSend={(words) => mutate(words, { onSuccess: ({ id }) => setParams({ job: id }) })}
          />
        </div>
      ) : (
        <>
          <Job key={job} id={job} />
          <p className="mt-3 max-w-prose text-sm text-ink-soft">
            You can leave this page: the work goes on, and this address shows how far it is.
          </p>
        </>
      )}
    </>
  )
}
