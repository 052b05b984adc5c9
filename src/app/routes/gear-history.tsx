import { useLocation, useParams } from 'react-router-dom'
import { paths } from '../../config/paths'
import { gearQuery } from '../../features/gear/api/get-gear'
import { revisionQuery } from '../../features/gear/api/get-revision'
import { revisionsQuery } from '../../features/gear/api/get-revisions'
import { HistoryPage } from '../../features/gear/components/history-page'
import { RestoreTool } from '../../features/gear-care/components/restore-tool'
import { readComparedRevisions } from '../../features/gear/read-compared-revisions'
import { requireData } from '../../lib/loading'
import type { Page } from '../page-route'

function GearHistoryPage() {
  const { slug = '' } = useParams()
  const { search } = useLocation()
  const shown = Number(new URLSearchParams(search).get('before') ?? 0)
  return (
    <HistoryPage key={slug} slug={slug}>
      <RestoreTool slug={slug} shown={shown} />
    </HistoryPage>
  )
}

export const page: Page = {
  Component: GearHistoryPage,
  load: async (app, { params, request }) => {
    const { api, queryClient } = app
    const slug = params.slug ?? ''
    const [, { items }] = await Promise.all([
      requireData(app, gearQuery(api, slug)),
      requireData(app, revisionsQuery(api, slug)),
    ])
    const { before, after } = readComparedRevisions(new URL(request.url).searchParams, items[0]?.number ?? 1)
    const shown = [before, after].filter((number) => number > 0)
    await Promise.all(shown.map((number) => queryClient.prefetchQuery(revisionQuery(api, slug, number))))
  },
  head: ({ app, url, params }) => {
    const slug = params.slug ?? ''
    const gear = app.queryClient.getQueryData(gearQuery(app.api, slug).queryKey)
    const name = gear ? `${gear.brand} ${gear.model}` : 'A piece of gear'
    return {
      title: `History of ${name}`,
      description: `${name}: every revision of its numbers, who told them and what backs them, side by side.`,
      canonical: paths.gearHistory(slug),
      ...(url.search !== '' && { isUnlisted: true }),
    }
  },
}
