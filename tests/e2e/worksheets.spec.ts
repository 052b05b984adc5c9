import { expect, expectNoAxeViolations, test } from '../support/browser'
import { describedFinder, describedSetup } from './setup'

const setupQuery = new URLSearchParams([...new URLSearchParams(describedSetup)].filter(([key]) => key !== 'kind'))

for (const width of [360, 1280]) {
  test.describe(`at ${width} px`, () => {
    test.use({ viewport: { width, height: 800 } })

    test('a worksheet is found, typed into, worked out at once, and its address is the sheet', async ({ page }) => {
      await page.goto('/worksheets')
      await page.getByRole('link', { name: 'Salt for new water' }).click()
      await expect(page.getByRole('heading', { level: 1, name: 'Salt for new water' })).toBeVisible()
      await expect(page.getByText('An example.')).toBeVisible()
      await page.getByRole('textbox', { name: 'Water to mix' }).fill('40')
      await page.getByRole('textbox', { name: 'A pack makes' }).fill('50 gal')
      await page.getByRole('textbox', { name: 'Mass of a pack' }).fill('15 lb')
      // 40/50 of 15 lb at 35 ppt: 12 lb, by hand.
      await expect(page.getByRole('region', { name: 'Result' })).toContainText(/12\slb/)
      await expect(page).toHaveURL(/volumeL=40%20gal/)
      await page.reload()
      await expect(page.getByRole('region', { name: 'Result' })).toContainText(/12\slb/)
      await page.getByRole('button', { name: /^Millimetres/ }).click()
      // 12 lb × 0.45359237 kg.
      await expect(page.getByRole('region', { name: 'Result' })).toContainText(/5\.4\skg/)
      await expect(page.getByRole('textbox', { name: 'Water to mix' })).toHaveValue('40 gal')
    })

    test('a check of an answer leads to its working, filled in', async ({ page }) => {
      await page.goto(describedFinder)
      const answer = page.getByRole('article').first()
      await answer.locator('..').locator('summary').click()
      await page.getByRole('link', { name: 'Show the working: Room for the rod' }).first().click()
      await expect(page).toHaveURL(/\/worksheets\/rod-in-chamber\?lengthMm=/)
      await expect(page.getByRole('textbox', { name: 'Chamber water depth' })).toHaveValue('12 in')
      await expect(page.getByRole('region', { name: 'Result' })).toContainText(/stands upright|leans|lies flat/)
    })

    test('no page is wider than the window', async ({ page }) => {
      for (const path of [
        '/worksheets',
        '/worksheets/heat-balance',
        '/worksheets/power-load',
        '/worksheets/light-map',
      ]) {
        await page.goto(path)
        await expect(page.getByRole('heading', { level: 1 })).toBeVisible()
        const over = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth)
        expect(over, path).toBeLessThanOrEqual(0)
      }
    })
  })
}

test('a worksheet is filled in and sent with the keyboard alone', async ({ page }) => {
  await page.goto('/worksheets/seawater?clear=yes')
  const salinity = page.getByRole('textbox', { name: 'Salinity' })
  await salinity.focus()
  await page.keyboard.type('35')
  await page.keyboard.press('Tab')
  await page.keyboard.type('77')
  await page.keyboard.press('Enter')
  await expect(page).toHaveURL(/salinityPpt=35%20ppt&temperatureC=77%20%C2%B0F/)
  // EOS-80 by UNESCO 44: 1023.34 kg/m³ at 25 °C, which is 77 °F exactly.
  await expect(page.getByRole('region', { name: 'Result' })).toContainText(/1023\.34\skg\/m³/)
})

test('the setup that this browser remembers fills a worksheet in', async ({ page }) => {
  await page.goto(describedFinder)
  await expect(page.getByRole('article').first()).toBeVisible()
  await page.goto('/worksheets/heat-balance')
  await page.getByRole('link', { name: 'Fill in from my setup' }).click()
  await expect(page.getByRole('textbox', { name: 'Coldest room' })).toHaveValue('60 °F')
  await expect(page.getByRole('textbox', { name: 'Tank volume' })).toHaveValue('20 gal')
})

test.describe('without scripts', () => {
  test.use({ javaScriptEnabled: false })

  test('the form works as a plain form, in the person’s own units', async ({ page }) => {
    await page.goto('/worksheets/sand-bed?clear=yes')
    await page.getByRole('textbox', { name: 'Length of the bed' }).fill('24')
    await page.getByRole('textbox', { name: 'Width of the bed' }).fill('12')
    await page.getByRole('textbox', { name: 'Depth of the bed' }).fill('2')
    await page.getByRole('textbox', { name: 'Mass of a bag' }).fill('20')
    await page.getByRole('button', { name: 'Work it out' }).click()
    await expect(page).toHaveURL(/lengthMm=24%20in/)
    // 24 × 12 × 2 in is 9.439 L; at 1.54 kg/L 14.54 kg, or 32 lb: two bags, by hand.
    await expect(page.getByRole('region', { name: 'Result' })).toContainText(/32\slb/)
    await expect(page.getByRole('region', { name: 'Result' })).toContainText(/Bags to buy2/)
  })

  test('wrong fields are named, their text is kept, and the answer is 422', async ({ page, allowConsole }) => {
    // The browser's own line for an answer of 422.
    allowConsole(/Failed to load resource/)
    const answer = await page.goto('/worksheets/sand-bed?lengthMm=soon&widthMm=12 in&depthMm=2 in&packKg=20 lb')
    expect(answer?.status()).toBe(422)
    await expect(page.getByRole('alert')).toContainText(/Length of the bed: .*soon/)
    await expect(page.getByRole('textbox', { name: 'Length of the bed' })).toHaveValue('soon')
  })

  test('a working that is filled in from a setup stands at an address of its own', async ({ page }) => {
    await page.goto(`/worksheets/heat-balance?from=heater.power&${setupQuery.toString()}`)
    await expect(page).toHaveURL(/tank\.volumeL=20%20gal/)
    expect(page.url()).not.toContain('from=')
    await expect(page.getByRole('region', { name: 'Result' })).toContainText(/Heat needed/)
  })

  test('a name that is none answers 404', async ({ page, allowConsole }) => {
    allowConsole(/Failed to load resource/)
    expect((await page.goto('/worksheets/tea-leaves'))?.status()).toBe(404)
  })
})

const looked = {
  'the list of worksheets': '/worksheets',
  'a heat balance': '/worksheets/heat-balance',
  'a list of devices': '/worksheets/power-load',
  'a bed of sand': '/worksheets/sand-bed',
  'a worksheet with a wrong field': '/worksheets/heat-balance?tank.volumeL=soon&heaterW=100',
  'an empty worksheet': '/worksheets/membrane?clear=yes',
}

for (const colorScheme of ['light', 'dark'] as const)
  for (const [name, address] of Object.entries(looked))
    test(`${name} has nothing that axe objects to (${colorScheme})`, async ({ page, allowConsole }) => {
      allowConsole(/Failed to load resource/)
      await page.emulateMedia({ colorScheme })
      await page.goto(address)
      await expect(page.getByRole('heading', { level: 1 })).toBeVisible()
      await expectNoAxeViolations(page)
    })
