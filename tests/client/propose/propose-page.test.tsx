import { fireEvent, screen, waitFor, within } from '@testing-library/react'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import { createFakeRecord, inventProposal, refuseFields } from '../support/fake-record'
import { inventedHeater } from '../support/invented-gear'
import { stubUploads } from '../support/fake-upload'
import { renderApp } from '../support/render-app'
import '../../../src/app/routes/gear-edit'
import '../../../src/app/routes/gear-new'
import '../../../src/app/routes/proposal'

const edit = `/gear/${inventedHeater.slug}/edit`
const lengthField = () => screen.findByLabelText('Length')
const type = (field: HTMLElement, value: string) => fireEvent.change(field, { target: { value } })
const press = (name: string | RegExp) => fireEvent.click(screen.getByRole('button', { name }))

async function open(address = edit, server = createFakeRecord(inventedHeater)) {
  const view = renderApp(address, server)
  await lengthField()
  return { ...view, server }
}

beforeEach(() => {
  localStorage.clear()
  Element.prototype.scrollIntoView = () => undefined
})
afterEach(() => vi.unstubAllGlobals())

describe('correcting a piece', () => {
  it('sends what was changed alone, with the revision it started from, and shows the proposal', async () => {
    const { server, address } = await open()
    type(await lengthField(), '10 5/8"')
    press('Propose the change')
    await waitFor(() => expect(address()).toMatch(/^\/proposals\/.*sent=1$/))
    const [created, submitted] = server.writes()
    expect(created?.headers['Idempotency-Key']).toMatch(/^[0-9a-f]{32}$/)
    expect(created?.body).toMatchObject({ kind: 'heater', gear: inventedHeater.slug, baseRevision: 3, identity: {} })
    expect(created?.body).toMatchObject({
      values: { lengthMm: { value: 269.875, raw: '10 5/8"', source: 'measured' } },
    })
    expect(Object.keys((created?.body as { values: object } | undefined)?.values ?? {})).toEqual(['lengthMm'])
    expect(submitted).toMatchObject({ method: 'POST', headers: { 'If-Match': '"v1"' } })
    expect(localStorage).toHaveLength(0)
  })

  it('names every wrong field in a summary that takes focus, and sends nothing', async () => {
    const { server } = await open()
    type(await lengthField(), '5 gallons')
    type(screen.getByLabelText('Power'), 'plenty')
    press('Propose the change')
    const summary = await screen.findByRole('alert')
    await waitFor(() => expect(document.activeElement).toBe(summary))
    const links = within(summary).getAllByRole('link')
    expect(links.map((link) => link.getAttribute('href'))).toEqual(['#specs-lengthMm-text', '#specs-powerW-text'])
    expect((await lengthField()).getAttribute('aria-invalid')).toBe('true')
    expect(server.writes()).toEqual([])
  })

  it('puts what the API refuses at the same fields, and keeps everything typed', async () => {
    const { server } = await open()
    server.world.refusal = refuseFields([
      { pointer: '#/values/lengthMm/value', detail: 'must be a number between 10 and 600 mm' },
    ])
    type(await lengthField(), '10 1/2 in')
    press('Propose the change')
    expect(
      await screen.findByRole('link', { name: 'Length: This must be a number between 10 and 600 mm.' }),
    ).toBeDefined()
    expect(await lengthField()).toHaveProperty('value', '10 1/2 in')
  })

  it('without a change says that nothing differs', async () => {
    const { server } = await open()
    press('Propose the change')
    expect(await screen.findByText(/Nothing differs from the record yet/)).toBeDefined()
    expect(server.writes()).toEqual([])
  })

  it('asks a visitor to sign in when it is sent, keeps what was typed, and says where to come back to', async () => {
    const server = createFakeRecord(inventedHeater)
    server.world.person = null
    await open(edit, server)
    type(await lengthField(), '11 in')
    press('Propose the change')
    const link = await screen.findByRole('link', { name: 'Sign in and come back' })
    expect(link.getAttribute('href')).toBe(`/sign-in?next=${encodeURIComponent(edit)}`)
    await waitFor(() => expect(localStorage.getItem(`stillfits.draft.${inventedHeater.slug}`)).toContain('11 in'))
    expect(server.writes()).toEqual([])
  })

  it('shows field by field what somebody else changed meanwhile, and goes on with what was typed', async () => {
    const { server } = await open()
    type(await lengthField(), '11 in')
    server.world.gear = {
      ...inventedHeater,
      revision: 4,
      specs: { ...inventedHeater.specs, lengthMm: 300, powerW: 150 },
    }
    press('Propose the change')
    const table = await screen.findByRole('table', { name: 'What changed meanwhile' })
    expect(
      within(table)
        .getAllByRole('row')
        .map((row) => row.textContent?.replaceAll('\u00a0', ' ')),
    ).toEqual(['ValueWhen you beganNowYours', 'length10.6 in11.8 in11 in', 'power100 W150 Was now'])
    expect(server.writes()).toEqual([])
    press('Go on from the record as it is now')
    await waitFor(() => expect(screen.getByLabelText('Power')).toHaveProperty('value', '150 W'))
    expect(await lengthField()).toHaveProperty('value', '11 in')
    press('Propose the change')
    await waitFor(() => expect(server.writes()[0]?.body).toMatchObject({ baseRevision: 4 }))
  })

  it('shows what another tab amended, and goes on from there when asked to', async () => {
    const server = createFakeRecord(inventedHeater)
    const proposal = inventProposal(inventedHeater, {
      values: { lengthMm: { value: 279.4, raw: '11 in', source: 'measured', date: '2026-01-02' } },
    })
    server.world.proposal = proposal
    await open(`${edit}?proposal=${proposal.id}`, server)
    expect(await lengthField()).toHaveProperty('value', '11 in')
    server.world.proposal = {
      ...proposal,
      version: 2,
      values: { lengthMm: { value: 304.8, raw: '12 in', source: 'measured', date: '2026-01-02' } },
    }
    type(await lengthField(), '11 1/4 in')
    press('Propose the change')
    const table = await screen.findByRole('table', { name: 'What changed meanwhile' })
    expect(table.textContent?.replaceAll('\u00a0', ' ')).toContain('length11 in12 in11.3 in')
    expect(await lengthField()).toHaveProperty('value', '11 1/4 in')
    press('Go on with what stands here')
    press('Propose the change')
    await waitFor(() => expect(server.world.proposal).toMatchObject({ status: 'pending', version: 4 }))
    expect(server.world.proposal?.values.lengthMm).toMatchObject({ raw: '11 1/4 in' })
  })
})

