import { useState } from 'react'
import { useSuspenseQuery } from '@tanstack/react-query'
import { Link, useSearchParams } from 'react-router-dom'
import type { AdminPerson } from '#shared/schemas/people'
import { AdminTabs } from '../../../components/admin/admin-tabs'
import { buttonClass } from '../../../components/ui/button-class'
import { EmptyState } from '../../../components/ui/empty-state'
import { paths } from '../../../config/paths'
import { useApp } from '../../../lib/app-context'
import { peopleQuery } from '../api/people-queries'
import { readPeopleSearch } from '../read-people-search'
import { PeopleFilter } from './people-filter'
import { PeopleTable } from './people-table'
import { StandingDialog } from './standing-dialog'

/** Everybody with an account, for admins. */
export function PeoplePage() {
  const { api, queryClient } = useApp()
  const [search] = useSearchParams()
  const { data } = useSuspenseQuery(peopleQuery(api, readPeopleSearch(search)))
  const [changing, setChanging] = useState<AdminPerson | null>(null)
  const [message, setMessage] = useState('')
  const further = new URLSearchParams({ ...Object.fromEntries(search), cursor: data.next ?? '' })

  return (
    <>
      <h1 className="mt-6">People</h1>
      <div className="mt-4">
        <AdminTabs />
      </div>
      <p className="mt-2 max-w-prose text-ink-soft">
        Roles and suspensions count from the next thing that somebody does. Each change is kept in the audit trail, and
        the person is written to.
      </p>
      <PeopleFilter search={search} />
      <p role="status" className="mt-4 min-h-6 font-semibold">
        {message}
      </p>
      {data.items.length === 0 ? (
        <EmptyState title="Nobody like that">Take a filter away, or look for another part of a name.</EmptyState>
      ) : (
        <PeopleTable people={data.items} onChange={setChanging} />
      )}
      {data.next !== null && (
        <p className="mt-4">
          <Link to={`${paths.admin}?${further.toString()}`} className={buttonClass()}>
            Further people
          </Link>
        </p>
      )}
      {changing && (
        <StandingDialog
          person={changing}
          onClose={() => setChanging(null)}
          onDone={(words) => {
            setChanging(null)
            setMessage(words)
            void queryClient.invalidateQueries({ queryKey: ['admin', 'people'] })
          }}
        />
      )}
    </>
  )
}
