import { expect, test } from '../support/browser'
import { describedFinder, question } from './setup'

test.use({ javaScriptEnabled: false })

test('a question is answered without scripts', async ({ page }) => {
  await page.goto('/')
  await page.getByLabel('Ask in your own words').fill(question)
  await page.getByRole('button', { name: 'Answer' }).click()
  await expect(page).toHaveURL(/\/find\?kind=heater&asked=/)
  await expect(page.getByRole('article').first()).toContainText(/holds 78/)
})

test('the plain form takes the person’s own units and answers', async ({ page }) => {
  await page.goto('/find')
  await page.getByText('Every measure as a plain form').click()
  await page.getByRole('textbox', { name: 'Tank volume' }).fill('20')
  await page.getByRole('textbox', { name: 'Coldest room' }).fill('60')
  await page.getByRole('button', { name: 'Show what fits' }).click()
  await expect(page).toHaveURL(/tank\.volumeL=20%20gal.*room\.coldestC=60%20%C2%B0F/)
  await expect(page.getByRole('article').first()).toBeVisible()
})

test('wrong fields are named with what is allowed, their text is kept, and the rest is answered', async ({
  page,
  allowConsole,
}) => {
  // The browser's own line for an answer of 422.
  allowConsole(/Failed to load resource/)
  const answer = await page.goto(`${describedFinder}&mains.volts=12&tank.waterLineMm=soon`)
  expect(answer?.status()).toBe(422)
  const summary = page.getByRole('alert')
  await expect(summary).toContainText(/Mains voltage: “12”.*100, 120, 230/)
  await expect(summary).toContainText(/Water line: .*soon/)
  await expect(page.getByRole('textbox', { name: 'Water line', exact: true })).toHaveValue('soon')
  await expect(page.getByRole('article').first()).toBeVisible()
})

test('the drawing leads to the fields, and answers open and go on, by plain links', async ({ page }) => {
  await page.goto(describedFinder)
  const depth = page.getByRole('button', { name: /^rear chamber, water depth/i }).first()
  await expect(depth).toHaveAttribute('href', '#field-tank-chambers-0-waterDepthMm')
  await page
    .getByRole('link', { name: /too long/ })
    .first()
    .click()
  await expect(page.locator('#group-no').getByRole('article').first()).toBeVisible()
  const first = await page.locator('#group-no').getByRole('article').first().textContent()
  await page.locator('#group-no').getByRole('link', { name: 'More' }).click()
  await expect(page.locator('#group-no').getByRole('article').first()).not.toHaveText(first ?? '')
})

test('units and theme are switched by a plain form, and the setup stays', async ({ page }) => {
  await page.goto(describedFinder)
  await page.getByRole('button', { name: /^Millimetres/ }).click()
  await expect(page).toHaveURL(/tank\.volumeL=20(%20|\+)gal/)
  await expect(page.getByRole('article').first()).toContainText(/mm long/)
  await page.getByRole('button', { name: 'Dark water' }).click()
  await expect(page.locator('html')).toHaveAttribute('data-theme', 'dark')
})
