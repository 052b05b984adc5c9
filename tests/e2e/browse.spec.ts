import { readFile } from 'node:fs/promises'
import type { Locator, Page } from '@playwright/test'
import { expect, expectNoAxeViolations, test } from '../support/browser'
import { describedFinder } from './setup'

const counted = (page: Page) => page.getByRole('status').filter({ hasText: /^\d+ \S.* found\.$/ })

async function readCount(page: Page): Promise<number> {
  await expect(counted(page)).toHaveText(/found/)
  return Number.parseInt((await counted(page).textContent()) ?? '', 10)
}

async function expectNoSidewaysScroll(page: Page): Promise<void> {
  const sideways = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth)
  expect(sideways).toBeLessThanOrEqual(0)
}

async function tabTo(page: Page, target: Locator, most = 90): Promise<void> {
  for (let presses = 0; presses < most; presses++) {
    if (await target.evaluate((element) => element === document.activeElement)) break
    await page.keyboard.press('Tab')
  }
  await expect(target).toBeFocused()
}

const compareBoxes = (page: Page) => page.getByRole('checkbox', { name: /^Compare / })

for (const width of [360, 1280]) {
  test.describe(`the catalogue at ${width} px`, () => {
    test.use({ viewport: { width, height: 900 } })

    test('leads from a kind to a filter, a comparison, a sheet and one’s own setup, by pointer', async ({ page }) => {
      await page.goto(describedFinder)
      await page.getByRole('navigation', { name: 'Pages' }).getByRole('link', { name: 'Gear' }).click()
      await expect(page.getByRole('heading', { level: 1 })).toHaveText('Gear')
      await page
        .getByRole('navigation', { name: 'Kinds of gear' })
        .getByRole('link', { name: /^heaters/ })
        .click()
      await expect(page).toHaveURL(/\/gear\?kind=heater$/)
      const all = await readCount(page)

      await page.getByText('Narrow down').click()
      await page.getByRole('checkbox', { name: /^glass rod/ }).check()
      await expect(page).toHaveURL(/form=glass-rod/)
      await page.getByLabel('length, at most', { exact: true }).fill('11 in')
      await expect(page).toHaveURL(/lengthMm=\.\.279\.4/)
      await expect.poll(() => readCount(page)).toBeLessThan(all)
      await expect(page.getByRole('list', { name: 'Narrowed by' })).toContainText(/length at most 11.in/)

      await compareBoxes(page).nth(0).check()
      await compareBoxes(page).nth(1).check()
      await expect(page).toHaveURL(/compare=[^&]+,[^&]+/)
      const comparison = page.getByRole('region', { name: 'Side by side' })
      await expect(comparison.getByText('What decides whether it fits')).toBeVisible()
      await expectNoSidewaysScroll(page)

      await comparison.getByRole('listitem').first().getByRole('link').first().click()
      await expect(page).toHaveURL(/\/gear\/[a-z0-9-]+$/)
      await page.getByRole('link', { name: 'Check against my setup' }).click()
      await expect(page).toHaveURL(/\/find\?kind=heater&tank\.volumeL=20%20gal.*&picked=[a-z0-9-]+$/)
      await expect(page.getByRole('article').first()).toBeVisible()
    })

    test('works by keyboard alone', async ({ page }) => {
      await page.goto('/gear?kind=heater')
      const all = await readCount(page)
      await tabTo(page, page.getByText('Narrow down', { exact: true }).locator('xpath=ancestor::summary'))
      await page.keyboard.press('Enter')
      await tabTo(page, page.getByRole('checkbox', { name: /^glass rod/ }))
      await page.keyboard.press('Space')
      await expect(page).toHaveURL(/form=glass-rod/)
      // Focus stays where it was, on the box that was ticked.
      await expect(page.getByRole('checkbox', { name: /^glass rod/ })).toBeFocused()
      await expect(page.getByRole('checkbox', { name: /^glass rod/ })).toBeChecked()
      await expect.poll(() => readCount(page)).toBeLessThan(all)
      for (const at of [0, 1]) {
        await tabTo(page, compareBoxes(page).nth(at))
        await page.keyboard.press('Space')
        await expect(compareBoxes(page).nth(at)).toBeChecked()
      }
      await expect(page.getByRole('region', { name: 'Side by side' })).toBeVisible()
      await expect(page).toHaveURL(/compare=[^&]+,[^&]+/)
      await tabTo(page, page.getByRole('rowheader').nth(1).getByRole('link'))
      await page.keyboard.press('Enter')
      await expect(page).toHaveURL(/\/gear\/[a-z0-9-]+$/)
      await tabTo(page, page.getByRole('link', { name: 'Check it against a setup' }))
      await page.keyboard.press('Enter')
      await expect(page).toHaveURL(/\/find\?kind=heater&picked=/)
    })
  })
}

