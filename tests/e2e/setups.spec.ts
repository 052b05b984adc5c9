import type { Page } from '@playwright/test'
import { expect, expectNoAxeViolations, test } from '../support/browser'

/** A small tank with a rear chamber and a titanium rod; nothing in it measures salinity. */
const setup = new URLSearchParams({
  country: 'US',
  'tank.volumeL': '25 gal',
  'tank.chambers.0.id': 'rear-1',
  'tank.chambers.0.lengthMm': '6 in',
  'tank.chambers.0.widthMm': '5 in',
  'tank.chambers.0.waterDepthMm': '13 in',
  'room.coldestC': '60 °F',
  'items.heater.kind': 'heater',
  'items.heater.gear': 'emberfathom-tinder-100',
  'items.strip.kind': 'power-strip',
  'items.strip.gear': 'oakrudder-bench-7',
  'items.net.kind': 'net',
}).toString()

const report = `/setups/link?${setup}`

const sideways = (page: Page) => page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth)

test('what was typed is there again after Back, a reload and a switch of units', async ({ page }) => {
  await page.goto('/setups/new')
  await page.getByLabel('Tank volume').fill('20')
  await page.getByLabel('Outside height').fill('16')
  await page.getByRole('button', { name: /^Millimetres/ }).click()
  await expect(page.getByLabel('Tank volume')).toHaveValue('20 gal')
  await expect(page.getByLabel('Outside height')).toHaveValue('16 in')
  await page.getByLabel('Coldest room').fill('17')
  await expect(page).toHaveURL(/room\.coldestC=17/)
  await page.reload()
  await expect(page.getByLabel('Coldest room')).toHaveValue(/^17/)
  await page.getByRole('button', { name: 'Show the report' }).last().click()
  await expect(page).toHaveURL(/\/setups\/link\?/)
  await page.goBack()
  await expect(page).toHaveURL(/\/setups\/new\?/)
  await expect(page.getByLabel('Tank volume')).toHaveValue('20 gal')
  await expect(page.getByLabel('Coldest room')).toHaveValue(/^17/)
})

for (const width of [360, 1280]) {
  test.describe(`a setup at ${width} px`, () => {
    test.use({ viewport: { width, height: 900 } })

    test('is described in one form, and a setup that forgot how to measure salinity is told so', async ({ page }) => {
      await page.goto('/')
      await page.getByRole('link', { name: 'Describe my setup' }).click()
      await expect(page.getByRole('heading', { level: 1 })).toHaveText('Describe your setup')
      await page.getByLabel('Tank volume').fill('25')
      await page.getByLabel('Coldest room').fill('60')
      await page.getByLabel('Add a piece from the catalogue').fill('Emberfathom Tinder 100')
      await page.getByLabel('Add a piece from the catalogue').press('Enter')
      const heater = page.getByRole('group', { name: 'Emberfathom · Tinder 100' })
      await expect(heater).toBeFocused()
      await expect(page.getByLabel('Tank volume')).toHaveValue('25 gal')

      await page.getByLabel('Or describe one yourself').selectOption('net')
      await page.getByRole('button', { name: 'Add it by its measures' }).click()
      await expect(page.getByRole('group', { name: 'Net' })).toBeFocused()
      await page.getByRole('group', { name: 'Net' }).getByLabel('Opening').first().fill('4')
      await page.getByRole('button', { name: 'Show the report' }).last().click()

      await expect(page).toHaveURL(/\/setups\/link\?tank\.volumeL=25%20gal/)
      const missing = page.locator('section').filter({ has: page.getByRole('heading', { name: 'What is missing' }) })
      await expect(missing).toContainText('Nothing measures salinity')
      await expect(missing.getByRole('link', { name: /salinity meters fit/ })).toHaveAttribute('href', /salinity-meter/)
      await expect(page.getByRole('img', { name: /^Plugs and outlets/ })).toBeVisible()
      expect(await sideways(page)).toBeLessThanOrEqual(0)
    })

    test('shows its drawings, budgets and pieces, and keeps inside the page', async ({ page }) => {
      await page.goto(report)
      await expect(page.getByRole('group', { name: 'From above' })).toBeVisible()
      await expect(page.getByRole('img', { name: /front and above/ }).first()).toBeVisible()
      await expect(page.getByRole('img', { name: /Heat, from the coldest night/ })).toBeVisible()
      await expect(page.getByRole('table')).toContainText('Together')
      await expect(page.getByRole('heading', { name: /Emberfathom · Tinder 100/ })).toBeVisible()
      expect(await sideways(page)).toBeLessThanOrEqual(0)
    })
  })
}

test('an assumption is confirmed with a press and changed by keyboard, and both are in the link', async ({ page }) => {
  await page.goto(report)
  await page.getByText(/^\d+ more$/).click()
  await page.getByRole('link', { name: /That is right: humidity/i }).click()
  await expect(page).toHaveURL(/room\.relativeHumidity=50%25/)
  const warmest = page.getByRole('button', { name: /^Warmest room, .*assumed/ })
  await warmest.focus()
  await page.keyboard.press('Enter')
  await expect(page.getByRole('dialog').getByLabel('Warmest room')).toBeFocused()
  await page.keyboard.type('90 F')
  await page.keyboard.press('Enter')
  await expect(page).toHaveURL(/room\.warmestC=90%20F/)
  await expect(page.getByRole('img', { name: /Heat, from the coldest/ })).toBeVisible()
})

