import type { Page } from '../page-route'

export const page: Page = {
  Component: () => <h1>method</h1>,
  head: () => ({ title: 'method', description: '' }),
}
