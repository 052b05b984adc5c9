import type { Locator, Page } from '@playwright/test'
import { expect, expectNoAxeViolations, test } from '../support/browser'

const counts = /\d+ fit, \d+ with changes, \d+ do not fit, \d+ lack data\./
const status = (page: Page) => page.getByRole('status').filter({ hasText: counts })
const understood = (page: Page) => page.getByRole('list', { name: 'We read' })
const wishes = (page: Page) => page.getByRole('list', { name: 'Only those with' })

async function readCounts(page: Page): Promise<string> {
  await expect(status(page)).toHaveText(counts)
  return (await status(page).textContent()) ?? ''
}

async function tabTo(page: Page, target: Locator, most = 60): Promise<void> {
  for (let presses = 0; presses < most; presses++) {
    if (await target.evaluate((element) => element === document.activeElement)) break
    await page.keyboard.press('Tab')
  }
  await expect(target).toBeFocused()
}

interface Journey {
  readonly question: string
  readonly kind: string
  /** What is understood, and corrected. */
  readonly chip: RegExp
  readonly field: string
  readonly correction: string
  readonly corrected: RegExp
  /** A check that the answer shows. */
  readonly check: string
}

const journeys: readonly Journey[] = [
  {
    question: 'light for a 24 x 18 x 16 inch tank with soft corals and lps, under 100 W',
    kind: 'light',
    chip: /^tank 24 × 18 × 16 in/,
    field: 'Outside length',
    correction: '30',
    corrected: /outerLengthMm=30%20in/,
    check: 'Coverage',
  },
  {
    question: 'which stand carries a 36 x 18 x 18 inch glass tank with 12 kg of rock?',
    kind: 'stand',
    chip: /^tank 36 × 18 × 18 in/,
    field: 'Outside length',
    correction: '24 1/2',
    corrected: /outerLengthMm=24%201%2F2%20in/,
    check: 'Load rating',
  },
]

for (const width of [360, 1280])
  for (const { question, kind, chip, field, correction, corrected, check } of journeys)
    test.describe(`a question for a ${kind} at ${width} px`, () => {
      test.use({ viewport: { width, height: 900 } })

      test('is understood, corrected and answered, by pointer', async ({ page }) => {
        await page.goto('/')
        await page.getByLabel('Ask in your own words').fill(question)
        await page.getByRole('button', { name: 'Answer' }).click()
        await expect(page).toHaveURL(new RegExp(`/find\\?kind=${kind}&asked=`))
        await expect(understood(page)).toContainText('nothing left over')
        const before = await readCounts(page)

        await understood(page).getByRole('button', { name: chip }).click()
        const dialog = page.getByRole('dialog')
        await dialog.getByLabel(field).fill(correction)
        await dialog.getByLabel(field).press('Enter')
        await expect(dialog).toBeHidden()
        await expect(page).toHaveURL(corrected)
        await expect(status(page)).not.toHaveText(before)

        const card = page
          .getByRole('listitem')
          .filter({ has: page.getByRole('article') })
          .first()
        await card.getByText(/^All \d+ checks$/).click()
        await expect(card.getByText(check).first()).toBeVisible()
      })

      test('is understood, corrected and answered, by keyboard alone', async ({ page }) => {
        await page.goto('/')
        await tabTo(page, page.getByLabel('Ask in your own words'))
        await page.keyboard.type(question)
        await page.keyboard.press('Enter')
        const before = await readCounts(page)

        await tabTo(page, understood(page).getByRole('button', { name: chip }))
        await page.keyboard.press('Enter')
        const input = page.getByRole('dialog').getByLabel(field)
        await tabTo(page, input)
        await page.keyboard.press('ControlOrMeta+a')
        await page.keyboard.type(correction)
        await page.keyboard.press('Enter')
        await expect(page).toHaveURL(corrected)
        await expect(status(page)).not.toHaveText(before)

        const toggle = page
          .locator('summary')
          .filter({ hasText: /^All \d+ checks$/ })
          .first()
        await tabTo(page, toggle, 120)
        await page.keyboard.press('Enter')
        await expect(page.getByText(check).first()).toBeVisible()
      })
    })

test('the answers to a question for a light have nothing that axe objects to', async ({ page }) => {
  test.slow()
  await page.goto(`/find?${new URLSearchParams({ q: 'dimmable light for a 24 x 18 x 16 inch tank' }).toString()}`)
  await readCounts(page)
  await expectNoAxeViolations(page)
})

test('what a question asks of the piece itself narrows the answers until it is let go of', async ({ page }) => {
  await page.goto(`/find?${new URLSearchParams({ q: 'titanium heater under 150 W for a 20 gallon tank' }).toString()}`)
  await expect(wishes(page).getByRole('link')).toHaveCount(2)
  await expect(page.getByRole('article').first()).toContainText(/titanium/)
  const narrow = await readCounts(page)
  await wishes(page)
    .getByRole('link', { name: /titanium/ })
    .click()
  await expect(wishes(page).getByRole('link')).toHaveCount(1)
  await expect(status(page)).not.toHaveText(narrow)
  await page.goBack()
  await expect(status(page)).toHaveText(narrow)
})

test('wishes that no piece meets are said, with a way to let go of them', async ({ page }) => {
  await page.goto('/find?kind=heater&wish.powerW=..1&tank.volumeL=20%20gal')
  await expect(page.getByText('No heater on record is like that')).toBeVisible()
  await page.getByRole('link', { name: 'all of them' }).click()
  await expect(page.getByRole('article').first()).toBeVisible()
})

test('a piece that the question names is judged beside the others', async ({ page }) => {
  await page.goto(`/find?${new URLSearchParams({ q: 'does the Hearthbrine Ember 100 W fit 20 gal?' }).toString()}`)
  await expect(page).toHaveURL(/picked=hearthbrine-ember-100-w/)
  await expect(understood(page)).toContainText('Hearthbrine Ember 100 W')
  await expect(page.getByRole('article').first()).toContainText('Hearthbrine · Ember 100 W')
})

test('of a named piece that is gone it leads to its replacements', async ({ page }) => {
  const q = 'what can replace my Hearthbrine Ember 100 W in a 20 gallon tank'
  await page.goto(`/find?${new URLSearchParams({ q }).toString()}`)
  await page.getByRole('link', { name: 'the page of its replacements' }).click()
  await expect(page).toHaveURL(/\/setups\/link\/swap\/heater\?.*hearthbrine-ember-100-w/)
  await expect(page.getByRole('heading', { level: 1 })).toBeVisible()
})
