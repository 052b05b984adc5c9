import { expect, test } from '../support/browser'
import { describedFinder } from './setup'

test('switching units changes every number at once, and is remembered', async ({ page }) => {
  await page.goto(describedFinder)
  const card = page.getByRole('article').first()
  await expect(card).toContainText(/in long/)
  await page.getByRole('button', { name: /^Millimetres/ }).click()
  await expect(card).toContainText(/mm long/)
  await expect(card).toContainText(/°C/)
  await expect(page.getByRole('button', { name: /water depth 305/i }).first()).toBeVisible()
  await page.reload()
  await expect(card).toContainText(/mm long/)
})

test('switching the theme paints the page at once, and is remembered', async ({ page }) => {
  await page.emulateMedia({ colorScheme: 'light' })
  await page.goto('/')
  const paint = () => page.evaluate(() => getComputedStyle(document.documentElement).backgroundColor)
  const light = await paint()
  await page.getByRole('button', { name: 'Dark water' }).click()
  expect(await paint()).not.toBe(light)
  const dark = await paint()
  await page.reload()
  expect(await paint()).toBe(dark)
})
