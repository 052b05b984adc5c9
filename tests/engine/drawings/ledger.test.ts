import { describe, expect, it } from 'vitest'
import { drawLedger } from '#shared/engine/drawings/ledger'
import { report } from '#shared/engine/report'
import { heater, item, piece, wholeSetup } from '../build'

const strip = piece('power-strip', { outlets: 8, ratedA: 15, plugs: 1, volts: [120] })
const controller = piece('temperature-controller', { outlets: 1, maxLoadW: 500, plugs: 1, powerW: 2 })
const items = [
  item('rods', heater({ powerW: 100, plugs: 1 }), { quantity: 2 }),
  item('controller', controller),
  item('lamp', piece('light', { powerW: 60 })),
  item('strip', strip),
  item('net', piece('net', {})),
]

describe('the ledger of plugs and watts', () => {
  it('counts each piece as often as it is there, and the plugs that sit in a controller apart', () => {
    const { rows } = drawLedger(wholeSetup({}, { items }))
    expect(rows).toEqual([
      { itemId: 'rods', quantity: 2, plugs: 2, watts: 200, onController: 1 },
      { itemId: 'controller', quantity: 1, plugs: 1, watts: 2, onController: 0 },
      { itemId: 'lamp', quantity: 1, plugs: null, watts: 60, onController: 0 },
    ])
  })

  it('adds up to what the report says', () => {
    const setup = wholeSetup({}, { items })
    const { plugs, outlets, watts, continuousW, rows } = drawLedger(setup)
    const { budgets } = report(setup)
    expect([plugs, outlets]).toEqual([budgets.plugs!.used, budgets.plugs!.limit])
    expect([watts, continuousW]).toEqual([budgets.powerW!.used, budgets.powerW!.limit])
    expect(rows.reduce((sum, row) => sum + (row.watts ?? 0), 0)).toBe(watts)
    // Four fifths of 15 A at 120 V: NEC 210.20(A), continuous loads.
    expect(continuousW).toBeCloseTo(0.8 * 15 * 120, 9)
  })

  it('lists a pump that came with the tank until another takes its place', () => {
    const tank = { includedPump: { powerW: 12, plugs: 1 } }
    expect(drawLedger(wholeSetup(tank)).rows).toEqual([
      { itemId: 'tank', quantity: 1, plugs: 1, watts: 12, onController: 0 },
    ])
    const own = [item('pump', piece('return-pump', { powerW: 20, plugs: 1 }))]
    expect(drawLedger(wholeSetup(tank, { items: own })).rows.map(({ itemId }) => itemId)).toEqual(['pump'])
  })
})
