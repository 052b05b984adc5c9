import { describe, expect, it } from 'vitest'
import { findStuckOn } from '../../../shared/engine/heat-budget'
import { getRules } from '../../../shared/engine/checks/index'
import type { Piece, Setup } from '../../../shared/engine/types'
import { findSheetOf } from '../../../shared/engine/worksheets/by-check'
import { fillWorksheet } from '../../../shared/engine/worksheets/fill'
import { nestInputs } from '../../../shared/engine/worksheets/nest'
import { findWorksheet, worksheets } from '../../../shared/engine/worksheets/registry'
import { kindKeys } from '../../../shared/kinds/index'
import { createWorksheetSchema } from '../../../shared/schemas/worksheets'
import { heater, item, judge, piece, sceneFor, wholeSetup } from '../build'
import { work } from './work'

/** The worksheet of a check, filled in for a piece in a setup and worked out. */
function workOut(checkId: string, setup: Setup, what: Piece, quantity = 1) {
  const name = findSheetOf(checkId)
  const sheet = name === undefined ? undefined : findWorksheet(name)
  if (!sheet) throw new Error(`${checkId} has no worksheet`)
  const body = nestInputs(fillWorksheet(sheet, setup, { piece: what, quantity }))
  expect(createWorksheetSchema(sheet).safeParse(body).error?.issues ?? []).toEqual([])
  return work(sheet.name, body).result
}

const light = piece('light', {
  layout: 'panel',
  lengthMm: 200,
  widthMm: 120,
  ppfdUmol: 380,
  ppfdAtMm: 250,
  beamAngleDeg: 100,
  dimmable: true,
  mountsIncluded: ['arm'],
  powerW: 60,
  plugs: 1,
  volts: [120],
  plugType: 'A/B',
})

const pump = piece('return-pump', {
  lengthMm: 60,
  widthMm: 50,
  heightMm: 60,
  flowCurve: [
    { flowLph: 0, headM: 1.4 },
    { flowLph: 600, headM: 0.8 },
    { flowLph: 900, headM: 0 },
  ],
  boreMm: 13,
  dcControl: false,
  powerW: 12,
  plugs: 1,
  volts: [120],
  plugType: 'A/B',
})

const unit = piece('ro-unit', {
  stages: ['sediment', 'carbon', 'membrane', 'deionisation'],
  membraneLpd: 284,
  testPressureKPa: 345,
  testTempC: 25,
  testTdsPpm: 500,
  wasteRatio: 3,
  rejectionFraction: 0.96,
  boosterIncluded: false,
})

