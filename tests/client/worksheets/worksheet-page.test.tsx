import { act, cleanup, fireEvent, screen, waitFor, within } from '@testing-library/react'
import { afterEach, describe, expect, it } from 'vitest'
// Imported here, so that no test waits for a page to be compiled when its route first asks for it.
import '../../../src/app/routes/worksheets'
import '../../../src/app/routes/worksheets-sheet'
import { renderApp } from '../support/render-app'

const json = (body: unknown, status = 200) =>
  Promise.resolve(new Response(JSON.stringify(body), { status, headers: { 'Content-Type': 'application/json' } }))

const heater = {
  slug: 'invented-short-100',
  kind: 'heater',
  brand: 'Invented',
  model: 'Short 100',
  gtin: null,
  status: 'current',
  specs: { lengthMm: 250, diameterMm: 24, powerW: 100, orientation: 'vertical', minImmersionMm: 200 },
  provenance: {},
  confirmations: {},
  sources: {},
  disputed: [],
  revision: 1,
  notes: null,
  createdAt: '2026-01-01T00:00:00.000Z',
  updatedAt: '2026-01-01T00:00:00.000Z',
}

const server = {
  fetch: (path: string) =>
    path === `/api/v1/gear/${heater.slug}`
      ? json(heater)
      : json({ type: 't', title: 'Not here', status: 404, detail: 'Not here.', instance: path, requestId: 'r' }, 404),
}

afterEach(() => {
  cleanup()
  localStorage.clear()
})

const type = (name: string | RegExp, text: string) =>
  fireEvent.change(screen.getByRole('textbox', { name }), { target: { value: text } })

const resultOf = (label: string) => {
  const section = screen.getByRole('region', { name: 'Result' })
  return within(section).getByText(label, { selector: 'dt' }).nextElementSibling?.textContent
}

