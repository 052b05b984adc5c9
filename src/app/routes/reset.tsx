import { ResetPage } from '../../features/accounts/components/reset-page'
import type { Page } from '../page-route'

export const page: Page = {
  Component: ResetPage,
  head: () => ({
    title: 'Choose a new password',
    description: 'Choose a new password by the link in a letter.',
    isUnlisted: true,
  }),
}
