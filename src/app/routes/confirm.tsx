import { ConfirmPage } from '../../features/accounts/components/confirm-page'
import type { Page } from '../page-route'

export const page: Page = {
  Component: ConfirmPage,
  head: () => ({
    title: 'Confirm your address',
    description: 'Confirm an e-mail address by the link in a letter.',
    isUnlisted: true,
  }),
}
