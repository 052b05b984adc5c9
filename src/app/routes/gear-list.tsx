import { getKind } from '#shared/kinds/index'
import { paths } from '../../config/paths'
import { BrowsePage } from '../../features/browse/components/browse-page'
import { isPlain } from '../../features/browse/link/browse-state'
import { readVisit } from '../../features/browse/link/read-visit'
import { loadBrowse } from '../../features/browse/load-browse'
import type { Page } from '../page-route'

export const page: Page = {
  Component: BrowsePage,
  load: (app, { request }) => loadBrowse(app, new URL(request.url)),
  head: ({ app, url }) => {
    const { state, problems } = readVisit(url.searchParams, app.preferences.get().system)
    // There are endlessly many ways to narrow a list down; a search engine needs to know the lists.
    const isUnlisted = !isPlain(state) || problems.length > 0
    const shared = {
      canonical: state.kind === null ? paths.gearList : `${paths.gearList}?kind=${state.kind}`,
      ...(isUnlisted && { isUnlisted }),
    }
    if (state.kind === null)
      return {
        title: 'Gear',
        description:
          'Every kind of reef-tank gear in the catalogue, by its measures, with where each number is from. Filter, compare and download.',
        ...shared,
      }
    const { plural } = getKind(state.kind)
    return {
      title: `${plural.slice(0, 1).toUpperCase()}${plural.slice(1)}`,
      description: `All ${plural} in the catalogue by their measures: filter, order, set up to four side by side, and see where each number is from.`,
      ...shared,
    }
  },
}
