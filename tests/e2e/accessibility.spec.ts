import { expect, expectNoAxeViolations, test } from '../support/browser'
import { describedFinder } from './setup'

// axe looks at every element of a page with hundreds of marks.
test.describe.configure({ timeout: 180_000 })

const pages = {
  'the start page': '/',
  'the empty finder': '/find',
  'the finder with answers': `${describedFinder}&show=no&check=heater.space`,
  'the finder with wrong fields': `${describedFinder}&mains.volts=12`,
  'the method page': '/method',
  'a page that is not there': '/nowhere',
}

for (const colorScheme of ['light', 'dark'] as const) {
  for (const [name, address] of Object.entries(pages)) {
    test(`${name} has nothing that axe objects to (${colorScheme})`, async ({ page, allowConsole }) => {
      // The browser's own line for a page that answers 404 or 422.
      allowConsole(/Failed to load resource/)
      await page.emulateMedia({ colorScheme })
      await page.goto(address)
      await expect(page.getByRole('heading', { level: 1 })).toBeVisible()
      await expectNoAxeViolations(page)
    })
  }

  test(`a spec sheet and an opened measure have nothing that axe objects to (${colorScheme})`, async ({ page }) => {
    await page.emulateMedia({ colorScheme })
    await page.goto(describedFinder)
    await page
      .getByRole('button', { name: /^rear chamber, water depth/i })
      .first()
      .click()
    await expect(page.getByRole('dialog')).toBeVisible()
    await expectNoAxeViolations(page)
    await page.keyboard.press('Escape')
    await page.getByRole('article').first().getByRole('link').first().click()
    await expect(page).toHaveURL(/\/gear\//)
    await expect(page.getByRole('heading', { name: 'Revisions' })).toBeVisible()
    await expectNoAxeViolations(page)
  })
}
