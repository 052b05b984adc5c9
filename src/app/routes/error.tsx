import { useEffect } from 'react'
import { Link, useLocation, useRevalidator, useRouteError } from 'react-router-dom'
import { EmptyState } from '../../components/ui/empty-state'
import { ErrorState } from '../../components/ui/error-state'
import { buttonClass } from '../../components/ui/button-class'
import { paths } from '../../config/paths'
import { describeFailure } from '../describe-failure'

const recheckMs = 4_000

/** Where somebody goes from a page that trying again would not bring; null where it might. */
function findWayOn(status: number, address: string): { readonly href: string; readonly label: string } | null {
  if (status === 401) return { href: paths.signIn(address), label: 'Sign in to go on' }
  if (status === 403) return { href: paths.home, label: 'Go to the start' }
  if (status === 404) return { href: paths.find, label: 'Open the finder' }
  return status === 410 ? { href: paths.gearList, label: 'Browse the gear' } : null
}

/** Stands in for a page that could not be shown; while the catalogue is away it keeps asking and comes back by itself. */
export function ErrorPage() {
  const { status, heading, title, detail, isAway, requestId } = describeFailure(useRouteError())
  const { revalidate, state } = useRevalidator()
  const { pathname, search } = useLocation()
  useEffect(() => {
    if (!isAway || state !== 'idle') return
    const timer = setTimeout(() => void revalidate(), recheckMs)
    return () => clearTimeout(timer)
  }, [isAway, revalidate, state])

  const way = findWayOn(status, `${pathname}${search}`)
  return (
    <>
      <h1>{heading}</h1>
      <div className="mt-6">
        {way ? (
          <EmptyState
            title={title}
            action={
              <Link to={way.href} className={buttonClass({ variant: 'primary' })}>
                {way.label}
              </Link>
            }
          >
            {detail}
          </EmptyState>
        ) : (
          <ErrorState
            title={title}
            onRetry={() => void revalidate()}
            retryHref={`${pathname}${search}`}
            {...(requestId !== undefined && { requestId })}
          >
            {detail}
          </ErrorState>
        )}
      </div>
    </>
  )
}
