import { describe, expect, it } from 'vitest'
import { fit, fitCheck } from '#shared/engine/fit'
import { giveValue } from '#shared/engine/setup/give'
import type { Piece, Setup } from '#shared/engine/types'
import { checkOf, heater, item, piece, toPlain, wholeSetup } from '../build'

const turnOf = (setup: Setup, what: Piece) => fitCheck(setup, what).turnsBy
const sayTurn = (setup: Setup, what: Piece) => toPlain(turnOf(setup, what)?.message)

describe('what would make a heater fit', () => {
  it('is deeper water in the chamber for a rod that may only stand', () => {
    // A standing rod needs its whole length under water where its maker says no less: 345 mm in 330 mm.
    const rod = heater({ lengthMm: 345, orientation: 'vertical' })
    expect(turnOf(wholeSetup(), rod)).toEqual({
      path: 'tank.chambers.0.waterDepthMm',
      from: 330,
      to: 345,
      unit: 'mm',
      verdict: 'fits',
      message: 'It would fit if the water in the rear chamber were 15\u00a0mm deeper.',
    })
  })

  it('is a wider chamber for a rod that is too thick for it', () => {
    // 85 mm and 10 mm of water to each side take 105 mm, and the chamber is 100 mm wide.
    const rod = heater({ diameterMm: 85, orientation: 'vertical', minImmersionMm: 200 })
    expect(sayTurn(wholeSetup(), rod)).toBe('It would fit if the rear chamber were 5 mm wider.')
  })

  it('is said in tenths of an inch to whoever measures in inches', () => {
    const rod = heater({ lengthMm: 345, orientation: 'vertical' })
    const turn = turnOf(wholeSetup({}, { units: 'us' }), rod)
    // 15 mm is 0.59 in, so that 0.6 in is the first tenth that is enough: 330 mm + 15.24 mm.
    expect(toPlain(turn?.message)).toBe('It would fit if the water in the rear chamber were 0.6 in deeper.')
    expect(turn?.to).toBeCloseTo(345.24, 6)
  })

  it('is a warmer room for one that is too weak, and never a colder one for one that is too strong', () => {
    const room = {
      temperatureC: 21,
      coldestC: 12,
      warmestC: 28,
      relativeHumidity: 0.5,
      ceilingMm: 2400,
      tankTopMm: 1150,
    }
    const turn = turnOf(wholeSetup({}, { room }), heater({ powerW: 50 }))
    expect(turn?.message).toMatch(/^It would fit (with changes )?if (the room never fell below|the water were kept at)/)
    expect(turnOf(wholeSetup(), heater({ powerW: 900 }))?.path).not.toBe('room.coldestC')
  })

  it('is cooler water for one that is too weak, never colder than the 23 °C that corals are kept at (common practice)', () => {
    const { room, goals } = wholeSetup()
    const cold = wholeSetup({}, { room: { ...room, coldestC: 10 }, goals: { ...goals, temperatureC: 27 } })
    const waters = [40, 45, 50, 55, 60, 65].flatMap((powerW) => {
      const turn = turnOf(cold, heater({ powerW }))
      return turn?.path === 'goals.temperatureC' ? [turn.to] : []
    })
    expect(waters.length).toBeGreaterThan(1)
    for (const waterC of waters) {
      expect(waterC).toBeGreaterThanOrEqual(23)
      expect(waterC).toBeLessThan(27)
    }
  })

  it('is never warmer water for one that is too strong', () => {
    for (const powerW of [220, 240, 260, 280, 300, 400]) {
      const { verdict, turnsBy } = fitCheck(wholeSetup(), heater({ powerW }))
      expect(verdict).toBe('no')
      expect(turnsBy?.path).not.toBe('goals.temperatureC')
    }
  })

  it('is nothing where two things are wrong that no one number turns', () => {
    expect(turnOf(wholeSetup(), heater({ lengthMm: 345, orientation: 'vertical', volts: [230] }))).toBeUndefined()
    expect(turnOf(wholeSetup(), heater({ madeFor: ['freshwater'] }))).toBeUndefined()
  })

  it('is not offered where it contradicts the rest: no chamber is deeper than its tank', () => {
    expect(turnOf(wholeSetup(), heater({ lengthMm: 600, orientation: 'vertical' }))).toBeUndefined()
  })

  it('is not offered for what fits', () => {
    expect(turnOf(wholeSetup(), heater())).toBeUndefined()
  })
})

