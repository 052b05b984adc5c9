import { lettersQuery, readLetterFilters } from '../../features/admin/api/letters-query'
import { LettersPage } from '../../features/admin/components/letters-page'
import { loadFresh } from '../../lib/loading'
import type { Page } from '../page-route'

export const page: Page = {
  Component: LettersPage,
  load: async (app, { request }) => {
    await loadFresh(app, lettersQuery(app.api, readLetterFilters(new URL(request.url).searchParams)))
  },
  head: () => ({ title: 'Letters', description: 'What became of the mail.', isUnlisted: true }),
}
