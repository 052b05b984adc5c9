import { paths } from '../../config/paths'
import { NewSetupPage } from '../../features/setups/components/new-setup-page'
import { loadForm } from '../../features/setups/load-form'
import type { Page } from '../page-route'

export const page: Page = {
  Component: NewSetupPage,
  load: (app, { request }) => loadForm(app, new URL(request.url)),
  head: ({ url }) => ({
    title: 'Describe your setup',
    description:
      'Tank, chambers, room, goals and gear on one page: see what fits together, what is missing, and what can take the place of a piece that is gone.',
    canonical: paths.setupNew,
    ...(url.search !== '' && { isUnlisted: true }),
  }),
}
