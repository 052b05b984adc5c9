import { SignInPage } from '../../features/accounts/components/sign-in-page'
import type { Page } from '../page-route'

export const page: Page = {
  Component: SignInPage,
  head: () => ({ title: 'Sign in', description: 'Sign in to contribute measurements.', isUnlisted: true }),
}
