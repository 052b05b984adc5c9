import { describe, expect, it } from 'vitest'
import { replaceItem } from '../../../src/components/setup/items-raw'
import { spellBare } from '../../../src/components/setup/spell-bare'
import { applyUndo, readUndo, writeUndo } from '../../../src/components/setup/undo'
import { writePutInHref } from '../../../src/features/swap/model/put-in'
import { createPrinter } from '#shared/units/print'

const raw = {
  'tank.gear': 'some-tank',
  'tank.chambers.0.lengthMm': '4 in',
  'items.heater.kind': 'heater',
  'items.heater.gear': 'old',
  'items.heater.state': 'gone',
  'items.heater.place': 'rear',
  'items.net.kind': 'net',
  'items.net.place': 'outside',
}

const gear = (slug: string) => ({ slug, brand: 'Invented', model: slug })

describe('a piece put in the place of another', () => {
  it('stands where that one stood, and is yet to be bought', () => {
    expect(replaceItem(raw, 'heater', 'heater', 'new', 2)).toEqual({
      'tank.gear': 'some-tank',
      'tank.chambers.0.lengthMm': '4 in',
      'items.heater.kind': 'heater',
      'items.heater.gear': 'new',
      'items.heater.quantity': '2',
      'items.heater.state': 'planned',
      'items.heater.place': 'rear',
      'items.net.kind': 'net',
      'items.net.place': 'outside',
    })
  })

  it('takes the chambers of a tank away with it, and with them what was said to stand in them', () => {
    const next = replaceItem(raw, 'tank', 'tank', 'other-tank', 1)
    expect(Object.keys(next).filter((path) => path.startsWith('tank.'))).toEqual(['tank.gear'])
    expect(next['tank.gear']).toBe('other-tank')
    expect(next['items.heater.place']).toBeUndefined()
    expect(next['items.net.place']).toBe('outside')
  })

  it('brings what it needs besides, and all of it can be undone', () => {
    const href = writePutInHref(
      raw,
      {
        itemId: 'heater',
        answer: { kind: 'heater', pieces: [{ gear: gear('new'), quantity: 1 }] },
        extras: [{ need: 'temperature-control', pieces: [{ gear: gear('switch'), quantity: 1 }] }],
      },
      'us',
    )!
    const params = new URLSearchParams(href.split('?')[1])
    expect(params.get('items.heater.gear')).toBe('new')
    expect(params.get('items.temperature-control.gear')).toBe('switch')
    expect(params.get('items.temperature-control.state')).toBe('planned')
    const undo = readUndo(params.get('undo'))!
    params.delete('undo')
    expect(applyUndo(Object.fromEntries(params), undo)).toEqual({
      ...raw,
      // A chamber without a name of its own is called by its place.
      'tank.chambers.0.id': 'rear-1',
    })
  })

  it('gives a tank its chambers again, and what stood in them its place', () => {
    const swapped = replaceItem(raw, 'tank', 'tank', 'other-tank', 1)
    expect(applyUndo(swapped, readUndo(writeUndo(raw, 'tank')!)!)).toEqual(raw)
  })

  it('undoes nothing where the address is not what it wrote', () => {
    expect(readUndo(null)).toBeNull()
    expect(readUndo('heater')).toBeNull()
    expect(readUndo('heater~tank.gear=x')).toBeNull()
    expect(readUndo(`heater~${'x'.repeat(4000)}`)).toBeNull()
    expect(writeUndo({ 'items.a.gear': 'x'.repeat(4000) }, 'a')).toBeUndefined()
  })
})

describe('bare numbers on their way into a form', () => {
  it('get the unit that they are in, so that the form does not take them for another: 75.7 L is 19.998 gal', () => {
    // The US gallon is 3.785411784 L (NIST SP 811 B.8).
    const spelt = spellBare(
      { 'tank.volumeL': '75.7', 'mains.outlets': '3', 'items.a.quantity': '2' },
      createPrinter('us'),
    )
    expect(parseFloat(spelt['tank.volumeL']!)).toBeCloseTo(75.7 / 3.785411784, 4)
    expect(spelt['tank.volumeL']).toMatch(/ gal$/)
    expect([spelt['mains.outlets'], spelt['items.a.quantity']]).toEqual(['3', '2'])
  })

  it('leave everything else as it was typed', () => {
    const typed = { 'tank.volumeL': '20 gal', 'mains.volts': '120', name: '75' }
    expect(spellBare(typed, createPrinter('metric'))).toEqual(typed)
  })
})