describe('a worksheet filled in from a check', () => {
  const setup = wholeSetup({}, { items: [item('pump', pump), item('light', light)] })

  it('has the heat that the heater’s check asks for, other gear counted', () => {
    const check = judge(setup, heater(), 'heater.power')
    const result = workOut('heater.power', setup, heater())
    expect((result['lossUpperW'] as number) - (result['gainW'] as number)).toBeCloseTo(check.limit as number, 9)
    expect(result['gainW']).toBe(12)
  })

  it('warms as fast as the heater’s caution says, with rock and sand bought by the pack', () => {
    const rock = piece('rock', { packKg: 10, form: 'base', state: 'dry' })
    const sand = piece('sand', { packKg: 9, mineral: 'aragonite', grainMinMm: 0.5, grainMaxMm: 1 })
    const { sandDepthMm: _, ...goals } = setup.goals ?? {}
    const filled: Setup = { ...setup, goals, items: [...setup.items, item('rock', rock), item('sand', sand)] }
    const hoursOf = (one: Setup) => findStuckOn(sceneFor(one, 'heater'), 100).hoursTo30C ?? 0
    const result = workOut('heater.not-too-strong', filled, heater())
    // Less water warms sooner, and the sheet must have the same water.
    expect(hoursOf(filled)).toBeLessThan(hoursOf({ ...setup, goals }))
    expect(result['hoursTo30C']).toBeCloseTo(hoursOf(filled), 6)
    expect(result['stuckOnC']).toBeCloseTo(findStuckOn(sceneFor(filled, 'heater'), 100).equilibriumC, 6)
  })

  it('has the margin of the rod in its chamber', () => {
    for (const lengthMm of [245, 320, 360, 420]) {
      const check = judge(setup, heater({ lengthMm }), 'heater.space')
      const result = workOut('heater.space', setup, heater({ lengthMm }))
      expect(result['slackMm'], String(lengthMm)).toBeCloseTo((check.limit as number) - (check.measured as number), 6)
      expect(result['position'] === 'none').toBe(check.outcome !== 'pass')
    }
  })

  it('has the coverage of the light, for one and for two', () => {
    for (const quantity of [1, 2]) {
      const check = judge(setup, light, 'light.coverage', { quantity })
      expect(workOut('light.coverage', setup, light, quantity)['coverage']).toBeCloseTo(check.measured as number, 9)
    }
  })

  it('has the turnover of the pump', () => {
    const check = judge(setup, pump, 'return-pump.flow')
    expect(workOut('return-pump.flow', setup, pump)['turnoverPerHour']).toBeCloseTo(check.measured as number, 9)
  })

  it('has the output of the membrane at this tap, with a booster pump where there is one', () => {
    const booster = piece('booster-pump', { outletKPa: 550, inletMinKPa: 100, maxLpd: 2000 })
    for (const items of [[], [item('booster', booster)]]) {
      const at = { ...setup, items }
      const check = judge(at, unit, 'ro-unit.output')
      expect(workOut('ro-unit.output', at, unit)['litresPerDay']).toBeCloseTo(check.measured as number, 9)
    }
  })

  it('has the mass of sand, the packs of salt and the weight on a stand', () => {
    const sand = piece('sand', { packKg: 9, bulkDensityKgL: 1.4, mineral: 'aragonite', grainMinMm: 0.5, grainMaxMm: 1 })
    expect(workOut('sand.amount', setup, sand)['massKg']).toBeCloseTo(
      judge(setup, sand, 'sand.amount').measured as number,
      9,
    )
    const salt = piece('salt-mix', { makesL: 60, packKg: 2 })
    expect(workOut('salt-mix.amount', setup, salt)['packs']).toBe(judge(setup, salt, 'salt-mix.amount').measured)
    const stand = piece('stand', { topLengthMm: 640, topWidthMm: 430, loadRatingKg: 200, massKg: 20 })
    expect(workOut('stand.load', setup, stand)['totalKg']).toBeCloseTo(
      judge(setup, stand, 'stand.load').measured as number,
      6,
    )
  })

  it('has the watts and the limit of the strip', () => {
    const strip = piece('power-strip', { outlets: 6, ratedA: 10, ratedV: 125, volts: [120], plugType: 'A/B', plugs: 1 })
    const check = judge(setup, strip, 'power-strip.load')
    expect(workOut('power-strip.load', setup, strip)).toMatchObject({ watts: check.measured, limitW: check.limit })
  })
})

describe('the map from checks to worksheets', () => {
  const ids = new Set(kindKeys.flatMap((kind) => getRules(kind).rules.map(({ id }) => id)))

  it('names checks and worksheets that there are', () => {
    const known = [...ids].filter((id) => findSheetOf(id) !== undefined)
    expect(known.length).toBeGreaterThan(18)
    for (const id of known) expect(findWorksheet(findSheetOf(id)!), id).toBeDefined()
    expect(new Set(known.map((id) => findSheetOf(id)))).toEqual(new Set(worksheets.map(({ name }) => name)))
  })

  it('has none for a check that is no calculation', () => {
    expect(findSheetOf('heater.mains')).toBeUndefined()
    expect(findSheetOf('constructor')).toBeUndefined()
  })
})

describe('a worksheet filled in from a setup alone', () => {
  it('takes what the setup tells, for every worksheet', () => {
    const setup = wholeSetup({}, { items: [item('heater', heater()), item('light', light), item('pump', pump)] })
    for (const sheet of worksheets) {
      const filled = fillWorksheet(sheet, setup)
      expect(Object.values(filled).filter((value) => value !== undefined).length, sheet.name).toBeGreaterThan(0)
    }
    expect(fillWorksheet(findWorksheet('heat-balance')!, setup)).toMatchObject({
      'tank.outerLengthMm': 620,
      'room.coldestC': 18,
      'goals.temperatureC': 25,
      heaterW: 100,
      inTankW: 12,
    })
    expect(fillWorksheet(findWorksheet('rod-in-chamber')!, setup)).toMatchObject({
      lengthMm: 245,
      'chamber.waterDepthMm': 330,
    })
  })
})
