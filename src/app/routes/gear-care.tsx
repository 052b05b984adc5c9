import { useParams } from 'react-router-dom'
import { careQuery } from '../../features/gear-care/api/get-care'
import { CarePage } from '../../features/gear-care/components/care-page'
import { requireData } from '../../lib/loading'
import type { Page } from '../page-route'

function GearCarePage() {
  const { slug = '' } = useParams()
  return <CarePage key={slug} slug={slug} />
}

export const page: Page = {
  Component: GearCarePage,
  load: (app, { params }) => requireData(app, careQuery(app.api, params.slug ?? '')),
  head: () => ({
    title: 'Look after an entry',
    description: 'Merging and retiring an entry of the record.',
    isUnlisted: true,
  }),
}
