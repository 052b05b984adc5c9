import { useQuery, useSuspenseQuery } from '@tanstack/react-query'
import { useParams, useSearchParams } from 'react-router-dom'
import { isKindKey } from '#shared/kinds/index'
import { gearEntryQuery } from '../../components/setup/gear-entry'
import { paths } from '../../config/paths'
import { savedProposalQuery } from '../../features/propose/api/proposal-query'
import { ProposePage } from '../../features/propose/components/propose-page'
import { useApp } from '../../lib/app-context'
import { requireFresh } from '../../lib/loading'
import type { Page } from '../page-route'

function GearEditPage() {
  const { api } = useApp()
  const { slug = '' } = useParams()
  const [params] = useSearchParams()
  const proposal = params.get('proposal')
  const { data: gear } = useSuspenseQuery(gearEntryQuery(api, slug))
  const { data: saved = null } = useQuery({ ...savedProposalQuery(api, proposal ?? ''), enabled: false })
  if (!isKindKey(gear.kind)) return <h1>{gear.model}</h1>
  return <ProposePage key={`${slug} ${proposal}`} kind={gear.kind} gear={gear} saved={saved} />
}

export const page: Page = {
  Component: GearEditPage,
  load: async (app, { params, request }) => {
    const proposal = new URL(request.url).searchParams.get('proposal')
    await Promise.all([
      requireFresh(app, gearEntryQuery(app.api, params.slug ?? '')),
      proposal === null ? null : requireFresh(app, savedProposalQuery(app.api, proposal)),
    ])
  },
  head: ({ app, params }) => {
    const slug = params.slug ?? ''
    const gear = app.queryClient.getQueryData(gearEntryQuery(app.api, slug).queryKey)
    const name = gear ? `${gear.brand} ${gear.model}` : 'a piece of gear'
    return {
      title: `Correct ${name}`,
      description: `Correct or complete what is on record of ${name}.`,
      canonical: paths.gearEdit(slug),
      isUnlisted: true,
    }
  },
}