describe('a draft', () => {
  it('is back on the next visit with a line that says so, and can be thrown away', async () => {
    const first = await open()
    type(await lengthField(), '11')
    await waitFor(() => expect(localStorage).toHaveLength(1))
    first.unmount()
    await open()
    expect(await screen.findByText(/What you typed on .* is back/)).toBeDefined()
    expect(await lengthField()).toHaveProperty('value', '11 in')
    press('Throw it away')
    await waitFor(async () => expect(await lengthField()).toHaveProperty('value', '10.59 in'))
    expect(localStorage).toHaveLength(0)
  })

  it('that was damaged in the browser is passed over', async () => {
    localStorage.setItem(`stillfits.draft.${inventedHeater.slug}`, '{"kind":"heater","typed":7}')
    await open()
    expect(await lengthField()).toHaveProperty('value', '10.59 in')
  })

  it('goes to the server by itself once it rests, for whoever is signed in', async () => {
    const { server } = await open()
    type(await lengthField(), '11 in')
    await waitFor(() => expect(server.world.proposal?.status).toBe('draft'))
    expect(await screen.findByText('Kept in this browser and among your drafts.')).toBeDefined()
  })
})

describe('an unlikely number', () => {
  it('is questioned beside its field, and one press takes what was meant', async () => {
    await open()
    type(screen.getByLabelText('Power'), '1000 W')
    fireEvent.click(await screen.findByRole('button', { name: /^Take 100/ }))
    expect(screen.getByLabelText('Power')).toHaveProperty('value', '100 W')
    await waitFor(() => expect(screen.queryByText('Is this right?')).toBeNull())
  })

  it('can be sent all the same, with the reason why it is right', async () => {
    const { server } = await open()
    type(screen.getByLabelText('Power'), '1000 W')
    fireEvent.click(await screen.findByRole('button', { name: 'It is right' }))
    type(await screen.findByLabelText('Why it is right'), 'rated for a pond')
    press('Propose the change')
    await waitFor(() =>
      expect(server.writes()[0]?.body).toMatchObject({
        flags: [{ path: 'powerW', rule: 'slip', value: 1000, reason: 'rated for a pond' }],
      }),
    )
  })
})

