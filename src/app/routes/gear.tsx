import { useSuspenseQuery } from '@tanstack/react-query'
import { useParams } from 'react-router-dom'
import { getKind, isKindKey } from '#shared/kinds/index'
import { createPrinter } from '#shared/units/print'
import { paths } from '../../config/paths'
import { gearQuery } from '../../features/gear/api/get-gear'
import { revisionsQuery } from '../../features/gear/api/get-revisions'
import { GearSheet } from '../../features/gear/components/gear-sheet'
import { writeJsonLd } from '../../features/gear/write-json-ld'
import { useApp } from '../../lib/app-context'
import { describeSpecs } from '../../lib/describe-specs'
import { requireData } from '../../lib/loading'
import type { Page } from '../page-route'

function GearPage() {
  const { api } = useApp()
  const { slug = '' } = useParams()
  const { data } = useSuspenseQuery(gearQuery(api, slug))
  return <GearSheet gear={data} />
}

export const page: Page = {
  Component: GearPage,
  load: async (app, { params }) => {
    const slug = params.slug ?? ''
    await Promise.all([
      requireData(app, gearQuery(app.api, slug)),
      app.queryClient.prefetchQuery(revisionsQuery(app.api, slug)),
    ])
  },
  head: ({ app, params }) => {
    const slug = params.slug ?? ''
    const gear = app.queryClient.getQueryData(gearQuery(app.api, slug).queryKey)
    if (!gear) return { title: 'Gear', description: 'A piece of gear, measured.' }
    const name = `${gear.brand} ${gear.model}`
    const kind = isKindKey(gear.kind) ? gear.kind : null
    const specs = kind ? describeSpecs(kind, gear.specs, createPrinter(app.preferences.get().system)) : ''
    return {
      title: kind ? `${name}, ${getKind(kind).label}` : name,
      description: `${name}: ${specs}. Where each number is from, and what it fits.`,
      canonical: paths.gear(slug),
      jsonLd: writeJsonLd(gear),
    }
  },
}
