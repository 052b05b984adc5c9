import { fireEvent, screen, waitFor } from '@testing-library/react'
import { expect, it } from 'vitest'
import '../../../src/app/routes/sign-in'
import '../../../src/app/routes/sign-up'
import type { ApiInit } from '../../../src/lib/api-client'
import { renderApp } from '../support/render-app'

interface Sent {
  readonly path: string
  readonly method: string
  readonly body: unknown
}

const json = (status: number, body: unknown) =>
  new Response(JSON.stringify(body), { status, headers: { 'Content-Type': 'application/json' } })

const problem = (status: number, detail: string, errors: object[] = []) =>
  json(status, { type: 't', title: 'T', status, detail, instance: '/', requestId: 'r', errors })

/** Answers writes one after the other as told; nobody is signed in until one was answered with 200. */
function createServer(answers: Response[]) {
  const sent: Sent[] = []
  let person: object | null = null
  return {
    sent,
    fetch: (path: string, { method = 'GET', body }: ApiInit = {}) => {
      if (method === 'GET') return Promise.resolve(json(200, { person }))
      sent.push({ path, method, body: JSON.parse(body ?? 'null') as unknown })
      const answer = answers.shift() ?? problem(500, 'Nothing more was expected.')
      if (answer.status === 200) {
        const can = { contribute: true, review: false, administer: false }
        person = { name: 'Tide', role: 'member', email: 'tide@example.com', isConfirmed: true, can }
      }
      return Promise.resolve(answer)
    },
  }
}

const type = (label: string, value: string) => fireEvent.change(screen.getByLabelText(label), { target: { value } })

it('names every wrong field in a summary that takes focus, and keeps what was typed', async () => {
  const server = createServer([
    problem(422, '2 fields need another look.', [
      { pointer: '#/name', detail: "is somebody else's already" },
      { pointer: '#/password', detail: 'is shorter than 15 characters' },
    ]),
    json(202, { message: 'A letter is on its way.' }),
  ])
  renderApp('/sign-up', server)
  await screen.findByRole('heading', { name: 'Sign up' })
  type('Name', 'Tide')
  type('E-mail address', 'tide@example.com')
  type('Password', 'short')
  fireEvent.click(screen.getByRole('button', { name: 'Sign up' }))
  const summary = await screen.findByRole('alert')
  await waitFor(() => expect(document.activeElement).toBe(summary))
  expect(summary.textContent).toContain("Name is somebody else's already.")
  expect(screen.getByLabelText('Password')).toHaveProperty('value', 'short')
  expect(screen.getByLabelText('Name').getAttribute('aria-invalid')).toBe('true')
  type('Password', 'limpets hold on by themselves')
  fireEvent.click(screen.getByRole('button', { name: 'Sign up' }))
  const done = await screen.findByText('tide@example.com')
  expect(done.closest('[role="status"]')).not.toBeNull()
  expect(server.sent.map(({ path, body }) => [path, body])).toEqual([
    ['/api/v1/people', { name: 'Tide', email: 'tide@example.com', password: 'short' }],
    ['/api/v1/people', { name: 'Tide', email: 'tide@example.com', password: 'limpets hold on by themselves' }],
  ])
})

it('says why signing in failed, keeps the address, and then goes on to where one was', async () => {
  const server = createServer([problem(401, 'These do not go together.'), json(200, {})])
  const { address } = renderApp('/sign-in?next=%2Fmethod', server)
  await screen.findByRole('heading', { name: 'Sign in' })
  type('E-mail address', 'tide@example.com')
  type('Password', 'a slip of the finger')
  fireEvent.click(screen.getByRole('button', { name: 'Sign in' }))
  expect((await screen.findByRole('alert')).textContent).toContain('These do not go together.')
  expect(screen.getByLabelText('E-mail address')).toHaveProperty('value', 'tide@example.com')
  fireEvent.click(screen.getByRole('button', { name: 'Sign in' }))
  await waitFor(() => expect(address()).toBe('/method'))
  expect((await screen.findByTitle('Your account, Tide')).textContent).toContain('Tide')
})

it('shows a password on request, and leaves it to password managers', async () => {
  renderApp('/sign-in', createServer([]))
  await screen.findByRole('heading', { name: 'Sign in' })
  const field = screen.getByLabelText('Password')
  expect(field.getAttribute('type')).toBe('password')
  expect(field.getAttribute('autocomplete')).toBe('current-password')
  fireEvent.click(screen.getByRole('button', { name: 'Show password' }))
  expect(field.getAttribute('type')).toBe('text')
})
