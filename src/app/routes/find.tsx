import { useEffect } from 'react'
import { useLocation } from 'react-router-dom'
import { getKind, isKindKey } from '#shared/kinds/index'
import { listSetupEntries } from '../../components/setup/edit-raw'
import { paths } from '../../config/paths'
import { Finder } from '../../features/finder/components/finder'
import { loadFinder } from '../../features/finder/load-finder'
import { keepLastSetup } from '../../lib/last-setup'
import type { Page } from '../page-route'

/** The finder, whose setup is remembered for the sheets of single pieces. */
function FindPage() {
  const { search } = useLocation()
  useEffect(() => {
    const setup = new URLSearchParams(listSetupEntries(new URLSearchParams(search))).toString()
    // Spaces as the finder's own addresses spell them.
    keepLastSetup(setup.replaceAll('+', '%20'))
  }, [search])
  return <Finder />
}

export const page: Page = {
  Component: FindPage,
  load: (app, { request }) => loadFinder(app, new URL(request.url), paths.find),
  head: ({ url }) => {
    const key = url.searchParams.get('kind') ?? ''
    const kind = getKind(isKindKey(key) ? key : 'heater')
    return {
      title: `Which ${kind.label} still fits?`,
      description: `Draw your reef tank and see which ${kind.plural} fit it, with the measurements behind every answer and what else would have to change.`,
      canonical: `${paths.find}?kind=${kind.key}`,
    }
  },
}
