import { UnsubscribePage } from '../../features/admin/components/unsubscribe-page'
import type { Page } from '../page-route'

export const page: Page = {
  Component: UnsubscribePage,
  head: () => ({ title: 'No more notices', description: 'Ends notices by e-mail.', isUnlisted: true }),
}
