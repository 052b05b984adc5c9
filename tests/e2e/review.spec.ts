import type { Page } from '@playwright/test'
import { expect, expectNoAxeViolations, test } from '../support/browser'
import {
  amend,
  attachPhoto,
  decide,
  draft,
  measured,
  openAs,
  propose,
  readRevision,
  readSubjects,
  recordScraper,
  submit,
  takeOutput,
} from '../support/desk'
import { createJpeg } from '../api/evidence/files'
import { findDemoPerson } from '../support/sign-in'

// Each of these is several people at work, on a machine that does other things as well.
test.describe.configure({ timeout: 240_000 })

test.afterEach(() => {
  const unexpected = takeOutput().filter((text) => !text.startsWith('Failed to load resource'))
  expect(unexpected, 'unexpected console output').toEqual([])
})

async function waitUntilLive(page: Page): Promise<void> {
  await page.locator('html[data-live]').waitFor({ state: 'attached' })
}

async function expectNoSidewaysScroll(page: Page): Promise<void> {
  const sideways = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth)
  expect(sideways).toBeLessThanOrEqual(0)
}

const decision = (page: Page) => page.getByRole('form', { name: 'Decide' })

for (const width of [360, 1280]) {
  test(`a proposal is sent back, amended, approved, public, in the history and told by letter (${width} px)`, async ({
    browser,
    baseURL,
  }) => {
    const member = await openAs(browser, baseURL, 'member')
    const moderator = await openAs(browser, baseURL, 'moderator', { viewport: { width, height: 900 } })
    const model = `Long Blade ${width}`
    const slug = await recordScraper(member.request, moderator.request, model)
    const change = (value: number) => ({ values: { lengthMm: measured(value, `${value} mm`) } })
    const { id } = await propose(member.request, {
      kind: 'scraper',
      gear: slug,
      baseRevision: await readRevision(member.request, slug),
      summary: 'Measured again',
      ...change(3000 / 10 + 15),
    })

    const page = await moderator.newPage()
    await page.goto('/review')
    await waitUntilLive(page)
    await expect(page.getByText(/decided within|no waiting times yet/)).toBeVisible()
    await page.getByLabel('Kind').selectOption('scraper')
    await expect(page).toHaveURL(/kind=scraper/)
    await expectNoSidewaysScroll(page)
    await page.getByRole('link', { name: `Wrackline · ${model}` }).click()
    await expect(page.getByRole('heading', { level: 1 })).toHaveText(`Wrackline · ${model}`)
    await page.getByRole('button', { name: 'Take it' }).click()
    await expect(page.getByText(/You hold this for/)).toBeVisible()
    await expectNoSidewaysScroll(page)

    await page.getByRole('radio', { name: 'Send back with questions' }).check()
    await decision(page).getByRole('button', { name: 'Send it back' }).click()
    await expect(page.getByRole('alert')).toBeFocused()
    await page.getByLabel('Reason').selectOption('place-doubtful')
    await page.getByLabel('What do you ask its author?').fill('With or without the grip?')
    await decision(page).getByRole('button', { name: 'Send it back' }).click()
    await expect(page.getByRole('heading', { name: 'Sent back' })).toBeVisible()
    await expectNoSidewaysScroll(page)

    await submit(member.request, await amend(member.request, id, change(310)))
    await page.goto(`/review/${id}?kind=scraper`)
    await waitUntilLive(page)
    await expect(page.getByText('With or without the grip?').first()).toBeVisible()
    await decision(page).getByRole('button', { name: 'Approve it' }).click()
    await expect(page.getByRole('heading', { name: 'Approved: revision 2 is public' })).toBeVisible()
    await page.getByRole('link', { name: 'See the public page' }).click()
    await expect(page.getByText('12.2 in').first()).toBeVisible()
    await page.goto(`/gear/${slug}/history`)
    await expect(page.getByText('Measured again')).toBeVisible()

    const { email } = findDemoPerson('member')
    for (const subject of [
      `A question about your proposal for Wrackline ${model}`,
      `Approved: your proposal for Wrackline ${model}`,
    ])
      await expect.poll(() => readSubjects(member.request, email), { timeout: 60_000 }).toContain(subject)
    await member.close()
    await moderator.close()
  })
}

