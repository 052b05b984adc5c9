import { useParams } from 'react-router-dom'
import { findWorksheet } from '#shared/engine/worksheets/registry'
import { WorksheetPage } from '../../features/worksheets/components/worksheet-page'
import { loadWorksheet } from '../../features/worksheets/load-worksheet'
import { paths } from '../../config/paths'
import type { Page } from '../page-route'

function WorksheetRoute() {
  const { name = '' } = useParams()
  const sheet = findWorksheet(name)
  return sheet ? <WorksheetPage key={name} sheet={sheet} /> : null
}

export const page: Page = {
  Component: WorksheetRoute,
  load: (app, { request, params }) => loadWorksheet(app, new URL(request.url), params.name ?? ''),
  head: ({ url, params }) => {
    const name = params.name ?? ''
    const sheet = findWorksheet(name)
    return {
      title: sheet?.title ?? 'Worksheets',
      description: sheet?.intro ?? '',
      canonical: paths.worksheet(name),
      ...(url.search !== '' && { isUnlisted: true }),
    }
  },
}