test('wrong fields are named in a summary that takes focus, and everything typed is kept', async ({
  page,
  allowConsole,
}) => {
  // The browser's own line for an answer of 422.
  allowConsole(/Failed to load resource/)
  await page.goto('/setups/new')
  await page.getByLabel('Tank volume').fill('soon')
  await page.getByLabel('Coldest room').fill('60')
  await page.getByRole('button', { name: 'Show the report' }).last().click()
  const summary = page.getByRole('alert')
  await expect(summary).toBeFocused()
  await expect(summary).toContainText(/Tank volume: .*soon/)
  await expect(page.getByLabel('Coldest room')).toHaveValue('60 °F')
  await summary.getByRole('link').first().click()
  await expect(page.getByLabel('Tank volume')).toBeFocused()
  await expect(page.getByLabel('Tank volume')).toHaveValue('soon')
  await page.getByLabel('Tank volume').fill('25')
  await page.getByLabel('Tank volume').press('Enter')
  await expect(page.getByRole('heading', { name: 'What is missing' })).toBeVisible()
})

test('measures that cannot all be true are named, each leading to its field', async ({ page, allowConsole }) => {
  allowConsole(/Failed to load resource/)
  const answer = await page.goto(
    '/setups/link?tank.outerLengthMm=24%20in&tank.outerWidthMm=16%20in&tank.outerHeightMm=16%20in&tank.chambers.0.lengthMm=30%20in',
  )
  expect(answer?.status()).toBe(422)
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('Your setup needs another look')
  await page.getByRole('alert').getByRole('link').first().click()
  await expect(page.getByLabel('Chamber length')).toBeFocused()
})

test('the form works by keyboard alone', async ({ page }) => {
  await page.goto('/setups/new')
  await page.getByLabel('Tank volume').focus()
  await page.keyboard.type('25 gal')
  await page.keyboard.press('Enter')
  await expect(page).toHaveURL(/\/setups\/link\?tank\.volumeL=25%20gal/)
  await expect(page.getByRole('heading', { name: 'Assumed until you say' })).toBeVisible()
})

test.describe('without scripts', () => {
  test.use({ javaScriptEnabled: false })

  test('pieces are looked up, added, described and taken out, and the report is shown', async ({ page }) => {
    await page.goto('/setups/new')
    await page.getByLabel('Look your tank up').fill('Alcove')
    await page.getByLabel('Tank volume').fill('25')
    await page.getByRole('button', { name: 'Search' }).first().click()
    await page.getByRole('button', { name: /This is mine.*Alcove 25/ }).click()
    await expect(page.getByText('Its recorded measures are used')).toBeVisible()
    await expect(page.getByLabel('Tank volume')).toHaveValue('25 gal')
    await page.getByLabel('Add a piece from the catalogue').fill('Tinder')
    await page.getByRole('button', { name: 'Search' }).click()
    await page
      .getByRole('button', { name: /^Add: Emberfathom Tinder/ })
      .first()
      .click()
    await expect(page.getByRole('group', { name: /Emberfathom · Tinder/ })).toBeVisible()
    await page.getByLabel('Or describe one yourself').selectOption('net')
    await page.getByRole('button', { name: 'Add it by its measures' }).click()
    await page.getByRole('button', { name: 'Take it out: Net' }).click()
    await expect(page.getByRole('group', { name: 'Net' })).toHaveCount(0)
    await page.getByRole('button', { name: 'Show the report' }).click()
    await expect(page).toHaveURL(/\/setups\/link\?.*glaswend-alcove-25/)
    await expect(page.getByRole('heading', { name: 'What is missing' })).toBeVisible()
    await page.getByRole('link', { name: /That is right: humidity/i }).click()
    await expect(page).toHaveURL(/relativeHumidity/)
  })
})

test('a measuring sheet is printed for any kind', async ({ page }) => {
  await page.goto('/setups/measuring-sheet?kind=heater')
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('Measuring sheet: heater')
  await expect(page.getByText('From the lower tip to the top of the cap, without the cord.')).toBeVisible()
  await page.getByLabel('Sheet for').selectOption('tank')
  await page.getByRole('button', { name: 'Show' }).click()
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('Measuring sheet: tank')
})

for (const colorScheme of ['light', 'dark'] as const)
  for (const [name, address] of Object.entries({
    'the form': '/setups/new',
    'the form with pieces and wrong fields': `/setups/new?${setup}&mains.volts=12&items.own.kind=light`,
    'the report': report,
    'the measuring sheet': '/setups/measuring-sheet?kind=return-pump',
  }))
    test(`${name} has nothing that axe objects to (${colorScheme})`, async ({ page, allowConsole }) => {
      test.setTimeout(180_000)
      allowConsole(/Failed to load resource/)
      await page.emulateMedia({ colorScheme })
      await page.goto(address)
      await expect(page.getByRole('heading', { level: 1 })).toBeVisible()
      await expectNoAxeViolations(page)
    })
