import type { Page } from '@playwright/test'
import { findDemoPerson } from '../support/sign-in'
import { expect, expectNoAxeViolations, test } from '../support/browser'
import { waitForLink } from '../support/mailroom'

test.describe.configure({ timeout: 180_000 })

const password = 'limpets hold on by themselves'
const newPassword = 'barnacles hold on as well'

async function signIn(page: Page, email: string, secret: string): Promise<void> {
  await page.goto('/sign-in?next=%2Faccount')
  await page.getByLabel('E-mail address').fill(email)
  await page.getByLabel('Password', { exact: true }).fill(secret)
  await page.getByRole('button', { name: 'Sign in' }).click()
  await expect(page).toHaveURL(/\/account$/)
}

async function expectToFit(page: Page): Promise<void> {
  const overflow = await page.evaluate(
    () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
  )
  expect(overflow).toBeLessThanOrEqual(0)
}

for (const width of [360, 1280]) {
  test(`somebody signs up by letter, changes the password, looks at sessions and leaves again (${width} px)`, async ({
    page,
    browser,
    request,
    allowConsole,
  }) => {
    // The browser's own line for an answer of 4xx that the journey provokes.
    allowConsole(/Failed to load resource/)
    await page.setViewportSize({ width, height: 800 })
    const name = `Tide ${width}`
    const email = `tide${width}@example.com`

    await page.goto('/sign-up')
    await page.getByLabel('Name').fill(name)
    await page.getByLabel('E-mail address').fill(email)
    await page.getByLabel('Password', { exact: true }).fill('too short')
    await page.getByRole('button', { name: 'Sign up' }).click()
    await expect(page.getByRole('alert')).toBeFocused()
    await expect(page.getByLabel('Name')).toHaveValue(name)
    await page.getByRole('alert').getByRole('link').click()
    await expect(page.getByLabel('Password', { exact: true })).toBeFocused()
    await page.getByLabel('Password', { exact: true }).fill(password)
    await page.getByRole('button', { name: 'Sign up' }).click()
    await expect(page.getByRole('status').filter({ hasText: email })).toBeFocused()
    await expectToFit(page)

    await page.goto(await waitForLink(request, email, /Confirm your address/))
    await page.getByRole('button', { name: 'Confirm the address' }).click()
    await expect(page.getByText('Your address is confirmed.')).toBeVisible()
    await signIn(page, email, password)
    await expect(page.getByRole('heading', { level: 1, name })).toBeVisible()
    await expectToFit(page)

    const elsewhere = await browser.newContext({ baseURL: new URL(page.url()).origin })
    const signedIn = await elsewhere.request.post('/api/v1/session', { data: { email, password } })
    expect(signedIn.ok()).toBe(true)
    await page.reload()
    const ends = page.getByRole('button', { name: /^End the session since/ })
    await expect(ends).toHaveCount(1)
    await ends.click()
    await expect(page.getByText('That session has ended.')).toBeVisible()
    await expect(ends).toHaveCount(0)
    expect((await elsewhere.request.get('/api/v1/me')).status()).toBe(401)
    await elsewhere.close()

    await page.locator('#password-password').fill(password)
    await page.locator('#password-newPassword').fill(newPassword)
    await page.getByRole('button', { name: 'Change the password' }).click()
    await expect(page.getByText('Your password is changed.')).toBeVisible()
    await page.getByRole('button', { name: 'Sign out' }).click()
    await expect(page.getByRole('banner').getByRole('link', { name: 'Sign in' })).toBeVisible()
    await signIn(page, email, newPassword)

    await page.locator('#delete-password').fill(newPassword)
    await page.getByRole('button', { name: 'Delete my account' }).click()
    await expect(page.getByRole('banner').getByRole('link', { name: 'Sign in' })).toBeVisible()
    await page.goto(`/people/${encodeURIComponent(name)}`)
    await expect(
      page.getByText('There is nothing at this address').or(page.getByText('Nobody is called')),
    ).toBeVisible()
  })
}

test('signing in works by keyboard alone, goes back to where one was, and the header says who it is', async ({
  page,
}) => {
  const { email, password: secret, name } = findDemoPerson('member')
  await page.goto('/method')
  await page.getByRole('banner').getByRole('link', { name: 'Sign in' }).focus()
  await page.keyboard.press('Enter')
  await expect(page.getByRole('heading', { level: 1, name: 'Sign in' })).toBeVisible()
  await page.getByLabel('E-mail address').focus()
  await page.keyboard.type(email)
  await page.keyboard.press('Tab')
  await page.keyboard.type(secret)
  await page.keyboard.press('Enter')
  await expect(page).toHaveURL(/\/method$/)
  await expect(page.getByRole('banner').getByText(name)).toBeVisible()
  await page.reload()
  await expect(page.getByRole('banner').getByText(name)).toBeVisible()
})

test('a way on that leads to another site is ignored', async ({ page }) => {
  const { email, password: secret } = findDemoPerson('member')
  await page.goto('/sign-in?next=%2F%2Fevil.example.net')
  await page.getByLabel('E-mail address').fill(email)
  await page.getByLabel('Password', { exact: true }).fill(secret)
  await page.getByRole('button', { name: 'Sign in' }).click()
  await expect(page.getByRole('heading', { level: 1, name: /What still fits/ })).toBeVisible()
  expect(new URL(page.url()).pathname).toBe('/')
})

test('an admin gives a role, suspends with a reason and lifts it again', async ({ page, request, allowConsole }) => {
  allowConsole(/Failed to load resource/)
  const { email, password: secret } = findDemoPerson('admin')
  const other = 'Tide Suspended'
  const otherEmail = 'tide.suspended@example.com'
  expect((await request.post('/api/v1/people', { data: { name: other, email: otherEmail, password } })).status()).toBe(
    202,
  )
  await waitForLink(request, otherEmail, /Confirm your address/)
  await signIn(page, email, secret)
  await page.goto(`/admin?q=${encodeURIComponent(other)}`)
  await page.getByRole('button', { name: `Change ${other}` }).click()
  await expectNoAxeViolations(page)
  await page.getByRole('button', { name: 'Suspend the account' }).click()
  await expect(page.getByRole('alert')).toBeFocused()
  await page.getByLabel('Reason').fill('To see how it looks.')
  await page.getByRole('button', { name: 'Suspend the account' }).click()
  await expect(page.getByText(`${other} is suspended`)).toBeVisible()
  await expect(page.getByRole('cell', { name: /To see how it looks/ })).toBeVisible()
  await page.getByRole('button', { name: `Change ${other}` }).click()
  await page.getByRole('button', { name: 'Lift the suspension' }).click()
  await expect(page.getByText(`${other} may come in again.`)).toBeVisible()
})

for (const colorScheme of ['light', 'dark'] as const) {
  test(`no page about accounts and people has anything that axe objects to (${colorScheme})`, async ({
    page,
    allowConsole,
  }) => {
    allowConsole(/Failed to load resource/)
    await page.emulateMedia({ colorScheme })
    for (const address of ['/sign-up', '/forgot', '/reset?token=x', '/confirm?token=x', '/sign-in']) {
      await page.goto(address)
      await page.getByRole('main').getByRole('button').last().click()
      await expect(page.getByRole('alert')).toBeVisible()
      await expectNoAxeViolations(page)
    }
    const { email, password: secret, name } = findDemoPerson('admin')
    await signIn(page, email, secret)
    for (const address of ['/account', '/admin', `/people/${encodeURIComponent(name)}`]) {
      await page.goto(address)
      await expect(page.getByRole('heading', { level: 1 })).toBeVisible()
      await expectNoAxeViolations(page)
    }
  })
}