describe('evidence', () => {
  const choose = (file: File) =>
    fireEvent.change(screen.getByLabelText('Photos and PDFs'), { target: { files: [file] } })
  const photo = () => new File(['bytes'], 'calipers.jpg', { type: 'image/jpeg' })

  it('of 40 MB is refused before anything is sent', async () => {
    const uploads = stubUploads()
    await open()
    const large = photo()
    Object.defineProperty(large, 'size', { value: 40 * 1024 * 1024 })
    choose(large)
    expect((await screen.findByRole('alert')).textContent).toMatch(
      /“calipers.jpg” is 40 MB, and a file can be up to 25 MB/,
    )
    expect(uploads).toHaveLength(0)
  })

  it('is sent with its progress, backs the values, and can be removed', async () => {
    const uploads = stubUploads()
    const { server } = await open()
    type(await lengthField(), '11 in')
    choose(photo())
    await waitFor(() => expect(uploads).toHaveLength(1))
    uploads[0]!.progress(1, 4)
    expect(await screen.findByText('25%')).toBeDefined()
    const id = '7a1de0d2-4a0c-4b8e-9c39-5a3a5b1c2d3e'
    uploads[0]!.answer(201, { id, kind: 'photo', contentType: 'image/jpeg', width: 4, height: 3, caption: null })
    expect(await screen.findByAltText('Your photo calipers.jpg')).toBeDefined()
    press('Propose the change')
    await waitFor(() => expect(server.world.proposal?.status).toBe('pending'))
    expect(server.world.proposal?.values.lengthMm?.files).toEqual([id])
  })

  it('can be stopped on its way', async () => {
    const uploads = stubUploads()
    await open()
    type(await lengthField(), '11 in')
    choose(photo())
    fireEvent.click(await screen.findByRole('button', { name: 'Stop sending calipers.jpg' }))
    await waitFor(() => expect(screen.queryByText(/calipers\.jpg/)).toBeNull())
    expect(uploads.every(({ isAborted }) => isAborted)).toBe(true)
  })
})

describe('a new piece', () => {
  const address = '/gear/new?kind=heater'

  it('shows likely duplicates before it is made a second time', async () => {
    await open(address)
    type(screen.getByLabelText('Model'), 'Ember 100')
    const found = await screen.findByRole('region', { name: 'Likely duplicates' })
    expect(within(found).getByRole('link', { name: 'Invented Ember 100' })).toBeDefined()
    expect(within(found).getByRole('link', { name: 'Correct Invented Ember 100' }).getAttribute('href')).toBe(edit)
  })

  it('takes a pasted table after it was looked at, and lists what it did not understand', async () => {
    await open(address)
    type(screen.getByLabelText('Table or list'), 'Length: 12 in\nPower: 100 W\nColour: black')
    press('Read it')
    const unread = await screen.findByRole('region', { name: 'Not understood' })
    expect(unread.textContent).toContain('Colour: black')
    fireEvent.change(screen.getByLabelText('Field for “Power: 100 W”'), { target: { value: '' } })
    fireEvent.change(screen.getByLabelText('Value of line 1'), { target: { value: '12 1/4 in' } })
    press('Take 1 value into the form')
    await waitFor(async () => expect(await lengthField()).toHaveProperty('value', '12 1/4 in'))
    expect(screen.getByLabelText('Power')).toHaveProperty('value', '')
  })
})
