import { fireEvent, screen, waitFor } from '@testing-library/react'
import { describe, expect, it } from 'vitest'
// Imported here, so that no test waits for a page to be compiled when its route first asks for it.
import '../../../src/app/routes/admin-audit'
import type { ApiInit } from '../../../src/lib/api-client'
import { renderApp } from '../support/render-app'

const json = (status: number, body: unknown) =>
  new Response(JSON.stringify(body), { status, headers: { 'Content-Type': 'application/json' } })

const problem = (status: number, detail: string, errors?: object[]) =>
  json(status, { type: 't', title: 'Not so', status, detail, instance: '/', requestId: 'r', ...(errors && { errors }) })

/** Answers by method and path; the query is passed on. */
function createServer(answers: Record<string, (query: URLSearchParams) => Response>) {
  const calls: string[] = []
  return {
    calls,
    fetch: (path: string, init: ApiInit = {}) => {
      const { pathname, searchParams } = new URL(path, 'http://here.invalid')
      const call = `${init.method ?? 'GET'} ${pathname.replace('/api/v1', '')}`
      calls.push(`${call}?${searchParams.toString()}`)
      return Promise.resolve(answers[call]?.(searchParams) ?? problem(404, 'Not here.'))
    },
  }
}

const event = {
  id: 7,
  at: '2026-05-01T10:20:30.000Z',
  actor: 'Invented Person',
  action: 'proposal.approve',
  subject: { type: 'proposal', id: 'p-1' },
  detail: { revision: 3 },
  requestId: null,
}

const letter = {
  id: '3f0e2a34-8a62-4d8e-9d38-0d6a4f4c1111',
  recipient: 'reader@example.org',
  kind: 'account.reset',
  subject: 'A new password',
  status: 'dead',
  attempts: 12,
  lastError: 'connection refused',
  createdAt: '2026-05-01T10:20:30.000Z',
  sentAt: null,
  can: { retry: true },
}

describe('the audit trail', () => {
  it('asks what the address asks, and shows who did what', async () => {
    const server = createServer({ 'GET /admin/audit': () => json(200, { items: [event], next: null }) })
    renderApp('/admin/audit?actor=Invented+Person&action=', server)
    expect(await screen.findByText('proposal.approve')).toBeDefined()
    expect(server.calls).toContain('GET /admin/audit?actor=Invented+Person')
    expect(screen.getByLabelText('Who')).toHaveProperty('value', 'Invented Person')
  })

  it('names a wrong day beside its field and keeps what was typed', async () => {
    const server = createServer({
      'GET /admin/audit': () => problem(422, 'One.', [{ pointer: '#/from', detail: 'must be a day' }]),
    })
    renderApp('/admin/audit?from=yesterday', server)
    expect(await screen.findByRole('alert')).toHaveProperty(
      'textContent',
      expect.stringContaining('from must be a day'),
    )
    expect(screen.getByLabelText('From')).toHaveProperty('value', 'yesterday')
  })

  it('tells somebody without the right so', async () => {
    const server = createServer({ 'GET /admin/audit': () => problem(403, 'Only admins read the audit trail.') })
    renderApp('/admin/audit', server)
    expect(await screen.findByText('Only admins read the audit trail.')).toBeDefined()
  })
})

describe('the letters', () => {
  it('can be tried again, and the list is asked for anew', async () => {
    let isRevived = false
    const counts = { waiting: 0, sent: 0, dead: 1 }
    const server = createServer({
      'GET /admin/letters': () =>
        json(200, { items: isRevived ? [] : [letter], next: null, counts, oldestWaiting: null }),
      [`POST /admin/letters/${letter.id}/retry`]: () => {
        isRevived = true
        return json(200, { ...letter, status: 'waiting', can: { retry: false } })
      },
    })
    renderApp('/admin/letters', server)
    fireEvent.click(await screen.findByRole('button', { name: /Try again/ }))
    expect(await screen.findByText('No letter was given up.')).toBeDefined()
  })

  it('say what went wrong when somebody else was quicker', async () => {
    const counts = { waiting: 0, sent: 0, dead: 1 }
    const server = createServer({
      'GET /admin/letters': () => json(200, { items: [letter], next: null, counts, oldestWaiting: null }),
      [`POST /admin/letters/${letter.id}/retry`]: () => problem(409, 'This letter is waiting to be sent.'),
    })
    renderApp('/admin/letters', server)
    fireEvent.click(await screen.findByRole('button', { name: /Try again/ }))
    expect(await screen.findByText('This letter is waiting to be sent.')).toBeDefined()
  })
})

describe('the mailroom', () => {
  it('shows a letter’s words with links that can be followed', async () => {
    const received = {
      receivedAt: '2026-05-01T10:20:30.000Z',
      messageId: 'a@b',
      from: 'Stillfits',
      to: 'reader@example.org',
      subject: 'Confirm <b>your</b> address',
      text: 'Confirm:\nhttp://127.0.0.1:4000/confirm?token=abc',
      html: '',
      unsubscribeUrl: null,
    }
    renderApp('/mailroom', createServer({ 'GET /mailroom': () => json(200, { items: [received] }) }))
    const link = await screen.findByRole('link', { name: /confirm\?token=abc/ })
    expect(link.getAttribute('href')).toBe('http://127.0.0.1:4000/confirm?token=abc')
    expect(screen.getByRole('heading', { name: 'Confirm <b>your</b> address' })).toBeDefined()
  })

  it('is not there where real mail is sent', async () => {
    renderApp('/mailroom', createServer({}))
    expect(await screen.findByRole('alert')).toHaveProperty('textContent', expect.stringContaining('Not here.'))
  })
})

describe('the page to unsubscribe', () => {
  it('changes nothing until its button is pressed', async () => {
    const server = createServer({ 'POST /unsubscribe': () => new Response(null, { status: 204 }) })
    renderApp('/unsubscribe?token=abc', server)
    const button = await screen.findByRole('button', { name: 'End notices by e-mail' })
    expect(server.calls.filter((call) => call.includes('unsubscribe'))).toEqual([])
    fireEvent.click(button)
    await waitFor(() => expect(server.calls).toContain('POST /unsubscribe?token=abc'))
    expect(await screen.findByText('You get no more notices by e-mail')).toBeDefined()
  })
})

describe('the pages about the site', () => {
  it.each([
    ['/about', 'About Stillfits', 'Nobody pays for a place in the answers, and there is no way to.'],
    ['/privacy', 'What is kept about you', 'a hash of your password (never the password)'],
    ['/licence', 'Licence of the data', 'Open Database Licence 1.0'],
  ])('%s says what is true', async (path, title, words) => {
    renderApp(path, createServer({}))
    const heading = await screen.findByRole('heading', { level: 1, name: title })
    expect(heading.closest('main')?.textContent).toContain(words)
  })
})
