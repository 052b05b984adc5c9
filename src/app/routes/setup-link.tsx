import { paths } from '../../config/paths'
import { SetupPage } from '../../features/setups/components/setup-page'
import { loadReport } from '../../features/setups/load-report'
import type { Page } from '../page-route'

export const page: Page = {
  Component: SetupPage,
  load: (app, { request }) => loadReport(app, new URL(request.url)),
  head: ({ url }) => ({
    title: url.searchParams.get('name')?.slice(0, 80) || 'Your setup',
    description: 'A reef setup as a whole: what fits together, what it uses of what it has, and what is missing.',
    canonical: paths.setup,
    isUnlisted: true,
  }),
}
