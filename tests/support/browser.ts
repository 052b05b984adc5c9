import AxeBuilder from '@axe-core/playwright'
import { test as base, expect, type Page } from '@playwright/test'
import { e2eOriginVariable } from './e2e-server'

export { expect }

interface Fixtures {
  /** Console lines that a test provokes on purpose, such as the browser's own line for a 404. */
  allowConsole: (pattern: RegExp) => void
}

/** Until a page listens, a press on what is drawn follows the plain link that it is without scripts. */
async function waitUntilLive(page: Page): Promise<void> {
  const hasScripts = await page.evaluate(() => document.querySelector('script[type="module"]') !== null)
  if (hasScripts) await page.locator('html[data-live]').waitFor({ state: 'attached' })
}

/** Playwright's test, on the built app; fails on a console error or warning, or an uncaught one, that it did not allow. */
export const test = base.extend<Fixtures>({
  // Playwright reads a fixture's needs from this pattern: it must be written out, even when empty.
  // eslint-disable-next-line no-empty-pattern
  baseURL: async ({}, use) => {
    const origin = process.env[e2eOriginVariable]
    if (!origin) throw new Error('The built server was not started.')
    await use(origin)
  },
  page: async ({ page, javaScriptEnabled }, use) => {
    const [goto, reload] = [page.goto.bind(page), page.reload.bind(page)]
    const settle = async <T>(answer: T, waitUntil: string | undefined): Promise<T> => {
      if (javaScriptEnabled && waitUntil !== 'commit') await waitUntilLive(page)
      return answer
    }
    page.goto = async (url, options) => settle(await goto(url, options), options?.waitUntil)
    page.reload = async (options) => settle(await reload(options), options?.waitUntil)
    await use(page)
  },
  allowConsole: [
    async ({ context }, use) => {
      const allowed: RegExp[] = []
      const said: string[] = []
      context.on('console', (message) => {
        if (['error', 'warning'].includes(message.type())) said.push(message.text())
      })
      context.on('weberror', (webError) => {
        said.push(`uncaught: ${webError.error().stack ?? webError.error().message}`)
      })
      await use((pattern) => allowed.push(pattern))
      const unexpected = said.filter((text) => !allowed.some((pattern) => pattern.test(text)))
      expect(unexpected, 'unexpected console output').toEqual([])
    },
    { auto: true },
  ],
})

/** WCAG 2.2 A and AA as far as axe can tell: no violation, and each one named with where it is. */
export async function expectNoAxeViolations(page: Page): Promise<void> {
  const { violations } = await new AxeBuilder({ page })
    .withTags(['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa'])
    .analyze()
  const found = violations.flatMap(({ id, help, nodes }) =>
    nodes.map((node) => `${id}: ${help} at ${node.target.join(' ')}`),
  )
  expect(found).toEqual([])
}
