import { peopleQuery } from '../../features/people/api/people-queries'
import { PeoplePage } from '../../features/people/components/people-page'
import { readPeopleSearch } from '../../features/people/read-people-search'
import { requireFresh } from '../../lib/loading'
import type { Page } from '../page-route'

export const page: Page = {
  Component: PeoplePage,
  load: (app, { request }) =>
    requireFresh(app, peopleQuery(app.api, readPeopleSearch(new URL(request.url).searchParams))),
  head: () => ({ title: 'People', description: 'Accounts, roles and suspensions.', isUnlisted: true }),
}
