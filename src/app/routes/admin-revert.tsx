import { useParams } from 'react-router-dom'
import { RevertPage } from '../../features/gear-care/components/revert-page'
import { requirePerson } from '../../lib/require-person'
import type { Page } from '../page-route'

function AdminRevertPage() {
  const { name = '' } = useParams()
  return <RevertPage key={name} name={name} />
}

export const page: Page = {
  Component: AdminRevertPage,
  load: (app) => requirePerson(app, 'administer', 'Only admins do this.'),
  head: ({ params }) => ({
    title: `Revert what ${params.name ?? 'somebody'} changed`,
    description: 'Takes back everything that one person changed.',
    isUnlisted: true,
  }),
}
