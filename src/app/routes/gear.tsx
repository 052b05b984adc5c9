import type { Page } from '../page-route'

export const page: Page = {
  Component: () => <h1>gear</h1>,
  head: () => ({ title: 'gear', description: '' }),
}
