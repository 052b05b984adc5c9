import { describe, expect, it } from 'vitest'
import { expectWithin, expectWithinShare } from '../../standards/within'
import { fittingsK, roughFrictionFactor } from '../../../shared/engine/physics/flow'
import { refusals, result, stepValue, work } from './work'

describe('the worksheet of a rod in a chamber', () => {
  const chamber = { lengthMm: 600, widthMm: 400, waterDepthMm: 350 }
  const free = { diameterMm: 30, chamber, clearanceMm: 0, orientation: 'any' }

  it('leans a rod of 750 mm in a box of 600 × 400 × 350 mm, and none of 760 mm', () => {
    // Carver 1957: the longest strip 30 mm wide in 600 × 400 is 693.726 mm; in 693.726 × 350 a rod of 750 fits, 760 not.
    expect(work('rod-in-chamber', { ...free, lengthMm: 750 }).result).toMatchObject({ position: 'leaning' })
    expect(work('rod-in-chamber', { ...free, lengthMm: 760 }).result).toMatchObject({
      position: 'none',
      angleDeg: null,
    })
    expectWithin(stepValue('rod-in-chamber', { ...free, lengthMm: 750 }, 'Leaning: longest run in plan'), 693.726, 1e-3)
  })

  it('stands where the water is deep enough, to a tenth of a millimetre', () => {
    const body = {
      diameterMm: 24,
      chamber: { lengthMm: 100, widthMm: 120, waterDepthMm: 300 },
      orientation: 'vertical',
    }
    expect(work('rod-in-chamber', { ...body, lengthMm: 300 }).result).toEqual({
      position: 'upright',
      angleDeg: 90,
      slackMm: 0,
    })
    expect(work('rod-in-chamber', { ...body, lengthMm: 300.1 }).result).toMatchObject({ position: 'none' })
    expectWithin(result('rod-in-chamber', { ...body, lengthMm: 310 }, 'slackMm'), -10, 1e-9)
  })

  it('counts only the length that must be under water, and the height above it', () => {
    const body = {
      lengthMm: 340,
      minImmersionMm: 250,
      diameterMm: 24,
      orientation: 'vertical',
      chamber: { lengthMm: 100, widthMm: 120, waterDepthMm: 300 },
    }
    expect(work('rod-in-chamber', body).result).toMatchObject({ position: 'upright' })
    const low = { ...body, chamber: { ...body.chamber, heightMm: 330 } }
    expect(work('rod-in-chamber', low).result).toMatchObject({ position: 'none', slackMm: -10 })
  })

  it('refuses more of the rod under water than there is of the rod', () => {
    const body = { lengthMm: 250, diameterMm: 24, chamber: { lengthMm: 100, widthMm: 120, waterDepthMm: 300 } }
    expect(refusals('rod-in-chamber', { ...body, minImmersionMm: 251 })).toEqual(['minImmersionMm'])
    expect(refusals('rod-in-chamber', { ...body, minImmersionMm: 250 })).toEqual([])
  })

  it('keeps the clearance that was asked for', () => {
    const body = {
      lengthMm: 250,
      diameterMm: 50,
      orientation: 'vertical',
      chamber: { lengthMm: 80, widthMm: 80, waterDepthMm: 300 },
    }
    expect(work('rod-in-chamber', { ...body, clearanceMm: 15 }).result).toMatchObject({
      position: 'upright',
      slackMm: 0,
    })
    expect(work('rod-in-chamber', { ...body, clearanceMm: 16 }).result).toMatchObject({ position: 'none', slackMm: -2 })
    // Common practice: 10 mm where nobody said.
    expect(work('rod-in-chamber', body).assumptions).toContainEqual(
      expect.objectContaining({ key: 'clearanceMm', value: 10 }),
    )
  })

  it('lays a rod flat where it may only lie', () => {
    const body = {
      lengthMm: 200,
      diameterMm: 30,
      orientation: 'horizontal',
      chamber: { lengthMm: 220, widthMm: 60, waterDepthMm: 100 },
    }
    expect(work('rod-in-chamber', body).result).toEqual({
      position: 'flat',
      angleDeg: 0,
      slackMm: expect.closeTo(0, 6),
    })
    expect(work('rod-in-chamber', { ...body, lengthMm: 260 }).result).toMatchObject({ position: 'none' })
  })
})

