import type { Page } from '@playwright/test'
import sharp from 'sharp'
import { findDemoPerson } from '../support/sign-in'
import { expect, expectNoAxeViolations, test } from '../support/browser'

async function signIn(page: Page): Promise<void> {
  const { email, password } = findDemoPerson('member')
  const headers = { 'Sec-Fetch-Site': 'same-origin' }
  const answer = await page.request.post('/api/v1/session', { headers, data: { email, password } })
  expect(answer.status()).toBe(200)
}

/** Each test changes a piece of its own, so that none stands in another's way. */
async function findHeater(page: Page, at: number): Promise<{ slug: string; specs: Record<string, number> }> {
  const answer = await page.request.get('/api/v1/gear?kind=heater&limit=20')
  const { items } = (await answer.json()) as { items: { slug: string; specs: Record<string, number> }[] }
  const measured = items.filter(({ specs }) => specs['lengthMm'] !== undefined && specs['powerW'] !== undefined)
  return measured[at]!
}

const drawPhoto = () =>
  sharp({ create: { width: 320, height: 240, channels: 3, background: '#7a8f94' } })
    .jpeg()
    .toBuffer()

const length = (page: Page) => page.getByLabel('Length', { exact: true })

test('a contributor corrects a number with a photo of it, and finds it among their proposals', async ({ page }) => {
  const { slug } = await findHeater(page, 0)
  await signIn(page)
  await page.goto(`/gear/${slug}`)
  await page.getByRole('link', { name: 'Correct the length', exact: true }).click()
  await expect(length(page)).toBeFocused()
  await length(page).fill('11 3/8"')
  await expect(page.locator('#specs-lengthMm-text-echo')).toContainText('288.9')
  const file = { name: 'calipers.jpg', mimeType: 'image/jpeg', buffer: await drawPhoto() }
  await page.getByLabel('Photos and PDFs').setInputFiles(file)
  const thumbnail = page.getByAltText('Your photo calipers.jpg')
  await expect(thumbnail).toBeVisible()
  await expect.poll(() => thumbnail.evaluate((image: HTMLImageElement) => image.naturalWidth)).toBeGreaterThan(0)
  await page.getByLabel('In a few words').fill('Measured with calipers')
  await page.getByRole('button', { name: 'Propose the change' }).click()
  await expect(page.getByText('Thank you. You get a letter')).toBeVisible()
  await expect(page.getByText('typed as “11 3/8"”')).toBeVisible()
  await page.getByRole('link', { name: 'My proposals' }).click()
  await page.getByRole('link', { name: 'Waiting for review' }).click()
  await expect(page.getByText('Measured with calipers')).toBeVisible()
})

test('two tabs amend one proposal: the slower is shown what changed and loses nothing', async ({
  page,
  context,
  allowConsole,
}) => {
  allowConsole(/412/)
  const { slug } = await findHeater(page, 1)
  await signIn(page)
  await page.goto(`/gear/${slug}/edit`)
  await length(page).fill('11 in')
  await page.getByRole('button', { name: 'Propose the change' }).click()
  const amend = page.getByRole('link', { name: 'Amend it' })
  await amend.waitFor()
  const address = (await amend.getAttribute('href')) ?? ''
  const other = await context.newPage()
  await page.goto(address)
  await other.goto(address)
  await page.evaluate(() => localStorage.clear())
  await length(page).fill('12 in')
  await page.getByRole('button', { name: 'Send the amended proposal' }).click()
  await amend.waitFor()
  await length(other).fill('11 1/4 in')
  await other.getByRole('button', { name: 'Send the amended proposal' }).click()
  const changes = other.getByRole('table', { name: 'What changed meanwhile' })
  await expect(changes).toContainText('12 in')
  await expect(length(other)).toHaveValue('11 1/4 in')
  await other.getByRole('button', { name: 'Go on with what stands here' }).click()
  await other.getByRole('button', { name: 'Send the amended proposal' }).click()
  await expect(other.getByText('typed as “11 1/4 in”')).toBeVisible()
})

test('by keyboard alone: a wrong answer is named, found from the summary, and mended', async ({ page }) => {
  const { slug } = await findHeater(page, 2)
  await signIn(page)
  await page.goto(`/gear/${slug}/edit#specs-lengthMm-text`)
  await expect(length(page)).toBeFocused()
  await page.keyboard.press('Control+A')
  await page.keyboard.type('5 gallons')
  await page.keyboard.press('Enter')
  await expect(page.getByRole('alert').filter({ hasText: 'need another look' })).toBeFocused()
  await page.keyboard.press('Tab')
  await page.keyboard.press('Enter')
  await expect(length(page)).toBeFocused()
  await page.keyboard.press('Control+A')
  await page.keyboard.type('285 mm')
  await page.keyboard.press('Enter')
  await expect(page.getByText('Thank you. You get a letter')).toBeVisible()
})

test('a visitor without an account keeps what was typed, and can tell that something is wrong', async ({ page }) => {
  const { slug } = await findHeater(page, 3)
  await page.goto(`/gear/${slug}/edit`)
  await length(page).fill('11 in')
  await page.getByRole('button', { name: 'Propose the change' }).click()
  await expect(page.getByRole('link', { name: 'Sign in and come back' })).toBeVisible()
  await page.reload()
  await expect(page.getByText(/What you typed on .* is back/)).toBeVisible()
  await expect(length(page)).toHaveValue('11 in')
  await page.goto(`/gear/${slug}`)
  await page.getByRole('button', { name: 'Something wrong with the length?', exact: true }).click()
  await page.getByLabel('What is wrong').fill('Mine is shorter than that')
  await page.getByRole('button', { name: 'Tell the moderators' }).click()
  await expect(page.getByText('The moderators see it beside the piece.')).toBeVisible()
})

for (const colorScheme of ['light', 'dark'] as const) {
  for (const width of [360, 1280]) {
    test.describe(`in the ${colorScheme} theme at ${width} px`, () => {
      test.use({ colorScheme, viewport: { width, height: 800 } })

      const expectReadable = async (page: Page) => {
        await expectNoAxeViolations(page)
        const overflow = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth)
        expect(overflow, 'scrolls sideways').toBeLessThanOrEqual(0)
      }

      test('the form is readable with its errors and questions', async ({ page }) => {
        const { slug } = await findHeater(page, 4)
        await signIn(page)
        await page.goto(`/gear/${slug}/edit`)
        await page.getByLabel('Power', { exact: true }).fill('4000 W')
        await length(page).fill('5 gallons')
        await page.getByText('Is this right?').first().waitFor()
        await page.getByRole('button', { name: 'Propose the change' }).click()
        await page.getByRole('alert').filter({ hasText: 'need another look' }).waitFor()
        await expectReadable(page)
      })

      for (const address of ['/gear/new', '/gear/new?kind=tank', '/proposals']) {
        test(`${address} is readable`, async ({ page }) => {
          await signIn(page)
          await page.goto(address)
          await expectReadable(page)
        })
      }
    })
  }
}
