import { SignUpPage } from '../../features/accounts/components/sign-up-page'
import type { Page } from '../page-route'

export const page: Page = {
  Component: SignUpPage,
  head: () => ({
    title: 'Sign up',
    description: 'Sign up to contribute measurements and corrections.',
    isUnlisted: true,
  }),
}
