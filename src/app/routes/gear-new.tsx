import { useQuery } from '@tanstack/react-query'
import { useSearchParams } from 'react-router-dom'
import { getKind, isKindKey, type KindKey } from '#shared/kinds/index'
import { paths } from '../../config/paths'
import { savedProposalQuery } from '../../features/propose/api/proposal-query'
import { KindChooser } from '../../features/propose/components/kind-chooser'
import { ProposePage } from '../../features/propose/components/propose-page'
import { useApp } from '../../lib/app-context'
import { requireFresh } from '../../lib/loading'
import type { Page } from '../page-route'

const readKind = (params: URLSearchParams): KindKey | null => {
  const kind = params.get('kind') ?? ''
  return isKindKey(kind) ? kind : null
}

function GearNewPage() {
  const { api } = useApp()
  const [params] = useSearchParams()
  const proposal = params.get('proposal')
  const { data: saved = null } = useQuery({ ...savedProposalQuery(api, proposal ?? ''), enabled: false })
  const kind = saved && isKindKey(saved.proposal.kind) ? saved.proposal.kind : readKind(params)
  return kind ? <ProposePage key={`${kind} ${proposal}`} kind={kind} gear={null} saved={saved} /> : <KindChooser />
}

export const page: Page = {
  Component: GearNewPage,
  load: async (app, { request }) => {
    const proposal = new URL(request.url).searchParams.get('proposal')
    if (proposal !== null) await requireFresh(app, savedProposalQuery(app.api, proposal))
  },
  head: ({ url }) => {
    const kind = readKind(url.searchParams)
    return {
      title: kind ? `Add: ${getKind(kind).label}` : 'Add a piece of gear',
      description: 'Put a piece of gear on record: measured, in your own units, with what backs it.',
      canonical: paths.gearNew,
    }
  },
}
