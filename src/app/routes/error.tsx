import { useEffect } from 'react'
import { Link, useLocation, useRevalidator, useRouteError } from 'react-router-dom'
import { EmptyState } from '../../components/ui/empty-state'
import { ErrorState } from '../../components/ui/error-state'
import { buttonClass } from '../../components/ui/button-class'
import { paths } from '../../config/paths'
import { describeFailure } from '../describe-failure'

const recheckMs = 4_000

/** Stands in for a page that could not be shown; while the catalogue is away it keeps asking and comes back by itself. */
export function ErrorPage() {
  const { status, title, detail, isAway, requestId } = describeFailure(useRouteError())
  const { revalidate, state } = useRevalidator()
  const { pathname, search } = useLocation()
  useEffect(() => {
    if (!isAway || state !== 'idle') return
    const timer = setTimeout(() => void revalidate(), recheckMs)
    return () => clearTimeout(timer)
  }, [isAway, revalidate, state])

  if (status === 404)
    return (
      <>
        <h1>Not found</h1>
        <div className="mt-6">
          <EmptyState
            title={title}
            action={
              <Link to={paths.find} className={buttonClass({ variant: 'primary' })}>
                Open the finder
              </Link>
            }
          >
            {detail}
          </EmptyState>
        </div>
      </>
    )
  return (
    <>
      <h1>{isAway ? 'Away for a moment' : 'This page could not be shown'}</h1>
      <div className="mt-6">
        <ErrorState
          title={title}
          onRetry={() => void revalidate()}
          retryHref={`${pathname}${search}`}
          {...(requestId !== undefined && { requestId })}
        >
          {detail}
        </ErrorState>
      </div>
    </>
  )
}