test('typing takes no steps in the history, and each choice takes one', async ({ page }) => {
  await page.goto('/gear')
  await page.getByLabel('Kind of gear').selectOption('heater')
  await expect(page).toHaveURL(/kind=heater$/)
  const field = page.getByLabel(/^Search by brand/)
  await field.pressSequentially('ember', { delay: 20 })
  await expect(page).toHaveURL(/q=ember$/)
  await field.pressSequentially(' 100', { delay: 20 })
  await expect(page).toHaveURL(/q=ember\+100$/)
  await expect(field).toHaveValue('ember 100')
  await page.getByLabel('In order of').selectOption('-powerW')
  await expect(page).toHaveURL(/sort=-powerW$/)
  await page.goBack()
  await expect(page).toHaveURL(/q=ember\+100$/)
  await page.goBack()
  await expect(page).toHaveURL(/\/gear$/)
  await expect(field).toHaveValue('')
  await expect(page.getByLabel('Kind of gear')).toHaveValue('')
})

/** Holds the page's own scripts back, as a slow connection does, until it is told to let them go. */
async function holdScripts(page: Page): Promise<() => void> {
  let release = (): void => undefined
  const gate = new Promise<void>((resolve) => {
    release = resolve
  })
  await page.route(/\/assets\/.*\.js$/, async (route) => {
    await gate
    await route.continue()
  })
  return release
}

test('what is chosen and typed before the scripts arrive counts once they do', async ({ page }) => {
  const release = await holdScripts(page)
  await page.goto('/gear', { waitUntil: 'commit' })
  await page.getByLabel('Kind of gear').selectOption('heater')
  const field = page.getByLabel(/^Search by brand/)
  await field.pressSequentially('ember')
  release()
  await expect(page).toHaveURL(/q=ember.*kind=heater|kind=heater.*q=ember/)
  await expect(field).toHaveValue('ember')
  await expect(page.getByLabel('Kind of gear')).toHaveValue('heater')
  await expect(page.getByRole('listbox', { name: 'Suggestions' })).toBeVisible()
})

test('marks what was searched for in the names', async ({ page }) => {
  await page.goto('/gear?kind=heater')
  const name = (await page.getByRole('rowheader').first().getByRole('link').textContent()) ?? ''
  const [brand = ''] = name.split(' ')
  await page.goto(`/gear?kind=heater&q=${brand}`)
  await expect(page.locator('mark').first()).toHaveText(new RegExp(brand.slice(0, -1), 'i'))
})

test('headers order the list and say so', async ({ page }) => {
  await page.goto('/gear?kind=heater')
  await page.getByRole('columnheader', { name: 'Power (W)' }).getByRole('link').click()
  await expect(page.getByRole('columnheader', { name: 'Power (W)' })).toHaveAttribute('aria-sort', 'ascending')
  await page.getByRole('columnheader', { name: 'Power (W)' }).getByRole('link').click()
  await expect(page.getByRole('columnheader', { name: 'Power (W)' })).toHaveAttribute('aria-sort', 'descending')
  await expect(page).toHaveURL(/sort=-powerW/)
  const watts = page
    .getByRole('row')
    .getByRole('cell')
    .filter({ hasText: /^Power \(W\)/ })
  await expect
    .poll(async () => {
      const numbers = (await watts.allTextContents()).map((text) => Number(text.replace('Power (W)', '')))
      return numbers.length > 5 && numbers.every((watt, at) => at === 0 || watt <= (numbers[at - 1] ?? 0))
    })
    .toBe(true)
})