describe('what would make another piece fit', () => {
  it('is a stand rated for more under a tank that is too heavy', () => {
    const stand = piece('stand', { topLengthMm: 900, topWidthMm: 500, loadRatingKg: 60 })
    const setup = wholeSetup({}, { items: [item('stand', stand)] })
    const same = { outerLengthMm: 620, outerWidthMm: 420, outerHeightMm: 400, wallMm: 10, bottomMm: 10 }
    const rest = { material: 'glass', shape: 'rectangle', filtration: 'rear-chambers', waterLineMm: 350 }
    const what = piece('tank', { ...same, ...rest, includedPump: { flowLph: 600 } })
    const turn = turnOf(setup, what)
    expect(turn?.path).toBe('items.stand.specs.loadRatingKg')
    expect(turn?.message).toMatch(/^It would fit if the stand’s load rating were at least \d+.kg\.$/)
    const weight = fitCheck(setup, what).checks.find(({ id }) => id === 'tank.support-load')?.measured as number
    expect(turn?.to).toBe(Math.ceil(weight))
  })

  it('is furniture as long as the tank', () => {
    const setup = wholeSetup({}, { support: { kind: 'furniture', lengthMm: 600, widthMm: 500 } })
    const what = piece('tank', {
      outerLengthMm: 625,
      outerWidthMm: 420,
      outerHeightMm: 400,
      wallMm: 10,
      bottomMm: 10,
      material: 'glass',
      waterLineMm: 350,
      filtration: 'rear-chambers',
      includedPump: { flowLph: 600 },
    })
    expect(sayTurn(setup, what)).toBe('It would fit if the furniture were 25 mm longer.')
  })

  it('is a heater that takes less behind a controller that switches too little', () => {
    const setup = wholeSetup({}, { items: [item('rod', heater({ powerW: 300 }))] })
    const what = piece('temperature-controller', {
      maxLoadW: 250,
      outlets: 1,
      rangeMinC: 20,
      rangeMaxC: 32,
      volts: [120],
      plugType: 'A/B',
      plugs: 1,
    })
    expect(sayTurn(setup, what)).toMatch(/^It would fit( with changes)? if the heater’s power were at most 250 W\.$/)
  })

  it('is not another piece’s own size or mass: that is another piece', () => {
    const lamp = piece('light', { mountsIncluded: [], mountsPossible: ['arm'], massKg: 2 })
    const arm = piece('light-mount', { type: 'arm', maxLoadKg: 1, rimMinMm: 4, rimMaxMm: 12 })
    const mounted = wholeSetup({}, { items: [item('lamp', lamp)] })
    const load = checkOf(fitCheck(mounted, arm), 'light-mount.load')
    expect(load).toMatchObject({ outcome: 'fail', limit: 2 })
    expect(turnOf(mounted, arm)).toBeUndefined()
    const stand = piece('stand', { topLengthMm: 600, topWidthMm: 500, loadRatingKg: 400 })
    const tank = { outerLengthMm: 625, outerWidthMm: 420, outerHeightMm: 400, wallMm: 10, bottomMm: 10 }
    const rest = { material: 'glass', waterLineMm: 350, filtration: 'rear-chambers', includedPump: { flowLph: 600 } }
    expect(
      turnOf(wholeSetup({}, { items: [item('stand', stand)] }), piece('tank', { ...tank, ...rest })),
    ).toBeUndefined()
  })

  it('is shallower water for a skimmer that works in less', () => {
    const what = piece('skimmer', {
      lengthMm: 80,
      widthMm: 70,
      heightMm: 380,
      waterDepthMinMm: 200,
      waterDepthMaxMm: 220,
      ratedVolumeL: 200,
      volts: [120],
      plugType: 'A/B',
      plugs: 1,
      powerW: 8,
    })
    expect(sayTurn(wholeSetup(), what)).toBe('It would fit if the water in the rear chamber were 110 mm shallower.')
  })

  it('is a free outlet for what needs nothing but that', () => {
    const mains = { volts: 120, circuitA: 15, plugType: 'A/B', outlets: 0, residualCurrentProtected: true } as const
    expect(sayTurn(wholeSetup({}, { mains }), heater())).toBe('It would fit as it is if 1 wall outlet were free.')
  })

  it('comes with the answers of a page as with a piece by itself', () => {
    const rods = [345, 350, 360].map((lengthMm) => heater({ lengthMm, orientation: 'vertical' }, `rod-${lengthMm}`))
    const { answers } = fit(wholeSetup(), 'heater', rods, { limit: 10, offset: 0 })
    expect(answers.map(({ turnsBy }) => turnsBy?.to)).toEqual([345, 350, 360])
  })

  it('turns the verdict in the changed setup, and one millimetre less does not', () => {
    const rod = heater({ lengthMm: 345, orientation: 'vertical' })
    const said = (mm: number) => fitCheck(giveValue(wholeSetup(), 'tank.chambers.0.waterDepthMm', mm), rod).verdict
    expect([said(345), said(344)]).toEqual(['fits', 'no'])
  })
})
