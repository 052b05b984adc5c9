import { getKind, isKindKey } from '#shared/kinds/index'
import { paths } from '../../config/paths'
import { Finder } from '../../features/finder/components/finder'
import { loadFinder } from '../../features/finder/load-finder'
import type { Page } from '../page-route'

export const page: Page = {
  Component: Finder,
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