test('two moderators decide at once: one wins, the other is told who and keeps every word', async ({
  browser,
  baseURL,
  allowConsole,
}) => {
  allowConsole(/409 \(Conflict\)/)
  const [member, first, other] = await Promise.all(
    (['member', 'moderator', 'admin'] as const).map((role) => openAs(browser, baseURL, role)),
  )
  const slug = await recordScraper(member!.request, first!.request, 'Race 40')
  const { id } = await propose(member!.request, {
    kind: 'scraper',
    gear: slug,
    baseRevision: 1,
    values: { lengthMm: measured(320, '32 cm') },
  })
  const pages = await Promise.all([first!, other!].map((context) => context.newPage()))
  for (const page of pages) {
    await page.goto(`/review/${id}`)
    await waitUntilLive(page)
  }
  const [quick, slow] = pages
  await decision(slow!).getByRole('radio', { name: 'Decline' }).check()
  await slow!.getByLabel('Reason').selectOption('not-backed')
  await slow!.getByLabel('Why is it declined?').fill('A long and careful explanation.')
  await decision(quick!).getByRole('button', { name: 'Approve it' }).click()
  await expect(quick!.getByRole('heading', { name: 'Approved: revision 2 is public' })).toBeVisible()
  await decision(slow!).getByRole('button', { name: 'Decline it' }).click()
  const notice = slow!.getByRole('alert')
  await expect(notice).toBeFocused()
  await expect(notice).toContainText(findDemoPerson('moderator').name)
  await expect(slow!.getByLabel('Your words, not sent')).toHaveValue('A long and careful explanation.')
  for (const context of [member!, first!, other!]) await context.close()
})

test('duplicates are merged with a look at what that does, lead to the one that stays, and come apart again', async ({
  browser,
  baseURL,
}) => {
  const member = await openAs(browser, baseURL, 'member')
  const moderator = await openAs(browser, baseURL, 'moderator')
  const slug = await recordScraper(member.request, moderator.request, 'Twin 55')
  const stays = await recordScraper(member.request, moderator.request, 'Twin 55 Original')
  const page = await moderator.newPage()
  await page.goto(`/gear/${slug}`)
  await waitUntilLive(page)
  await page.getByRole('link', { name: 'Merge or retire this entry' }).click()
  await page.getByRole('button', { name: 'Choose the entry that stays' }).click()
  const dialog = page.getByRole('dialog', { name: /^Merge Wrackline/ })
  await dialog.getByLabel('Which piece stays?').fill('Twin 55 Original')
  await dialog.getByRole('button', { name: 'Search' }).click()
  await dialog.getByRole('radio', { name: /Twin 55 Original/ }).check()
  await expect(dialog.getByText('What happens')).toBeVisible()
  await expectNoAxeViolations(page)
  await dialog.getByLabel('Why are they the same piece?').fill('The same piece, entered twice.')
  await dialog.getByRole('button', { name: 'Merge them' }).click()
  await expect(page.getByText('Merged: the address leads to the other entry now.')).toBeVisible()

  const led = await page.request.get(`/gear/${slug}`, { maxRedirects: 0 })
  expect([led.status(), led.headers()['location']]).toEqual([301, `/gear/${stays}`])
  await page.getByLabel('Why are they two pieces after all?').fill('The blades differ.')
  await page.getByRole('button', { name: 'Undo the merging' }).click()
  await expect(page.getByText('They are two entries again.')).toBeVisible()
  expect((await page.request.get(`/gear/${slug}`, { maxRedirects: 0 })).status()).toBe(200)

  await page.getByLabel('Why does it leave the record?').fill('Never made.')
  await page.getByRole('button', { name: 'Retire this entry' }).click()
  await expect(page.getByText('The entry was retired.')).toBeVisible()
  const gone = await page.request.get(`/gear/${slug}`)
  expect(gone.status()).toBe(410)
  expect(await gone.text()).toContain('Never made.')
  await member.close()
  await moderator.close()
})

test('an earlier state becomes the present one again, by a moderator alone', async ({ browser, page, baseURL }) => {
  const member = await openAs(browser, baseURL, 'member')
  const moderator = await openAs(browser, baseURL, 'moderator')
  const slug = await recordScraper(member.request, moderator.request, 'Return 12')
  const { id } = await propose(member.request, {
    kind: 'scraper',
    gear: slug,
    baseRevision: 1,
    values: { lengthMm: measured(420, '42 cm') },
  })
  const desk = await moderator.newPage()
  await desk.goto(`/review/${id}`)
  await waitUntilLive(desk)
  await decision(desk).getByRole('button', { name: 'Approve it' }).click()
  await desk.getByRole('link', { name: 'See its history' }).click()
  await desk.getByLabel('Why?').fill('The grip was measured too.')
  await desk.getByRole('button', { name: 'Make revision 1 the present state' }).click()
  await expect(desk.getByRole('heading', { name: 'What changed from revision 2 to 3' })).toBeVisible()
  await expect(desk.getByText('The grip was measured too.').first()).toBeVisible()
  expect(await readRevision(member.request, slug)).toBe(3)
  await page.goto(`/gear/${slug}/history`)
  await expect(page.getByText('Go back to an earlier state')).toHaveCount(0)
  await member.close()
  await moderator.close()
})

