import { act, fireEvent, screen, waitFor, within } from '@testing-library/react'
import { describe, expect, it } from 'vitest'
import { createFakeServer, renderApp } from '../support/render-app'

const setup =
  'tank.volumeL=20%20gal&tank.chambers.0.id=rear-1&tank.chambers.0.lengthMm=4%20in&tank.chambers.0.widthMm=5%20in&tank.chambers.0.waterDepthMm=12%20in&room.coldestC=65%20%C2%B0F'
const address = `/find?kind=heater&${setup}`

const findShort = () => screen.findByText('Invented · Short 100')

/** By path: finding it by role and name would have every element of the drawing named first. */
function findDrawn(path: string): Element {
  const found = document.querySelector(`svg [data-path="${path}"]`)
  if (!found) throw new Error(`Nothing drawn stands for ${path}.`)
  return found
}

describe('the finder page', () => {
  it('shows what fits, and announces how many do, do not, or cannot be judged', async () => {
    renderApp(address, createFakeServer())
    await findShort()
    await screen.findByText('1 fit, 0 with changes, 1 do not fit, 1 lack data.')
    expect(screen.getByText('without a recorded length')).toBeDefined()
  })

  it('asks nothing and shows an example while the tank is not described', async () => {
    const server = createFakeServer()
    renderApp('/find', server)
    await screen.findByText(/Drawn as a 20 gal tank until you say/)
    // Who is signed in is the page's business, not the finder's.
    expect(server.calls.filter(({ path }) => path !== '/api/v1/session')).toEqual([])
  })

  it('applies a measure typed into the drawing: the address changes and new answers come', async () => {
    const server = createFakeServer()
    const view = renderApp(address, server)
    await findShort()
    fireEvent.click(findDrawn('tank.chambers.0.waterDepthMm'))
    const dialog = await screen.findByRole('dialog')
    const field = within(dialog).getByLabelText('Chamber water depth')
    fireEvent.change(field, { target: { value: '8' } })
    expect(within(dialog).getByText('8 in = 203.2 mm')).toBeDefined()
    fireEvent.submit(field.closest('form')!)
    await screen.findByText(/0 fit, 0 with changes, 2 do not fit, 1 lack data/)
    expect(view.address()).toContain('tank.chambers.0.waterDepthMm=8%20in')
    expect(screen.queryByRole('dialog')).toBeNull()
    expect(screen.getByText(/None of the 3 heaters fits/)).toBeDefined()
  })

  it('keeps a measure that cannot be read, says why, and changes nothing', async () => {
    const view = renderApp(address, createFakeServer())
    await findShort()
    const before = view.address()
    fireEvent.click(findDrawn('tank.chambers.0.waterDepthMm'))
    const dialog = await screen.findByRole('dialog')
    const field = within(dialog).getByLabelText<HTMLInputElement>('Chamber water depth')
    fireEvent.change(field, { target: { value: '12 gallons' } })
    fireEvent.submit(field.closest('form')!)
    await within(dialog).findByText(/is a volume; a length is expected/)
    expect(field.value).toBe('12 gallons')
    fireEvent.change(field, { target: { value: '40 ft' } })
    // Far outside of what a chamber can be: said in the person's own unit.
    await within(dialog).findByText(/outside of what this can be: .*in/)
    expect(view.address()).toBe(before)
  })

  it('confirms an assumption with one press', async () => {
    const view = renderApp(address, createFakeServer())
    await findShort()
    fireEvent.click(screen.getByLabelText(/Humidity, 50%, assumed/))
    fireEvent.click(within(await screen.findByRole('dialog')).getByRole('button', { name: 'Yes, 50%' }))
    await waitFor(() => expect(view.address()).toContain('room.relativeHumidity=50%25'))
    await screen.findByLabelText(/Humidity, 50%, given/)
  })

  it('opens the pieces that one check turned away', async () => {
    const view = renderApp(address, createFakeServer())
    await findShort()
    const chip = screen.getByText(/too long/)
    fireEvent.click(chip)
    await screen.findByText('Invented · Long 100')
    expect(view.address()).toContain('show=no&check=heater.space')
  })

  it('opens the pieces that one missing number leaves unjudged', async () => {
    const view = renderApp(address, createFakeServer())
    await findShort()
    fireEvent.click(screen.getByText('without a recorded length'))
    await waitFor(() => expect(view.address()).toContain('show=unknown&missing=lengthMm'))
    await screen.findByText('Invented · Unmeasured 100')
  })

  it('says what would make a piece fit, and tries it with one press', async () => {
    // A heater of 520 mm stands in no 12 in of water, and this tank is 24 in high.
    const sizes = 'tank.outerLengthMm=16%20in&tank.outerWidthMm=12%20in&tank.outerHeightMm=24%20in'
    const view = renderApp(`${address.replace('tank.volumeL=20%20gal', sizes)}&show=no`, createFakeServer())
    await screen.findByText('Invented · Long 100')
    const line = screen.getByText(/It would fit/)
    expect(line.textContent?.replaceAll('\u00a0', ' ')).toMatch(
      /^It would fit( with changes)? if the water in the rear chamber were 8.5 in deeper. Try it$/,
    )
    fireEvent.click(within(line).getByRole('link', { name: 'Try it' }))
    // 12 in and 8.5 in are 520.7 mm.
    await waitFor(() => expect(view.address()).toContain('tank.chambers.0.waterDepthMm=20.5%20in'))
    await screen.findByText('3 fit, 0 with changes, 0 do not fit, 0 lack data.')
  })

  it('picks a piece on the scales by keyboard and shows its answer beside them', async () => {
    const view = renderApp(address, createFakeServer())
    await findShort()
    const scale = screen.getAllByRole('listbox', { name: /Length/ })[0]!
    fireEvent.keyDown(scale, { key: 'End' })
    await waitFor(() => expect(view.address()).toContain('picked=invented-long-100'))
    const apart = await screen.findByRole('list', { name: 'The piece you picked' })
    expect(within(apart).getByText(/Does not fit/)).toBeDefined()
  })

  it('names wrong fields of a link with what is allowed and still answers for the rest', async () => {
    renderApp(`${address}&mains.volts=12`, createFakeServer())
    await findShort()
    const summary = screen.getByRole('alert')
    expect(summary.textContent).toMatch(/Mains voltage: .*100, 120, 230/)
  })

  it('speaks in the other units at once when they are switched', async () => {
    const { app } = renderApp(address, createFakeServer())
    await findShort()
    act(() => app.preferences.set({ system: 'metric' }))
    await waitFor(() => expect(screen.getAllByText(/250 mm long/).length).toBeGreaterThan(0))
    expect(findDrawn('tank.chambers.0.waterDepthMm').getAttribute('aria-label')).toMatch(/water depth 305/)
  })

  it('says that the catalogue is away, keeps the setup, and answers by itself once it is back', async () => {
    const server = createFakeServer()
    server.setAway(true)
    const view = renderApp(address, server)
    await screen.findByText('The catalogue cannot be reached just now')
    expect(view.address()).toBe(address)
    server.setAway(false)
    await waitFor(() => screen.getByText('Invented · Short 100'), { timeout: 30_000 })
  })
})