test('the columns that are shown can be chosen and taken away as a file', async ({ page }) => {
  await page.goto('/gear?kind=heater')
  await page.getByText('Columns and rows').click()
  await page.getByRole('checkbox', { name: 'Cord length (in)' }).check()
  await expect(page.getByRole('columnheader', { name: 'Cord length (in)' })).toBeVisible()
  await page.getByRole('radio', { name: 'compact' }).check()
  await expect(page).toHaveURL(/cols=.*cordMm.*density=compact/)
  const [download] = await Promise.all([
    page.waitForEvent('download'),
    page.getByRole('link', { name: /^Download these 24 rows/ }).click(),
  ])
  expect(download.suggestedFilename()).toBe('stillfits-heater.csv')
  const text = await readFile(await download.path(), 'utf8')
  const [head = '', ...rows] = text.split('\r\n')
  expect(head.startsWith('\ufeffBrand,Model,Kind,')).toBe(true)
  expect(head).toContain('Cord length (in)')
  expect(rows).toHaveLength(25)
})

test('filters that leave nothing are explained, with the one to let go of', async ({ page }) => {
  await page.goto('/gear?kind=heater&powerW=400..500&form=glass-rod')
  await expect(page.getByText('No heater passes all of this')).toBeVisible()
  await page.getByRole('link', { name: /^Without power 400/ }).click()
  await expect(page).toHaveURL(/kind=heater&form=glass-rod$/)
  await expect.poll(() => readCount(page)).toBeGreaterThan(0)
})

for (const [what, address, words] of [
  ['a filter that the kind does not have', '/gear?kind=heater&wattage=5', /wattage.*is not a filter/i],
  ['ends that contradict each other', '/gear?kind=heater&powerW=200..100', /at least 200.W and at most 100.W at once/],
  ['a kind that is none', '/gear?kind=toaster', /toaster.*is not a kind of gear/],
  ['a place in the list that is gone', '/gear?kind=heater&q=ember&cursor=gone&page=2', /is not there any more/],
] as const) {
  test(`${what}: explained, and the list is shown all the same`, async ({ page, allowConsole }) => {
    allowConsole(/Failed to load resource/)
    const answer = await page.goto(address)
    expect(answer?.status()).toBe(422)
    await expect(page.getByRole('alert')).toContainText(words)
    await expect(page.getByRole('rowheader').first()).toBeVisible()
  })
}

test('suggests while somebody types: arrows walk, Escape closes, Enter goes there', async ({ page }) => {
  await page.goto('/')
  const field = page.getByLabel('Ask in your own words')
  await field.click()
  await expect(field).toHaveAttribute('role', 'combobox')
  await field.pressSequentially('wavem', { delay: 20 })
  const list = page.getByRole('listbox', { name: 'Suggestions' })
  await expect(list.getByRole('option', { name: /^wavemakers/ })).toBeVisible()
  await expect(field).toHaveAttribute('aria-expanded', 'true')
  await expectNoAxeViolations(page)
  await page.keyboard.press('Escape')
  await expect(list).toBeHidden()
  await page.keyboard.press('ArrowDown')
  await expect(list.getByRole('option').first()).toHaveAttribute('aria-selected', 'true')
  await expect(field).toBeFocused()
  await page.keyboard.press('Enter')
  await expect(page).toHaveURL(/\/find\?kind=wavemaker/)
})

test('a sentence is answered as ever, suggestions or not', async ({ page }) => {
  await page.goto('/')
  const field = page.getByLabel('Ask in your own words')
  await field.click()
  await field.pressSequentially('heater', { delay: 20 })
  await expect(page.getByRole('listbox', { name: 'Suggestions' })).toBeVisible()
  await page.keyboard.press('Enter')
  await expect(page).toHaveURL(/\/find\?kind=heater&asked=heater/)
})

test('suggests to somebody who typed before the scripts arrived', async ({ page }) => {
  const release = await holdScripts(page)
  await page.goto('/', { waitUntil: 'commit' })
  const field = page.getByLabel('Ask in your own words')
  await field.pressSequentially('heater')
  release()
  await expect(page.getByRole('listbox', { name: 'Suggestions' })).toBeVisible()
  await expect(field).toHaveValue('heater')
  await expect(field).toBeFocused()
})

test('history sets any two revisions side by side', async ({ page }) => {
  await page.goto('/gear/hearthbrine-ember-100-w')
  await page.getByRole('link', { name: 'history', exact: true }).click()
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('History')
  await expect(page.getByRole('table').getByRole('row').nth(1)).toBeVisible()
  await page.getByLabel('From', { exact: true }).selectOption('1')
  await page.getByRole('button', { name: 'Set side by side' }).click()
  await expect(page).toHaveURL(/before=1&after=\d/)
  await expect(page.getByRole('heading', { name: /^What changed from revision 1 to/ })).toBeVisible()
  await expect(page.getByRole('columnheader', { name: 'Revision 1' })).toBeVisible()
})

