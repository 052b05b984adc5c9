import { paths } from '../../config/paths'
import { SwapPage } from '../../features/swap/components/swap-page'
import { loadSwap } from '../../features/swap/load-swap'
import type { Page } from '../page-route'

export const page: Page = {
  Component: SwapPage,
  load: (app, { request, params }) => loadSwap(app, new URL(request.url), params.itemId ?? ''),
  head: () => ({
    title: 'What replaces it?',
    description:
      'A piece that is gone beside what could take its place in this setup: verdicts, what else would change, and what it needs besides.',
    canonical: paths.setupNew,
    isUnlisted: true,
  }),
}