describe('the page of a worksheet', () => {
  it('shows an example and says so, with the numbers put into each formula', async () => {
    renderApp('/worksheets/salt-mix', server, { system: 'metric' })
    expect(await screen.findByRole('heading', { level: 1, name: 'Salt for new water' })).toBeTruthy()
    expect(screen.getByText('An example.')).toBeTruthy()
    // 75 L of a pack of 6.8 kg for 190 L: 2.68 kg, by hand.
    expect(resultOf('Salt mix')).toBe('2.7\u00a0kg')
    expect(screen.getByText(/75 L ÷ 190 L × 35 ppt ÷ 35 ppt/)).toBeTruthy()
  })

  it('works out what is typed at once, and the address follows', async () => {
    const { address } = renderApp('/worksheets/salt-mix', server, { system: 'metric' })
    await screen.findByText('An example.')
    type('Water to mix', '190')
    await waitFor(() => expect(resultOf('Salt mix')).toBe('6.8\u00a0kg'))
    expect(screen.queryByText('An example.')).toBeNull()
    await waitFor(() => expect(address()).toContain('volumeL=190%20L'))
    expect(screen.getByRole<HTMLInputElement>('textbox', { name: 'Water to mix' }).value).toBe('190')
  })

  it('keeps the unit of what was typed when the other system is switched to', async () => {
    const { app } = renderApp('/worksheets/salt-mix', server, { system: 'us' })
    await screen.findByText('An example.')
    type('Water to mix', '20')
    act(() => app.preferences.set({ system: 'metric' }))
    const field = screen.getByRole<HTMLInputElement>('textbox', { name: 'Water to mix' })
    await waitFor(() => expect(field.value).toBe('20 gal'))
  })

  it('keeps a wrong text, names it beside its field, and shows no result of it', async () => {
    renderApp('/worksheets/salt-mix', server)
    await screen.findByText('An example.')
    type('Water to mix', '20 lb')
    await screen.findByText(/marked numbers need another look/)
    const field = screen.getByRole<HTMLInputElement>('textbox', { name: 'Water to mix' })
    expect(field.value).toBe('20 lb')
    expect(field.getAttribute('aria-invalid')).toBe('true')
    fireEvent.click(screen.getByRole('button', { name: 'Work it out' }))
    const summary = await screen.findByRole('alert')
    expect(summary.textContent).toMatch(/Water to mix: .*20 lb.*is a weight/)
  })

  it('says what is still needed in an empty form', async () => {
    renderApp('/worksheets/salt-mix?clear=yes', server)
    expect(await screen.findByText(/Still needed/)).toBeTruthy()
    expect(screen.getByRole('link', { name: 'Water to mix' }).getAttribute('href')).toBe('#sheet-volumeL')
  })

  it('prints values in both systems where the reader’s is not the formula’s', async () => {
    renderApp('/worksheets/sand-bed?lengthMm=1176&widthMm=576&depthMm=50&packKg=9', server, { system: 'us' })
    // 52.16 kg by hand (2800 kg/m³, 45 % pores); 1 lb is 0.45359237 kg exactly: 115 lb.
    expect(await screen.findByText(/^52\.16\skg = 115\slb$/)).toBeTruthy()
    expect(resultOf('Dry sand')).toBe('115\u00a0lb')
  })

  it('adds a row as the last one is filled', async () => {
    renderApp('/worksheets/power-load?items.0.powerW=100&circuit.volts=120&circuit.circuitA=15', server)
    expect(await screen.findByText('device 2')).toBeTruthy()
    expect(screen.queryByText('device 3')).toBeNull()
    const second = screen.getByText('device 2').closest('fieldset')!
    fireEvent.change(within(second).getByRole('textbox', { name: 'Power' }), { target: { value: '50' } })
    expect(await screen.findByText('device 3')).toBeTruthy()
    await waitFor(() => expect(resultOf('All together')).toBe('150\u00a0W'))
  })

  it('is filled in from a check, a piece and a setup, and stands at an address of its own', async () => {
    const setup =
      'tank.volumeL=75&tank.chambers.0.lengthMm=100&tank.chambers.0.widthMm=120&tank.chambers.0.waterDepthMm=300'
    const { address } = renderApp(
      `/worksheets/rod-in-chamber?${setup}&from=heater.space&piece=${heater.slug}`,
      server,
      { system: 'metric' },
    )
    await screen.findByRole('heading', { level: 1, name: 'A rod in a chamber' })
    expect(resultOf('Position')).toBe('stands upright')
    expect(screen.getByRole<HTMLInputElement>('textbox', { name: 'Length' }).value).toBe('250 mm')
    expect(screen.getByRole<HTMLInputElement>('textbox', { name: 'Chamber water depth' }).value).toBe('300 mm')
    expect(address()).not.toContain('from=')
    expect(address()).toContain('minImmersionMm=200%20mm')
  })

  it('offers the setup that this browser remembers', async () => {
    localStorage.setItem('stillfits.last-setup', 'tank.volumeL=75%20L')
    renderApp('/worksheets/salt-mix', server, { system: 'metric' })
    const link = await screen.findByRole('link', { name: 'Fill in from my setup' })
    expect(link.getAttribute('href')).toBe('/worksheets/salt-mix?from=setup&tank.volumeL=75%20L')
    fireEvent.click(link)
    await screen.findByText(/Still needed/)
    expect(screen.getByRole<HTMLInputElement>('textbox', { name: 'Water to mix' }).value).toMatch(/^\d+(\.\d+)? L$/)
  })

  it('lists every worksheet, and answers an unknown name with a way on', async () => {
    renderApp('/worksheets', server)
    expect(await screen.findByRole('link', { name: 'Heat balance of a tank' })).toBeTruthy()
    cleanup()
    renderApp('/worksheets/tea-leaves', server)
    expect(await screen.findByRole('heading', { name: 'Not found' })).toBeTruthy()
  })
})