test('what is narrowed down is known to search engines by its kind alone', async ({ page }) => {
  await page.goto('/gear?kind=heater')
  await expect(page.locator('link[rel=canonical]')).toHaveAttribute('href', /\/gear\?kind=heater$/)
  await expect(page.locator('meta[name=robots]')).toHaveCount(0)
  await page.goto('/gear?kind=heater&powerW=..100')
  await expect(page.locator('link[rel=canonical]')).toHaveAttribute('href', /\/gear\?kind=heater$/)
  await expect(page.locator('meta[name=robots]')).toHaveAttribute('content', 'noindex')
})

test('the longest names stay inside a narrow page, in the list and side by side', async ({ page }) => {
  await page.setViewportSize({ width: 320, height: 800 })
  await page.route('**/api/v1/gear?*', async (route) => {
    const answer = await route.fetch()
    const list = (await answer.json()) as { items: { brand: string; model: string }[] }
    // As long as the API takes them (60 and 100 characters), without a space to break at.
    for (const item of list.items) Object.assign(item, { brand: 'Inventedbrand'.repeat(4), model: 'Madeup'.repeat(16) })
    await route.fulfill({ json: list })
  })
  await page.goto('/method')
  await page.getByRole('navigation', { name: 'Pages' }).getByRole('link', { name: 'Gear' }).click()
  await page.getByLabel('Kind of gear').selectOption('light')
  await expect(page).toHaveURL(/kind=light$/)
  for (const at of [0, 1]) await compareBoxes(page).nth(at).check()
  await expect(
    page.getByRole('region', { name: 'Side by side' }).getByText('What decides whether it fits'),
  ).toBeVisible()
  await expectNoSidewaysScroll(page)
})

test.describe('without scripts', () => {
  test.use({ javaScriptEnabled: false })

  test('the form narrows, orders and compares, and pages go on', async ({ page }) => {
    await page.goto('/gear?kind=heater')
    await expect(page.getByRole('rowheader')).toHaveCount(24)
    await page.getByText('Narrow down').click()
    await page.getByLabel('length, at most', { exact: true }).fill('11')
    await page.getByRole('checkbox', { name: /^glass rod/ }).check()
    await compareBoxes(page).nth(0).check()
    await compareBoxes(page).nth(1).check()
    await page.getByRole('button', { name: 'Show' }).click()
    await expect(page).toHaveURL(/kind=heater&form=glass-rod&lengthMm=\.\.279\.4&compare=[^&]+,[^&]+$/)
    const comparison = page.getByRole('region', { name: 'Side by side' })
    await expect(comparison.getByText('What decides whether it fits')).toBeVisible()
    await page.goto('/gear?kind=heater')
    await page.getByRole('link', { name: 'Next page' }).click()
    await expect(page.getByText(/page 2 of/)).toBeVisible()
  })
})

const pages = {
  'the catalogue': '/gear',
  'a kind with a comparison': '/gear?kind=heater&compare=hearthbrine-ember-100-w,hearthbrine-ember-150-w',
  'a list that found nothing': '/gear?kind=heater&powerW=400..500&form=glass-rod',
  'a list with wrong filters': '/gear?kind=heater&lengthMm.to=soon',
  'a piece’s history': '/gear/hearthbrine-ember-100-w/history',
}

const layouts = [
  { colorScheme: 'light', width: 1280 },
  { colorScheme: 'dark', width: 320 },
] as const

for (const { colorScheme, width } of layouts) {
  for (const [name, address] of Object.entries(pages)) {
    test(`${name} fits, and has nothing that axe objects to (${colorScheme}, ${width} px)`, async ({
      page,
      allowConsole,
    }) => {
      // A long list with its filters open is much for axe to look through.
      test.slow()
      allowConsole(/Failed to load resource/)
      await page.emulateMedia({ colorScheme })
      await page.setViewportSize({ width, height: 900 })
      await page.goto(address)
      await expect(page.getByRole('heading', { level: 1 })).toBeVisible()
      const narrow = page.locator('details').first()
      if (address.startsWith('/gear?') && (await narrow.getAttribute('open')) === null)
        await narrow.locator('summary').click()
      await expectNoSidewaysScroll(page)
      await expectNoAxeViolations(page)
    })
  }
}