describe('the worksheet of a pump', () => {
  const wide = { boreMm: 100, pipeLengthM: 0, fittings: { elbows90: 0, elbows45: 0 } }
  const flowCurve = [
    { flowLph: 0, headM: 4 },
    { flowLph: 6000, headM: 0 },
  ]

  it('gives what the parabola gives where the pipe takes next to nothing', () => {
    // H₀(1 − (Q/Qm)²) = Hs: Q = Qm √(1 − Hs/H₀); entry and exit of 100 mm at this flow take 3 mm.
    const found = work('pump-point', { ...wide, flowCurve, staticHeadM: 1.2, volumeL: 1000 }).result
    expectWithinShare(found['flowLph'] as number, 6000 * Math.sqrt(1 - 1.2 / 4), 1e-3)
    expectWithinShare(found['turnoverPerHour'] as number, 6 * Math.sqrt(1 - 1.2 / 4), 1e-3)
  })

  it('loses 0.635 m in 3 m of 25 mm pipe at 4000 L/h', () => {
    // Worked loop by hand: sea water at 25 °C, v 2.2635 m/s, Re 60 400, f 0.02024, ε 0.0015 mm; entry and exit 1.5 v²/2g.
    const headM = 1.2 + 0.635 + (1.5 * 2.2635 ** 2) / (2 * 9.80665)
    // As good as level, since no pump gives the same head at two flows.
    const flat = [
      { flowLph: 0, headM: headM + 1e-6 },
      { flowLph: 8000, headM: headM - 1e-6 },
    ]
    const body = {
      flowCurve: flat,
      staticHeadM: 1.2,
      boreMm: 25,
      pipeLengthM: 3,
      fittings: { elbows90: 0, elbows45: 0 },
    }
    expectWithinShare(result('pump-point', body, 'flowLph'), 4000, 2e-3)
    expectWithinShare(stepValue('pump-point', body, 'Speed in the pipe'), 2.2635, 2e-3)
    expectWithinShare(stepValue('pump-point', body, 'Friction factor'), 0.02024, 5e-3)
  })

  it('counts 30 f_T for an elbow of 90° and 16 f_T for one of 45°', () => {
    // Flow of Fluids, TP-410M.
    const rough = roughFrictionFactor(0.0015 / 25)
    expectWithinShare(fittingsK(0, 25, undefined, 2) - fittingsK(0, 25), 32 * rough, 1e-9)
    expectWithinShare(fittingsK(1, 25) - fittingsK(0, 25), 30 * rough, 1e-9)
  })

  it('gives nothing where the lift is too high, and says so', () => {
    const found = work('pump-point', { ...wide, flowCurve, staticHeadM: 5 })
    expect(found.result).toMatchObject({ flowLph: 0, turnoverPerHour: null })
    expect(found.cautions[0]).toMatch(/nothing arrives/)
  })

  it('takes two elbows where nobody counted, and refuses a curve of one flow', () => {
    const { fittings: _, ...bare } = wide
    const found = work('pump-point', { ...bare, flowCurve, staticHeadM: 1 })
    expect(found.assumptions).toEqual([expect.objectContaining({ key: 'fittings.elbows90', value: 2 })])
    const slanted = work('pump-point', { ...bare, fittings: { elbows45: 1 }, flowCurve, staticHeadM: 1 })
    expect(slanted.assumptions).toEqual(found.assumptions)
    const same = [flowCurve[0], flowCurve[0]]
    expect(refusals('pump-point', { ...wide, flowCurve: same, staticHeadM: 1 })).toEqual(['flowCurve.1.headM'])
  })

  it('refuses a curve that rises with the flow, by the point that does', () => {
    const rising = [...flowCurve, { flowLph: 8000, headM: 5 }]
    expect(refusals('pump-point', { ...wide, flowCurve: rising, staticHeadM: 1 })).toEqual(['flowCurve.2.flowLph'])
  })
})

