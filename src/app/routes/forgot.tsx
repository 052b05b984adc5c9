import { ForgotPage } from '../../features/accounts/components/forgot-page'
import type { Page } from '../page-route'

export const page: Page = {
  Component: ForgotPage,
  head: () => ({
    title: 'Ask for a new password',
    description: 'Have a link sent with which to choose a new password.',
    isUnlisted: true,
  }),
}
