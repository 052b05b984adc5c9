import { useSuspenseQuery } from '@tanstack/react-query'
import { useParams } from 'react-router-dom'
import { paths } from '../../config/paths'
import { personQuery } from '../../features/people/api/people-queries'
import { PersonPage } from '../../features/people/components/person-page'
import { useApp } from '../../lib/app-context'
import { requireData } from '../../lib/loading'
import type { Page } from '../page-route'

function PersonRoute() {
  const { api } = useApp()
  const { name = '' } = useParams()
  const { data } = useSuspenseQuery(personQuery(api, name))
  return <PersonPage person={data} />
}

export const page: Page = {
  Component: PersonRoute,
  load: (app, { params }) => requireData(app, personQuery(app.api, params.name ?? '')),
  head: ({ params }) => {
    const name = params.name ?? ''
    return { title: name, description: `What ${name} has measured and contributed.`, canonical: paths.person(name) }
  },
}