describe('the worksheet of a light', () => {
  const tank = { outerLengthMm: 620, outerWidthMm: 420, outerHeightMm: 420, wallMm: 10, waterLineMm: 400 }
  const point = { layout: 'point', lengthMm: 100, ppfdUmol: 500, ppfdAtMm: 300, beamAngleDeg: 90 }
  const body = { tank, light: point, mountHeightMm: 250, depthMm: 200, coral: ['soft'] }

  it('reads on its axis what inverse squares through the surface and the water leave', () => {
    // ppfd (d_ref/(h + z/n))² × 0.979 × exp(−0.14 z): n = 1.34, Fresnel at normal incidence, Pope & Fry 1997. The nearest
    // cells are 4 mm off the axis.
    const onAxis = 500 * (300 / (250 + 200 / 1.34)) ** 2 * 0.979 * Math.exp(-0.14 * 0.2)
    expectWithinShare(result('light-map', body, 'maxUmol'), onAxis, 2e-3)
  })

  it('has the order of a beam of 90° and of 120°', () => {
    // m = −ln 2/ln cos θ½: 2 and 1 exactly.
    expectWithin(stepValue('light-map', body, 'Order of the beam'), 2, 1e-9)
    const wide = { ...body, light: { ...point, beamAngleDeg: 120 } }
    expectWithin(stepValue('light-map', wide, 'Order of the beam'), 1, 1e-9)
  })

  it('misses the water with what a wide beam sends past it, and never more than everything', () => {
    // cos³θ over a square of infinite size catches all; from far away nearly nothing is caught.
    expectWithin(result('light-map', { ...body, mountHeightMm: 10 }, 'spill'), 0, 2e-2)
    expect(result('light-map', { ...body, mountHeightMm: 3000 }, 'spill')).toBeGreaterThan(0.9)
  })

  it('shares the plane out by the grid that it gives', () => {
    const found = work('light-map', body).result
    const { cells, columns, rows } = found['grid'] as { cells: number[]; columns: number; rows: number }
    expect(cells).toHaveLength(columns * rows)
    // Common practice: soft and large-polyp corals are kept under 50 to 150 µmol/m²/s.
    expect(found['band']).toEqual([50, 150])
    const dimmed = cells.map((cell) => cell * (found['dimming'] as number))
    const inside = dimmed.filter((cell) => cell >= 50 && cell <= 150).length / cells.length
    expectWithin(found['coverage'] as number, inside, 1e-9)
    expectWithinShare(found['meanUmol'] as number, cells.reduce((sum, cell) => sum + cell, 0) / cells.length, 1e-12)
  })

  it('runs at full power where it cannot be dimmed, and has no band for fish only', () => {
    expect(result('light-map', { ...body, light: { ...point, dimmable: false } }, 'dimming')).toBe(1)
    expect(work('light-map', { ...body, coral: [] }).result).toMatchObject({
      band: null,
      coverage: null,
      dimming: null,
    })
  })

  it('names what the light lacks, and a plane below the floor', () => {
    const { ppfdUmol: _, ...dark } = point
    expect(refusals('light-map', { ...body, light: dark })).toEqual(['light.ppfdUmol'])
    expect(refusals('light-map', { ...body, light: { ...point, layout: 'panel' } })).toEqual(['light.widthMm'])
    expect(refusals('light-map', { ...body, depthMm: 500 })).toEqual(['depthMm'])
  })
})