test('the desk is worked through by keyboard alone', async ({ browser, baseURL }) => {
  const member = await openAs(browser, baseURL, 'member')
  const moderator = await openAs(browser, baseURL, 'moderator')
  const slug = await recordScraper(member.request, moderator.request, 'Keys 7')
  await propose(member.request, {
    kind: 'scraper',
    gear: slug,
    baseRevision: 1,
    values: { lengthMm: measured(330, '33 cm'), acrylicSafe: measured(true, 'yes') },
  })
  const page = await moderator.newPage()
  await page.goto('/review?kind=scraper&sort=newest')
  await waitUntilLive(page)
  const link = page.getByRole('link', { name: 'Wrackline · Keys 7' })
  await page.keyboard.press('j')
  await expect(link).toBeFocused()
  await page.keyboard.press('Enter')
  await expect(page.getByRole('heading', { level: 1 })).toHaveText('Wrackline · Keys 7')
  await page.keyboard.press('j')
  await page.keyboard.press('x')
  const why = page.getByLabel(/^Why not, about/)
  await expect(why).toBeFocused()
  await page.keyboard.type('jax is only text here')
  await expect(why).toHaveValue('jax is only text here')
  await page.keyboard.press('Shift+Tab')
  await page.keyboard.press('d')
  await expect(decision(page).getByRole('radio', { name: 'Approve' })).toBeFocused()
  await page.keyboard.press('Tab')
  await page.keyboard.type('Thank you.')
  await page.keyboard.press('Tab')
  await expect(page.getByRole('button', { name: 'Approve 1 of 2' })).toBeFocused()
  await page.keyboard.press('Enter')
  await expect(page.getByRole('heading', { name: 'Approved: revision 2 is public' })).toBeVisible()
  await member.close()
  await moderator.close()
})

for (const path of ['/review', '/review/disputes', '/review/reports']) {
  test(`${path} asks a visitor to sign in, and tells a member that it is not theirs`, async ({
    browser,
    page,
    baseURL,
    allowConsole,
  }) => {
    allowConsole(/Failed to load resource/)
    const visit = await page.goto(path)
    expect(visit?.status()).toBe(401)
    await expect(page.getByRole('link', { name: 'Sign in to go on' })).toHaveAttribute(
      'href',
      `/sign-in?next=${encodeURIComponent(path)}`,
    )
    const member = await openAs(browser, baseURL, 'member')
    const own = await member.newPage()
    expect((await own.goto(path))?.status()).toBe(403)
    await expect(own.getByRole('heading', { level: 1, name: 'Not open to you' })).toBeVisible()
    await member.close()
  })
}

for (const { colorScheme, width } of [
  { colorScheme: 'light', width: 1280 },
  { colorScheme: 'dark', width: 360 },
] as const) {
  test(`the desk fits, and has nothing that axe objects to (${colorScheme}, ${width} px)`, async ({
    browser,
    baseURL,
  }) => {
    const member = await openAs(browser, baseURL, 'member')
    const moderator = await openAs(browser, baseURL, 'moderator', {
      colorScheme,
      viewport: { width, height: 900 },
    })
    const slug = await recordScraper(member.request, moderator.request, `Look ${width}`)
    const base = { kind: 'scraper', gear: slug, baseRevision: 1 }
    const { id } = await draft(member.request, { ...base, summary: 'Longer than it says' })
    const photo = await attachPhoto(member.request, id, await createJpeg(800, 600))
    const values = {
      lengthMm: { ...measured(900, '90 cm', 'Photo beside a rule, see https://example.org/rule'), files: [photo] },
      acrylicSafe: measured(true, 'yes'),
    }
    const flags = [{ path: 'lengthMm', rule: 'usual', value: 900, reason: 'It is the one for tall tanks.' }]
    await submit(member.request, await amend(member.request, id, { values, flags }))
    const rival = await propose(member.request, { ...base, values: { lengthMm: measured(850, '85 cm') } })
    await decide(moderator.request, rival.id, { decision: 'approve' })
    await member.request.post(`/api/v1/gear/${slug}/reports`, {
      data: { key: 'lengthMm', words: 'Mine is longer.' },
      headers: { 'Sec-Fetch-Site': 'same-origin', 'Idempotency-Key': crypto.randomUUID() },
    })
    const page = await moderator.newPage()
    await page.goto(`/review/${id}`)
    await waitUntilLive(page)
    await expect(page.getByText('Conflict: the record was changed too since this was proposed')).toBeVisible()
    await page.getByRole('link', { name: 'Photo 1: length' }).click()
    const photoDialog = page.getByRole('dialog', { name: 'Photo 1: length' })
    await expect(photoDialog.getByRole('img')).toHaveJSProperty('complete', true)
    await expectNoAxeViolations(page)
    await page.keyboard.press('Escape')
    await expect(photoDialog).toHaveCount(0)
    await expect(page.getByRole('link', { name: 'Photo 1: length' })).toBeFocused()
    for (const path of ['/review', `/review/${id}`, '/review/disputes', '/review/reports', `/review/gear/${slug}`]) {
      await page.goto(path)
      await waitUntilLive(page)
      await expect(page.getByRole('heading', { level: 1 })).toBeVisible()
      await expectNoSidewaysScroll(page)
      await expectNoAxeViolations(page)
      const folder = process.env.SHOTS
      if (folder) await page.screenshot({ path: `${folder}/${path.replaceAll('/', '_')}-${width}.png`, fullPage: true })
    }
    await member.close()
    await moderator.close()
  })
}
