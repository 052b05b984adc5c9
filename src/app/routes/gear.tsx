import { useSuspenseQuery } from '@tanstack/react-query'
import { data, redirect, useLoaderData, useParams } from 'react-router-dom'
import { getKind, isKindKey } from '#shared/kinds/index'
import { createPrinter } from '#shared/units/print'
import { paths } from '../../config/paths'
import { gearQuery } from '../../features/gear/api/get-gear'
import { revisionsQuery } from '../../features/gear/api/get-revisions'
import { GearSheet } from '../../features/gear/components/gear-sheet'
import { CareLink } from '../../features/gear-care/components/care-link'
import { RetiredPage } from '../../features/gear-care/components/retired-page'
import { writeJsonLd } from '../../features/gear/write-json-ld'
import { useApp } from '../../lib/app-context'
import { describeSpecs } from '../../lib/describe-specs'
import { throwFailure } from '../../lib/loading'
import { toApiError } from '../../lib/problem'
import type { Page } from '../page-route'

/** What stands in place of a piece that was taken out. */
interface Former {
  readonly retired: string
}

function LiveGearPage({ slug }: { readonly slug: string }) {
  const { api } = useApp()
  const { data } = useSuspenseQuery(gearQuery(api, slug))
  return (
    <>
      <GearSheet gear={data} />
      <CareLink slug={slug} />
    </>
  )
}

function GearPage() {
  const { slug = '' } = useParams()
  const former = useLoaderData<Former | null>()
  return former ? <RetiredPage slug={slug} detail={former.retired} /> : <LiveGearPage slug={slug} />
}

export const page: Page = {
  Component: GearPage,
  load: async (app, { params }) => {
    const { api, queryClient } = app
    const slug = params.slug ?? ''
    const revisions = queryClient.prefetchQuery(revisionsQuery(api, slug))
    try {
      const gear = await queryClient.ensureQueryData(gearQuery(api, slug))
      // The API led from a piece that was merged to the one that stays; so does the page.
      if (gear.slug !== slug) return redirect(paths.gear(gear.slug), 301)
    } catch (error) {
      const { status, message } = toApiError(error)
      return status === 410 ? data({ retired: message } satisfies Former, { status }) : throwFailure(error)
    }
    await revisions
    return null
  },
  head: ({ app, params }) => {
    const slug = params.slug ?? ''
    const gear = app.queryClient.getQueryData(gearQuery(app.api, slug).queryKey)
    if (!gear) return { title: 'Retired', description: 'An entry that was taken out of the record.', isUnlisted: true }
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
