import { describe, expect, it } from 'vitest'
import { drawPacking } from '#shared/engine/drawings/packing'
import { heater, item, piece, wholeSetup } from '../build'

const pump = (lengthMm: number, widthMm: number, heightMm?: number) =>
  piece('return-pump', { lengthMm, widthMm, heightMm })

const rear = (setup: ReturnType<typeof wholeSetup>) => drawPacking(setup).chambers[0]!

// The one chamber is 120 × 100 mm with 330 mm of water; bodies keep 5 mm and rods 10 mm to walls and to each other,
// so the corners below are sums done by hand.
describe('what stands in a chamber, drawn', () => {
  it('shows an empty chamber', () => {
    expect(rear(wholeSetup())).toEqual({
      id: 'rear',
      name: 'rear chamber',
      lengthMm: 120,
      widthMm: 100,
      waterDepthMm: 330,
      outcome: 'fits',
      pieces: [],
      unsized: [],
    })
  })

  it('stands a pump and a rod side by side, each as far from the other as the rod asks', () => {
    const items = [item('pump', pump(60, 50, 70)), item('rod', heater({ lengthMm: 245, diameterMm: 23 }))]
    const { outcome, pieces } = rear(wholeSetup({}, { items }))
    expect(outcome).toBe('fits')
    expect(pieces).toEqual([
      { itemId: 'pump', xMm: 10, yMm: 10, lengthMm: 60, widthMm: 50, heightMm: 70, isRod: false },
      { itemId: 'rod', xMm: 80, yMm: 10, lengthMm: 23, widthMm: 23, heightMm: 245, isRod: true },
    ])
  })

  it('lines up what has no room together, past the wall', () => {
    const items = [item('one', pump(70, 60)), item('two', pump(70, 60))].map((one) => ({
      ...one,
      place: { chamber: 'rear' },
    }))
    const { outcome, pieces } = rear(wholeSetup({}, { items }))
    expect(outcome).toBe('no')
    expect(pieces.map(({ xMm }) => xMm)).toEqual([5, 80])
  })

  it('lays a rod down as far as it was judged to lean: its run at 30° is 245 cos 30° + 23 sin 30°', () => {
    const items = [item('rod', heater({ lengthMm: 245, diameterMm: 23 }))]
    const placements = new Map([['rod', { chamber: 'display', position: 'leaning' as const, angleDeg: 30 }]])
    const display = drawPacking(wholeSetup({}, { items }), placements).chambers.find(({ id }) => id === 'display')!
    expect(display.pieces[0]!.lengthMm).toBeCloseTo(245 * Math.cos(Math.PI / 6) + 11.5, 9)
    expect(display.pieces[0]!.heightMm).toBeCloseTo(122.5 + 23 * Math.cos(Math.PI / 6), 9)
  })

  it('names what has no recorded size, and leaves out what is gone', () => {
    const items = [item('bare', piece('return-pump', {})), item('gone', pump(60, 50), { state: 'gone' })]
    expect(rear(wholeSetup({}, { items }))).toMatchObject({ pieces: [], unsized: ['bare'] })
  })
})
