import { act, cleanup, fireEvent, screen, waitFor, within } from '@testing-library/react'
import { afterEach, describe, expect, it } from 'vitest'
// Imported here, so that no test waits for a page to be compiled when its route first asks for it.
import '../../../src/app/routes/review'
import '../../../src/app/routes/review-proposal'
import { renderApp } from '../support/render-app'
import { createFakeDesk, json, moderator, problem } from './fake-desk'

afterEach(() => {
  cleanup()
  localStorage.clear()
  sessionStorage.clear()
})

const press = (key: string, target: Element = document.activeElement ?? document.body) =>
  act(() => void fireEvent.keyDown(target, { key }))

describe('the queue of the review desk', () => {
  it('shows kind, waiting time, the author’s record, warnings and who is at it', async () => {
    renderApp('/review', createFakeDesk())
    const row = (await screen.findByRole('link', { name: 'Invented · Short 100' })).closest('tr')!
    expect(row.textContent).toContain('heater: length, power')
    expect(row.textContent).toMatch(/\d+ (days|weeks)/)
    expect(row.textContent).toContain('3 accepted, 1 declined')
    expect(row.textContent).toContain('one')
    expect(row.textContent).toContain('the piece has moved on since')
    expect(row.textContent).toContain('free')
    expect(screen.getByText(/Half of what is sent in is decided within 5 hours/)).toBeTruthy()
  })

  it('is walked through by j and k, and keeps the keys for typing where somebody types', async () => {
    renderApp('/review', createFakeDesk())
    const [first, next] = await screen.findAllByRole('link', { name: /^Invented · / })
    press('j')
    expect(document.activeElement).toBe(first)
    press('j')
    expect(document.activeElement).toBe(next)
    press('k')
    expect(document.activeElement).toBe(first)
    press('ArrowDown')
    expect(document.activeElement).toBe(next)
    const order = screen.getByLabelText('Order')
    order.focus()
    press('j', order)
    expect(document.activeElement).toBe(order)
  })

  it('lets single-letter keys be turned off', async () => {
    renderApp('/review', createFakeDesk())
    await screen.findByRole('link', { name: 'Invented · Short 100' })
    fireEvent.click(screen.getByRole('button', { name: 'Turn the keys off' }))
    const toggle = screen.getByRole('button', { name: 'Turn the keys on' })
    toggle.focus()
    press('j')
    expect(document.activeElement).toBe(toggle)
    fireEvent.click(toggle)
    press('j')
    expect(document.activeElement).not.toBe(toggle)
  })

  it('keeps filters and order in the address, and says how to let go of them where nothing is found', async () => {
    const { address } = renderApp('/review', createFakeDesk())
    await screen.findByRole('link', { name: 'Invented · Short 100' })
    fireEvent.change(screen.getByLabelText('Order'), { target: { value: 'flagged' } })
    await waitFor(() => expect(address()).toBe('/review?sort=flagged'))
    cleanup()
    renderApp('/review?kind=light', createFakeDesk())
    expect(await screen.findByText('Nothing waits that is like this')).toBeTruthy()
    expect(screen.getByRole('link', { name: 'Show everything that waits' }).getAttribute('href')).toBe('/review')
    expect(screen.getByRole('combobox', { name: 'Kind' })).toHaveProperty('value', 'light')
  })

  it('tells visitors to sign in and come back, and others that it is not open to them', async () => {
    const as = (person: object | null) =>
      createFakeDesk(({ path }) => (path === '/api/v1/session' ? json(200, { person }) : undefined))
    renderApp('/review?kind=heater', as(null))
    const link = await screen.findByRole('link', { name: 'Sign in to go on' })
    expect(link.getAttribute('href')).toBe('/sign-in?next=%2Freview%3Fkind%3Dheater')
    cleanup()
    renderApp('/review', as({ ...moderator, role: 'member', can: { ...moderator.can, review: false } }))
    expect(await screen.findByRole('heading', { level: 1, name: 'Not open to you' })).toBeTruthy()
    expect(screen.getByText('Only moderators work at the review desk.')).toBeTruthy()
  })

  it('says so where somebody loses their part in it while the page is open, and keeps no row of it in sight', async () => {
    const server = createFakeDesk(({ path }) =>
      path.includes('sort=newest') ? problem(403, 'Only moderators do this.') : undefined,
    )
    renderApp('/review', server)
    await screen.findByRole('link', { name: 'Invented · Short 100' })
    fireEvent.change(screen.getByLabelText('Order'), { target: { value: 'newest' } })
    expect((await screen.findByRole('alert')).textContent).toContain('Only moderators do this.')
    expect(screen.queryByRole('link', { name: 'Invented · Short 100' })).toBeNull()
  })

  it('shows what went wrong with a way to try again, and an empty desk as such', async () => {
    let isBroken = true
    const server = createFakeDesk(({ path }) => {
      if (!path.startsWith('/api/v1/review?') && path !== '/api/v1/review') return undefined
      return isBroken ? problem(500, 'It broke.') : json(200, { items: [], total: 0, kinds: [], next: null })
    })
    renderApp('/review', server)
    const alert = await screen.findByRole('alert')
    expect(alert.textContent).toContain('It broke.')
    isBroken = false
    fireEvent.click(within(alert).getByRole('button', { name: 'Try again' }))
    expect(await screen.findByText('Nothing waits')).toBeTruthy()
  })
})
