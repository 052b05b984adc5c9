import type { Page } from '../page-route'

export const page: Page = {
  Component: () => <h1>home</h1>,
  head: () => ({ title: 'home', description: '' }),
}
