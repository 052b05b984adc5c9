import { expect, test } from '../support/browser'
import { describedFinder } from './setup'

const away = {
  status: 503,
  contentType: 'application/problem+json',
  body: JSON.stringify({
    type: 'urn:stillfits:problem:unavailable',
    title: 'The catalogue cannot be reached just now',
    status: 503,
    detail: 'Try again.',
    instance: '/api/v1/fit',
    requestId: 'test',
  }),
}

test.beforeEach(({ allowConsole }) => allowConsole(/Failed to load resource/))

test('an unknown address answers 404 and leads on', async ({ page }) => {
  const answer = await page.goto('/gear/no-such-piece-anywhere')
  expect(answer?.status()).toBe(404)
  await expect(page.getByRole('heading', { name: 'Not found' })).toBeVisible()
  expect((await page.goto('/nowhere/at/all'))?.status()).toBe(404)
  await page.getByRole('link', { name: 'Open the finder' }).click()
  await expect(page).toHaveURL(/\/find/)
})

test('while the catalogue is away the finder says so, keeps the setup, and recovers by itself', async ({ page }) => {
  await page.goto(describedFinder)
  await expect(page.getByRole('article').first()).toBeVisible()
  await page.route('**/api/v1/fit', (route) => route.fulfill(away))
  await page.getByLabel('Kind of gear').first().selectOption('temperature-controller')
  await expect(page.getByRole('alert')).toContainText('cannot be reached just now')
  await expect(page).toHaveURL(/kind=temperature-controller.*tank\.volumeL=20%20gal/)
  await page.unroute('**/api/v1/fit')
  await expect(page.getByRole('article').first()).toBeVisible({ timeout: 15_000 })
})

test('a spec sheet that cannot be reached comes by itself once it can', async ({ page }) => {
  await page.goto(describedFinder)
  await page.route('**/api/v1/gear/**', (route) => route.fulfill(away))
  await page.getByRole('article').first().getByRole('link').first().click()
  await expect(page.getByRole('heading', { name: 'Away for a moment' })).toBeVisible()
  await page.unroute('**/api/v1/gear/**')
  await expect(page.getByRole('heading', { name: 'What decides whether it fits' })).toBeVisible({ timeout: 15_000 })
})

test('a measure that cannot be read stays as typed and says what is expected', async ({ page }) => {
  await page.goto(describedFinder)
  await page
    .getByRole('button', { name: /^rear chamber, water depth/i })
    .first()
    .click()
  const dialog = page.getByRole('dialog')
  const field = dialog.getByLabel('Chamber water depth')
  for (const [typed, reason] of [
    ['twelve-ish', /has no number/],
    ['12 gallons', /is a volume; a length is expected/],
    ['40 ft', /outside of what this can be/],
  ] as const) {
    await field.fill(typed)
    await field.press('Enter')
    await expect(dialog).toContainText(reason)
    await expect(field).toHaveValue(typed)
    await expect(field).toBeFocused()
  }
})
