import type { Page } from '@playwright/test'
import { expect, expectNoAxeViolations, test } from '../support/browser'

const query = (fields: Record<string, string>) => new URLSearchParams(fields).toString()

/** 25 gal, a cool room, little pressure at the tap and a unit that raises it, a titanium rod without a thermostat of its own. */
const american = query({
  country: 'US',
  'tank.gear': 'glaswend-alcove-25',
  'room.coldestC': '60 °F',
  'water.feedKPa': '30 psi',
  'items.heater.kind': 'heater',
  'items.heater.gear': 'emberfathom-tinder-100',
  'items.controller.kind': 'temperature-controller',
  'items.controller.gear': 'emberfathom-sentry-s1-us',
  'items.ro.kind': 'ro-unit',
  'items.ro.gear': 'pelagane-rain-100-b',
  'items.strip.kind': 'power-strip',
  'items.strip.gear': 'oakrudder-bench-7',
})

/** 170 L with what stands in it. */
const british = query({
  country: 'GB',
  'tank.gear': 'panehaven-nook-170',
  'room.coldestC': '16 °C',
  'items.heater.kind': 'heater',
  'items.heater.gear': 'emberfathom-tinder-200',
  'items.controller.kind': 'temperature-controller',
  'items.controller.gear': 'emberfathom-sentry-s1',
})

const cards = (page: Page) => page.locator('main ol > li').filter({ has: page.getByRole('article') })

for (const width of [360, 1280]) {
  test.describe(`a swap at ${width} px`, () => {
    test.use({ viewport: { width, height: 900 } })

    test('a titanium heater that is gone gives way to another, and the swap can be undone', async ({ page }) => {
      await page.goto(`/setups/link?${american}`)
      await page.getByRole('link', { name: /It is gone: what replaces Emberfathom · Tinder 100/ }).click()
      await expect(page.getByRole('heading', { level: 1 })).toHaveText('What replaces Emberfathom · Tinder 100?')
      await expect(page.getByRole('img', { name: /Side by side/ })).toBeVisible()
      await expect(cards(page)).toHaveCount(3)
      const first = cards(page).first()
      await expect(first).toContainText('Beside what is gone')
      const chosen = await first.getByRole('heading', { level: 3 }).innerText()
      expect(await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth)).toBeLessThanOrEqual(0)
      await first.getByRole('link', { name: /^Put this one in/ }).click()

      await expect(page).toHaveURL(/\/setups\/link\?.*items\.heater\.state=planned/)
      const name = chosen.replace(/^A:\s*/, '').trim()
      await expect(page.getByText('was put in. This is the setup with it.')).toContainText(name)
      const list = page.locator('section').filter({ has: page.getByRole('heading', { name: 'Shopping list' }) })
      await expect(list).toContainText(name)
      await page.getByRole('link', { name: 'Undo' }).click()
      await expect(page).toHaveURL(/items\.heater\.gear=emberfathom-tinder-100&items\.heater\.state=gone/)
      await expect(page.getByRole('link', { name: /What replaces it/ })).toBeVisible()
    })
  })
}

test('a 170 L tank that is gone: others of about its size, with what would change for the rest', async ({ page }) => {
  await page.goto(`/setups/link?${british}`)
  await page.getByRole('link', { name: /The tank is gone/ }).click()
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('What replaces Panehaven · Nook 170?')
  const first = cards(page).first()
  await expect(first).toContainText('What else would change')
  await first.getByRole('link', { name: /^Put this one in/ }).click()
  await expect(page).not.toHaveURL(/tank\.gear=panehaven-nook-170&/)
  await page.getByRole('link', { name: 'Undo' }).click()
  await expect(page).toHaveURL(/tank\.gear=panehaven-nook-170&/)
})

test('an RO/DI unit that is gone where line pressure is low: those with a pump of their own come first, others with one', async ({
  page,
}) => {
  await page.goto(`/setups/link?${american}`)
  await page.getByRole('link', { name: /It is gone: what replaces Pelagane · Rain 100 B/ }).click()
  await expect(page.getByRole('heading', { level: 1 })).toContainText('Rain 100 B')
  for (const card of (await cards(page).all()).slice(0, 3)) {
    await expect(card).toContainText(/Fits(?! with changes)/)
    await expect(card).not.toContainText('add a booster pump')
  }
  await page.getByRole('link', { name: 'The next three' }).click()
  await expect(page).toHaveURL(/cursor=/)
  const needing = cards(page).filter({ hasText: 'add a booster pump' }).first()
  await expect(needing).toContainText('Fits with changes')
  await needing
    .getByRole('link', { name: /^Put both in/ })
    .first()
    .click()
  await expect(page).toHaveURL(/items\.ro\.state=planned/)
  const list = page.locator('section').filter({ has: page.getByRole('heading', { name: 'Shopping list' }) })
  await expect(list.getByRole('listitem').filter({ hasText: '1 × ' })).toHaveCount(2)
  await page.getByRole('link', { name: 'Undo' }).click()
  await expect(page).toHaveURL(/items\.ro\.gear=pelagane-rain-100-b/)
  await expect(list.getByRole('listitem').filter({ hasText: '1 × ' })).toHaveCount(0)
})

test('works by keyboard, and without scripts', async ({ page, browser, baseURL }) => {
  await page.goto(`/setups/link/swap/heater?${american}`)
  const put = page.getByRole('link', { name: /^Put this one in/ }).first()
  await put.focus()
  await page.keyboard.press('Enter')
  await expect(page).toHaveURL(/items\.heater\.state=planned/)

  const plain = await browser.newContext({ javaScriptEnabled: false })
  const still = await plain.newPage()
  await still.goto(`${baseURL}/setups/link/swap/heater?${american}`)
  await still
    .getByRole('link', { name: /^Put this one in/ })
    .first()
    .click()
  await expect(still.getByText('was put in')).toBeVisible()
  await plain.close()
})

test('a piece that the setup does not have is said to be missing, and the setup is kept', async ({
  page,
  allowConsole,
}) => {
  allowConsole(/Failed to load resource/)
  const answer = await page.goto(`/setups/link/swap/nothing?${american}`)
  expect(answer?.status()).toBe(422)
  await page.getByRole('link', { name: 'Open the setup' }).click()
  await expect(page.getByRole('heading', { name: 'What is missing' })).toBeVisible()
})

for (const colorScheme of ['light', 'dark'] as const)
  test(`the swap page has nothing that axe objects to (${colorScheme})`, async ({ page }) => {
    test.setTimeout(180_000)
    await page.emulateMedia({ colorScheme })
    await page.goto(`/setups/link/swap/heater?${american}`)
    await expect(cards(page)).toHaveCount(3)
    await expectNoAxeViolations(page)
  })
