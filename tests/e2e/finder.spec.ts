import type { Page } from '@playwright/test'
import { expect, test } from '../support/browser'
import { describedFinder, question } from './setup'

const counts = /\d+ fit, \d+ with changes, \d+ do not fit, \d+ lack data\./

const status = (page: Page) => page.getByRole('status').filter({ hasText: counts })

async function readCounts(page: Page): Promise<string> {
  await expect(status(page)).toHaveText(counts)
  return (await status(page).textContent()) ?? ''
}

for (const width of [360, 1280]) {
  test.describe(`the finder at ${width} px`, () => {
    test.use({ viewport: { width, height: 900 } })

    test('leads from a question on the start page to an explained answer, by pointer', async ({ page }) => {
      await page.goto('/')
      await page.getByLabel('Ask in your own words').fill(question)
      await page.getByRole('button', { name: 'Answer' }).click()
      await expect(page).toHaveURL(/\/find\?kind=heater&asked=/)
      await expect(page.getByRole('list', { name: 'We read' })).toContainText('nothing left over')
      const before = await readCounts(page)

      await page
        .getByRole('button', { name: /^rear chamber, water depth/i })
        .first()
        .click()
      const field = page.getByRole('dialog').getByLabel('Chamber water depth')
      await expect(field).toBeFocused()
      await field.fill('8 1/2')
      await expect(page.getByRole('dialog')).toContainText('8 1/2 in = 215.9 mm')
      await field.press('Enter')
      await expect(page.getByRole('dialog')).toBeHidden()
      await expect(page).toHaveURL(/waterDepthMm=8%201%2F2%20in/)
      await expect(status(page)).not.toHaveText(before)

      await page.goBack()
      await expect(status(page)).toHaveText(before)

      const card = page
        .getByRole('listitem')
        .filter({ has: page.getByRole('article') })
        .first()
      await card.getByText(/^All \d+ checks$/).click()
      await expect(card.getByText('Room for the rod').first()).toBeVisible()
      await card.getByRole('link', { name: 'show in the drawing' }).click()
      await expect(page).toHaveURL(/picked=/)

      await page
        .getByRole('link', { name: /too long/ })
        .first()
        .click()
      await expect(page).toHaveURL(/show=no&check=heater\.space/)
      await expect(page.locator('#group-no').getByRole('article').first()).toBeVisible()

      const sideways = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth)
      expect(sideways).toBeLessThanOrEqual(0)
    })

    test('works by keyboard alone', async ({ page }) => {
      await page.goto(describedFinder)
      const before = await readCounts(page)
      await page.keyboard.press('Tab')
      await expect(page.getByRole('link', { name: 'Skip to the content' })).toBeFocused()
      await page.keyboard.press('Enter')

      const depth = page.getByRole('button', { name: /^rear chamber, water depth/i }).first()
      for (let presses = 0; presses < 60; presses++) {
        if (await depth.evaluate((element) => element === document.activeElement)) break
        await page.keyboard.press('Tab')
      }
      await expect(depth).toBeFocused()
      await page.keyboard.press('Enter')
      await page.keyboard.press('ControlOrMeta+a')
      await page.keyboard.type('9')
      await page.keyboard.press('Enter')
      await expect(status(page)).not.toHaveText(before)
      await expect(depth).toBeFocused()

      const scale = page.getByRole('listbox', { name: /^Length/ })
      for (let presses = 0; presses < 60; presses++) {
        if (await scale.evaluate((element) => element === document.activeElement)) break
        await page.keyboard.press('Tab')
      }
      await page.keyboard.press('ArrowRight')
      await page.keyboard.press('ArrowRight')
      await expect(page).toHaveURL(/picked=/)
      await expect(page.getByRole('option', { selected: true }).first()).toBeAttached()
    })
  })
}

test('nothing is fetched again after the page arrives', async ({ page }) => {
  const calls: string[] = []
  page.on('request', (request) => {
    if (request.url().includes('/api/')) calls.push(request.url())
  })
  await page.goto(describedFinder)
  await readCounts(page)
  await page.waitForLoadState('networkidle')
  expect(calls).toEqual([])
})

test('adds a chamber, and takes it out again', async ({ page }) => {
  await page.goto('/find?kind=heater&tank.volumeL=20%20gal')
  await readCounts(page)
  await page.getByRole('button', { name: 'Add a rear chamber' }).last().click()
  const dialog = page.getByRole('dialog')
  await dialog.getByLabel('Chamber length').fill('4 in')
  await dialog.getByRole('button', { name: 'Apply' }).click()
  await expect(page).toHaveURL(/tank\.chambers\.0\.lengthMm=4%20in/)
  await page
    .getByRole('button', { name: /^rear chamber, along the tank/i })
    .first()
    .click()
  await dialog.getByRole('button', { name: 'Take the chamber out' }).click()
  await expect(page).not.toHaveURL(/chambers/)
})

test('asks the same setup for another kind', async ({ page }) => {
  await page.goto(describedFinder)
  await page.getByLabel('Kind of gear').first().selectOption('scraper')
  await expect(page).toHaveURL(/kind=scraper.*tank\.volumeL/)
  await expect(page).toHaveTitle(/Which scraper still fits/)
  await expect(page.getByRole('article').first()).toContainText(/wall/)
})
