import { act, cleanup, fireEvent, screen, waitFor, within } from '@testing-library/react'
import { afterEach, describe, expect, it } from 'vitest'
// Imported here, so that no test waits for a page to be compiled when its route first asks for it.
import '../../../src/app/routes/review-proposal'
import { renderApp } from '../support/render-app'
import { createFakeDesk, problem, proposal, second } from './fake-desk'

afterEach(() => {
  cleanup()
  localStorage.clear()
  sessionStorage.clear()
})

async function open(server = createFakeDesk(), id = proposal.id) {
  const view = renderApp(`/review/${id}?sort=flagged`, server, { system: 'metric' })
  await screen.findByRole('heading', { name: 'Decide' })
  return { server, ...view }
}

const cardOf = (label: string) => screen.getByRole('heading', { level: 3, name: label }).closest('section')!
const choose = (label: string, choice: string) =>
  fireEvent.click(within(cardOf(label)).getByRole('radio', { name: choice }))
const type = (label: string, text: string) =>
  fireEvent.change(screen.getByRole('textbox', { name: label }), { target: { value: text } })
const decisions = ({ server }: { server: ReturnType<typeof createFakeDesk> }) =>
  server.sent.filter(({ path }) => path.endsWith('/decision'))

describe('a proposal on the review desk', () => {
  it('sets what is on record, what is proposed and what backs it side by side', async () => {
    await open()
    const length = cardOf('length')
    expect(length.textContent).toContain('250\u00a0mm')
    expect(length.textContent).toContain('254\u00a0mm')
    expect(length.textContent).toContain('typed “10 in”')
    expect(within(length).getByRole('link', { name: 'https://example.org/l' }).getAttribute('rel')).toContain(
      'nofollow',
    )
    expect(length.textContent).toContain('Its author says: I measured it twice.')
    expect(cardOf('power').textContent).toContain('Nothing backs it.')
    expect(await screen.findByText('A heater for a small chamber')).toBeTruthy()
  })

  it('shows a conflict from three sides, and lets nobody approve without choosing one', async () => {
    const view = await open()
    const power = cardOf('power')
    for (const text of ['100\u00a0W', '110\u00a0W', '120\u00a0W']) expect(power.textContent).toContain(text)
    fireEvent.click(screen.getByRole('button', { name: 'Approve 1 of 2' }))
    const summary = await screen.findByRole('alert')
    expect(document.activeElement).toBe(summary)
    expect(summary.textContent).toContain('Power: choose which value stands')
    expect(decisions(view)).toEqual([])
    choose('power', 'Use the proposed value')
    fireEvent.click(screen.getByRole('button', { name: 'Approve all 2' }))
    expect(await screen.findByRole('heading', { name: 'Approved: revision 5 is public' })).toBeTruthy()
    expect(decisions(view)).toMatchObject([
      { body: { decision: 'approve', fields: { powerW: { decision: 'approve' } } }, ifMatch: '"v2"' },
    ])
  })

  it('declines one value with words, and offers the next proposal with the same filters', async () => {
    const view = await open()
    choose('power', 'Keep what is on record now')
    fireEvent.click(screen.getByRole('button', { name: 'Approve 1 of 2' }))
    expect((await screen.findByRole('alert')).textContent).toContain('Power: say why it is declined')
    type('Why not, about power?', 'Measured since.')
    fireEvent.click(screen.getByRole('button', { name: 'Approve 1 of 2' }))
    const next = await screen.findByRole('link', { name: 'Next: Invented · Long 200' })
    expect(next.getAttribute('href')).toBe(`/review/${second.id}?sort=flagged`)
    expect(document.activeElement?.contains(next)).toBe(true)
    expect(decisions(view)[0]?.body).toEqual({
      decision: 'approve',
      fields: { powerW: { decision: 'decline', words: 'Measured since.' } },
    })
  })

  it('sends back only with a reason and words', async () => {
    const view = await open()
    fireEvent.click(screen.getByRole('radio', { name: 'Send back with questions' }))
    fireEvent.click(screen.getByRole('button', { name: 'Send it back' }))
    const summary = await screen.findByRole('alert')
    expect(summary.textContent).toContain('Choose a reason')
    expect(summary.textContent).toContain('Say it in words')
    fireEvent.change(screen.getByLabelText('Reason'), { target: { value: 'question' } })
    type('What do you ask its author?', 'Where did you measure?')
    fireEvent.click(screen.getByRole('button', { name: 'Send it back' }))
    expect(await screen.findByRole('heading', { name: 'Sent back' })).toBeTruthy()
    expect(decisions(view)[0]?.body).toEqual({
      decision: 'send-back',
      reasonCode: 'question',
      words: 'Where did you measure?',
    })
  })

  it('keeps every word when its author was quicker, and names what changed (stale decision)', async () => {
    let isStale = true
    const server = createFakeDesk(({ path }) => {
      if (!path.endsWith('/decision') || !isStale) return undefined
      isStale = false
      server.change(proposal.id, {
        values: { ...proposal.values, lengthMm: { ...proposal.values.lengthMm!, value: 255 } },
        fields: {
          ...proposal.fields,
          lengthMm: { ...proposal.fields.lengthMm!, proposed: { ...proposal.values.lengthMm!, value: 255 } },
        },
      })
      return problem(412, 'It was changed since.', { current: {} })
    })
    const view = await open(server)
    choose('power', 'Keep what is on record now')
    type('Why not, about power?', 'Measured since.')
    type('Words to its author, if any', 'Thank you.')
    fireEvent.click(screen.getByRole('button', { name: 'Approve 1 of 2' }))
    const notice = await screen.findByRole('alert')
    expect(notice.textContent).toContain('Changed: length.')
    expect(document.activeElement).toBe(notice)
    expect(cardOf('length').textContent).toContain('255\u00a0mm')
    expect(screen.getByRole('textbox', { name: 'Words to its author, if any' })).toHaveProperty('value', 'Thank you.')
    fireEvent.click(screen.getByRole('button', { name: 'Approve 1 of 2' }))
    await screen.findByRole('heading', { name: 'Approved: revision 5 is public' })
    expect(decisions(view).map(({ ifMatch }) => ifMatch)).toEqual(['"v2"', '"v3"'])
  })

  it('names who decided first, and keeps the words of who came second (two moderators)', async () => {
    const server = createFakeDesk(({ path }) => {
      if (!path.endsWith('/decision')) return undefined
      server.change(proposal.id, {
        status: 'declined',
        can: { ...proposal.can, decide: false, lease: false },
        decision: {
          decision: 'decline',
          reasonCode: 'not-backed',
          words: 'Nothing came.',
          fields: {},
          by: 'Other Moderator',
          at: '2026-01-02T10:00:00.000Z',
        },
      })
      return problem(409, 'Other Moderator declined it a moment ago.')
    })
    await open(server)
    fireEvent.click(within(screen.getByRole('form', { name: 'Decide' })).getByRole('radio', { name: 'Decline' }))
    fireEvent.change(screen.getByLabelText('Reason'), { target: { value: 'out-of-scope' } })
    type('Why is it declined?', 'My long explanation.')
    fireEvent.click(screen.getByRole('button', { name: 'Decline it' }))
    const notice = await screen.findByRole('alert')
    expect(notice.textContent).toContain('Other Moderator declined it a moment ago.')
    expect(screen.getByText('Nothing came.')).toBeTruthy()
    expect(screen.getByRole('textbox', { name: 'Your words, not sent' })).toHaveProperty(
      'value',
      'My long explanation.',
    )
    expect(screen.queryByRole('button', { name: 'Decline it' })).toBeNull()
  })

  it('is taken and let go of, with the time that is left', async () => {
    await open()
    fireEvent.click(screen.getByRole('button', { name: 'Take it' }))
    expect((await screen.findByRole('timer')).textContent).toMatch(/^1[45]:\d\d$/)
    fireEvent.click(screen.getByRole('button', { name: 'Let it go' }))
    expect(await screen.findByText(/Nobody holds this/)).toBeTruthy()
  })

  it('names who holds it, and lets it be read and prepared meanwhile', async () => {
    const server = createFakeDesk()
    const until = new Date(Date.now() + 5 * 60_000).toISOString()
    server.change(proposal.id, {
      lease: { holder: 'Other Moderator', isMine: false, until },
      can: { ...proposal.can, decide: false, lease: false },
    })
    await open(server)
    expect(screen.getAllByText(/Other Moderator/).length).toBeGreaterThan(0)
    expect(screen.queryByRole('button', { name: 'Take it' })).toBeNull()
    type('Words to its author, if any', 'Prepared.')
    expect(screen.getByText(/holds this now: it cannot be decided until then/)).toBeTruthy()
  })

  it('is decided by keyboard: to a value, a choice about it, on to the decision', async () => {
    await open()
    const press = (key: string) => act(() => void fireEvent.keyDown(document.activeElement ?? document.body, { key }))
    press('j')
    expect(document.activeElement).toBe(cardOf('length'))
    press('x')
    const words = await screen.findByRole('textbox', { name: 'Why not, about length?' })
    await waitFor(() => expect(document.activeElement).toBe(words))
    press('a')
    expect(within(cardOf('length')).getByRole<HTMLInputElement>('radio', { name: 'Decline' }).checked).toBe(true)
    cardOf('length').focus()
    press('a')
    expect(within(cardOf('length')).getByRole<HTMLInputElement>('radio', { name: 'Approve' }).checked).toBe(true)
    press('d')
    expect(document.activeElement).toBe(document.querySelector('[name=course]:checked'))
  })

  it('keeps a decision in the making through a reload', async () => {
    const { unmount } = await open()
    type('Words to its author, if any', 'Half a thought')
    unmount()
    await open()
    expect(screen.getByRole('textbox', { name: 'Words to its author, if any' })).toHaveProperty(
      'value',
      'Half a thought',
    )
  })

  it('sends words that decide nothing, and keeps them where that fails', async () => {
    let isAway = true
    const server = createFakeDesk(({ path }) =>
      path.endsWith('/messages') ? (isAway ? problem(500, 'It broke.') : new Response('{}')) : undefined,
    )
    await open(server)
    type('Say something that decides nothing', 'Which end?')
    fireEvent.click(screen.getByRole('button', { name: 'Send your words' }))
    expect(await screen.findByText(/It broke. Your words are still here/)).toBeTruthy()
    isAway = false
    fireEvent.click(screen.getByRole('button', { name: 'Send your words' }))
    await waitFor(() =>
      expect(screen.getByRole('textbox', { name: 'Say something that decides nothing' })).toHaveProperty('value', ''),
    )
  })
})
