import { act, fireEvent, screen, waitFor, within } from '@testing-library/react'
import { describe, expect, it } from 'vitest'
import { report } from '#shared/engine/report'
import type { Item } from '#shared/engine/types'
// Imported here, so that no test waits for a page to be compiled when its route first asks for it.
import '../../../src/app/routes/setup-link'
import { toEngineSetup } from '../../../src/components/setup/to-engine-setup'
import type { ApiInit } from '../../../src/lib/api-client'
import { inventedHeaters, renderApp } from '../support/render-app'

interface Sent {
  readonly setup: {
    readonly items?: readonly { readonly id: string; readonly gear?: string; readonly state?: string }[]
  }
}

const json = (status: number, body: unknown) =>
  new Response(JSON.stringify(body), { status, headers: { 'Content-Type': 'application/json' } })

/** Answers as the server does, from the engine itself and a catalogue of three heaters. */
const server = {
  fetch: (path: string, init: ApiInit = {}) => {
    if (path.startsWith('/api/v1/gear/'))
      return Promise.resolve(json(404, { type: 't', title: 'Not here', status: 404, detail: 'Not here.' }))
    const { setup } = JSON.parse(init.body ?? '{}') as Sent
    const items = (setup.items ?? []).flatMap(({ id, gear, state }): Item[] => {
      const piece = inventedHeaters.find((one) => one.gear?.slug === gear)
      return piece ? [{ id, piece, quantity: 1, state: state === 'gone' ? 'gone' : 'have' }] : []
    })
    return Promise.resolve(json(200, report(toEngineSetup(setup as never, undefined, items))))
  },
}

const address =
  '/setups/link?tank.volumeL=20%20gal&tank.chambers.0.id=rear-1&tank.chambers.0.lengthMm=4%20in&tank.chambers.0.widthMm=5%20in&tank.chambers.0.waterDepthMm=12%20in&room.coldestC=65%20%C2%B0F&items.heater.kind=heater&items.heater.gear=invented-short-100'

const section = (title: string) => screen.getByRole('heading', { name: title }).closest('section')!

describe('the report on a setup', () => {
  it('says in a sentence how it stands, and names what is missing', async () => {
    renderApp(address, server)
    await screen.findByText(/\d essentials are missing/)
    expect(within(section('What is missing')).getByText(/Nothing measures salinity/)).toBeDefined()
    expect(screen.getByText('Invented · Short 100', { selector: 'a' })).toBeDefined()
  })

  it('confirms an assumption in the link alone', async () => {
    const view = renderApp(address, server)
    await screen.findByText(/essentials are missing/)
    const link = document.querySelector('[aria-label^="That is right: humidity"]')!
    fireEvent.click(link)
    await waitFor(() => expect(view.address()).toContain('room.relativeHumidity=50%25'))
    await waitFor(() => expect(document.querySelector('[aria-label^="That is right: humidity"]')).toBeNull())
  })

  it('counts a piece that is gone for nothing, and offers what replaces it', async () => {
    renderApp(`${address}&items.heater.state=gone`, server)
    await screen.findByText('What replaces it?')
    expect(within(section('What is missing')).getByText(/There is no heater/)).toBeDefined()
  })

  it('shows the form with what is wrong, and all that was typed, where it cannot be judged', async () => {
    renderApp('/setups/link?tank.volumeL=soon&room.coldestC=65%20%C2%B0F', server)
    const summary = await screen.findByRole('alert')
    expect(summary.textContent).toMatch(/Tank volume: .*soon/)
    expect(document.querySelector<HTMLInputElement>('[name="tank.volumeL"]')!.value).toBe('soon')
    expect(document.querySelector<HTMLInputElement>('[name="room.coldestC"]')!.value).toBe('65 °F')
  })

  it('asks for the tank where nothing is said of it', async () => {
    renderApp('/setups/link', server)
    expect((await screen.findByRole('alert')).textContent).toContain('say its volume')
  })

  it('speaks in the other units at once when they are switched', async () => {
    const { app } = renderApp(address, server)
    await screen.findByText(/essentials are missing/)
    act(() => app.preferences.set({ system: 'metric' }))
    await waitFor(() => expect(within(section('The tank')).getByText(/75\.7 L/)).toBeDefined())
  })
})
