import { describe, expect, it } from 'vitest'
import { lightPlane } from '#shared/engine/checks/light-plane'
import { expectWithin, expectWithinShare } from '../standards/within'
import { item, judge, piece, sceneFor, toPlain, toSpecs, wholeSetup } from './build'

// Numbers worked out here from the published formulas, without the engine's own functions. The tank: inside 600 × 400 mm,
// 350 mm of water (84 L), display 600 × 290 mm; a rear chamber with 330 mm of water.

/** The largest x of a fine scan at which `holds`, which is true below some x and false above it. */
function scan(holds: (x: number) => boolean, to: number, step: number): number {
  let last = 0
  for (let x = 0; x <= to; x += step) if (holds(x)) last = x
  return last
}

describe('a cluster of light over the tank, worked out by hand', () => {
  const [ppfd, atM, heightM, depthM] = [400, 0.3, 0.2, 0.175]
  const lamp = piece('light', {
    layout: 'point',
    lengthMm: 60,
    widthMm: 60,
    beamAngleDeg: 90,
    ppfdUmol: ppfd,
    ppfdAtMm: 300,
    dimmable: true,
  })
  // Sea water bends light by n = 1.34 (Quan & Fry 1995, rounded); a flat surface lets 97.9 % through (Fresnel at normal
  // incidence for 1.34: 1 − 0.0211); 0.14 per metre of pure water (Pope & Fry 1997).
  const n = 1.34
  const through = 0.979 * Math.exp(-0.14 * depthM)
  // Kahn & Barry 1997 (from memory): m = −ln 2 / ln cos 45° = 2. One source: E = I₀/d² on its axis.
  const m = 2
  const axial = ppfd * atM ** 2

  const landM = (angle: number) => heightM * Math.tan(angle) + depthM * Math.tan(Math.asin(Math.sin(angle) / n))
  /** I(θ) sin θ dθ / (r dr), the slope by a central difference. */
  function under(rM: number): number {
    let [low, high] = [0, Math.PI / 2 - 1e-6]
    for (let step = 0; step < 200; step += 1) {
      const middle = (low + high) / 2
      if (landM(middle) < rM) low = middle
      else high = middle
    }
    const slope = (landM(low + 1e-6) - landM(low - 1e-6)) / 2e-6
    return (axial * Math.cos(low) ** m * Math.sin(low) * through) / (rM * slope)
  }
  // 60 × 40 cells over the display less 50 mm along each wall: 500 × 190 mm.
  const cells = Array.from({ length: 60 * 40 }, (_, index) =>
    Math.hypot((((index % 60) + 0.5) / 60 - 0.5) * 0.5, ((Math.floor(index / 60) + 0.5) / 40 - 0.5) * 0.19),
  ).map(under)

  it('is on its axis the reading by inverse square, with the water’s depth shortened by its index', () => {
    const onAxis = ppfd * (atM / (heightM + depthM / n)) ** 2 * through
    // 400 × (0.3 / 0.330597)² × 0.979 × 0.975798 = 314.66
    expectWithin(onAxis, 314.66, 0.02)
    expectWithinShare(under(1e-4), onAxis, 1e-4)
    const { measured, limit, outcome } = judge(wholeSetup(), lamp, 'light.intensity', {
      mountHeightMm: 200,
    })
    // The brightest cell lies 4.2 and 2.4 mm off the axis.
    expectWithinShare(measured as number, onAxis, 2e-3)
    expectWithinShare(measured as number, Math.max(...cells), 2e-4)
    expect({ limit, outcome }).toEqual({ limit: 50, outcome: 'pass' })
  })

  it('is off its axis what refraction leaves there', () => {
    const plane = lightPlane(sceneFor(wholeSetup(), 'light'), lamp.specs, 1, 200, [50, 150])
    const corner = under(Math.hypot(0.25 - 0.25 / 60, 0.095 - 0.095 / 40))
    expectWithinShare(plane.lowestUmol, corner, 1e-3)
    expectWithinShare(plane.meanUmol, cells.reduce((sum, cell) => sum + cell, 0) / cells.length, 1e-3)
    // Without water: I₀ cosᵐ⁺¹θ / d²; under water more of it arrives, bent towards the vertical.
    const distance2 = 0.375 ** 2 + 0.2626 ** 2
    expect(corner).toBeGreaterThan((axial * (0.375 / Math.sqrt(distance2)) ** (m + 1) * through) / distance2)
  })

  it('covers the share of cells that the best dimming brings between 50 and 150', () => {
    const share = (percent: number) =>
      cells.filter((cell) => (cell * percent) / 100 >= 50 && (cell * percent) / 100 <= 150).length / cells.length
    const best = Math.max(...Array.from({ length: 100 }, (_, index) => share(index + 1)))
    const { measured } = judge(wholeSetup(), lamp, 'light.coverage', { mountHeightMm: 200 })
    expectWithin(measured as number, best, 2 / cells.length)
    const bright = { ...lamp, specs: { ...lamp.specs, ...toSpecs({ dimmable: false }) } }
    const full = judge(wholeSetup(), bright, 'light.coverage', { mountHeightMm: 200, quantity: 1 })
    expectWithin(full.measured as number, share(100), 2 / cells.length)
  })

  it('counts of a band that reaches past 500 nm the part up to there', () => {
    // 0.3 × (500 − 450)/(550 − 450) + 0.2 = 0.35: just enough.
    const bands = [
      { fromNm: 420, toNm: 450, share: 0.2 },
      { fromNm: 450, toNm: 550, share: 0.3 },
      { fromNm: 550, toNm: 700, share: 0.5 },
    ]
    const spectrum = judge(wholeSetup(), piece('light', { bands }), 'light.spectrum')
    expectWithin(spectrum.measured as number, 0.35, 1e-12)
    expect(spectrum.outcome).toBe('pass')
  })
})

describe('a return pump at work, worked out by hand', () => {
  const curve = [
    { headM: 2, flowLph: 0 },
    { headM: 1.2, flowLph: 600 },
    { headM: 0, flowLph: 1000 },
  ]
  const pump = (values: Readonly<Record<string, unknown>> = {}) =>
    piece('return-pump', { lengthMm: 60, widthMm: 50, heightMm: 60, flowCurve: curve, boreMm: 13, ...values })
  const pumpHeadM = (lph: number) => (lph <= 600 ? 2 - (0.8 * lph) / 600 : 1.2 - (1.2 * (lph - 600)) / 400)

  // ν of sea water at 35 g/kg and 25 °C: 9.369e-7 m²/s (Sharqawy et al. 2010 over EOS-80). Smooth plastic 1.5 µm.
  const headM = (lph: number, boreMm: number, pipeM: number, liftM: number) => {
    const bore = boreMm / 1000
    const speed = lph / 3.6e6 / ((Math.PI / 4) * bore ** 2)
    const reynolds = (speed * bore) / 9.369e-7
    const relative = 1.5e-6 / bore
    // Laminar 64/Re; else Swamee & Jain 1976.
    const friction =
      reynolds < 2300 ? 64 / Math.max(reynolds, 1e-9) : 0.25 / Math.log10(relative / 3.7 + 5.74 / reynolds ** 0.9) ** 2
    // Entry 0.5 (from memory), exit 1, two elbows of 30 f_T each (Flow of Fluids, TP-410M).
    const fittings = 0.5 + 1 + 2 * 30 * (0.25 / Math.log10(relative / 3.7) ** 2)
    return liftM + ((friction * pipeM) / bore + fittings) * (speed ** 2 / (2 * 9.80665))
  }
  const flowAt = (boreMm: number, pipeM: number, liftM: number, head = pumpHeadM) =>
    scan((lph) => head(lph) >= headM(lph, boreMm, pipeM, liftM), 1000, 0.05)

  it('loses in its pipe what the published worked loop loses', () => {
    // 4000 L/h, 25 mm, 3 m, ΣK 4.25, lift 1.20 m: 2.945 m in all. Here ΣK follows from the elbows, so pipe and lift alone.
    const fittings = 1.5 + 60 * (0.25 / Math.log10(1.5e-6 / 0.025 / 3.7) ** 2)
    const speed2 = 2.2635 ** 2 / (2 * 9.80665)
    expectWithinShare(headM(4000, 25, 3, 1.2) - fittings * speed2, 1.2 + 0.635, 2e-3)
  })

  it('in a rear chamber lifts from its level to the water line through 600 mm of pipe', () => {
    const lph = flowAt(13, 0.6, 0.35 - 0.33)
    const flow = judge(wholeSetup(), pump(), 'return-pump.flow')
    expectWithinShare(flow.measured as number, lph / 84, 5e-4)
    expect(toPlain(flow.message)).toContain(`${Math.round(lph)} L/h against ${headM(lph, 13, 0.6, 0.02).toFixed(2)} m`)
  })

  it('from a sump lifts to 100 mm under the water line through 1.8 m of pipe, for the sump’s water too', () => {
    const setup = wholeSetup({
      filtration: 'sump',
      chambers: undefined,
      returnBoreMm: 20,
      sump: { lengthMm: 500, widthMm: 300, waterDepthMm: 250 },
    })
    // Tank top 1150 − 400 + bottom 10 + water line 350 − 100 − 250 = 760 mm; 84 + 37.5 L.
    const lph = flowAt(13, 1.8, 0.76)
    const flow = judge(setup, pump(), 'return-pump.flow')
    expectWithinShare(flow.measured as number, lph / 121.5, 5e-4)
    // The smaller of the two bores counts.
    const wide = judge(setup, pump({ boreMm: 25 }), 'return-pump.flow')
    expectWithinShare(wide.measured as number, flowAt(20, 1.8, 0.76) / 121.5, 5e-4)
  })

  it('slowed to 40 % has two fifths of the flow at four twenty-fifths of the head', () => {
    // Affinity laws (Flow of Fluids, TP-410M, ex. 7.33): flow in proportion, head with the square.
    const slow = (lph: number) => 0.16 * pumpHeadM(lph / 0.4)
    const lph = scan((at) => slow(at) >= headM(at, 13, 0.6, 0.02), 400, 0.05)
    const goals = { ...wholeSetup().goals, turnoverPerHour: [1, 2] as const }
    const flow = judge(wholeSetup({}, { goals }), pump({ dcControl: true }), 'return-pump.flow')
    expectWithinShare(flow.measured as number, lph / 84, 1e-3)
  })
})

describe('a stand under the tank, worked out by hand', () => {
  // EN 572-1: 2500 kg/m³ of glass; outside less inside.
  const shellKg = (0.62 * 0.42 * 0.4 - 0.6 * 0.4 * 0.39) * 2500
  // 10 kg of rock of 2.7 kg/L; a bed of 600 × 290 × 40 mm, 2.8 kg/L with 45 % pores.
  const sandKg = 600 * 290 * 40 * 1e-6 * 2.8 * 0.55
  // EOS-80 at 35 and 25 °C: 1023.34306 kg/m³ (UNESCO 44, table on p. 19).
  const waterKg = (84 - 10 / 2.7 - sandKg / 2.8) * 1.02334306
  const totalKg = shellKg + 10 + sandKg + waterKg
  const setup = wholeSetup({}, { goals: { ...wholeSetup().goals, rockKg: 10 } })
  const stand = (values: Readonly<Record<string, unknown>>) => piece('stand', values)

  it('has to hold shell, water, rock and sand', () => {
    expectWithin(shellKg, 26.4, 1e-9)
    expectWithin(totalKg, 125.37, 0.01)
    const load = judge(setup, stand({ loadRatingKg: 150 }), 'stand.load')
    expectWithin(load.measured as number, totalKg, 1e-5)
    expectWithin(load.margin, (150 - totalKg) / 150, 1e-6)
    // Without a rating 1.4 kg for each litre that it is made for (common practice): 125.37/1.4 = 89.55 L.
    expect(judge(setup, stand({ madeForVolumeL: totalKg / 1.4 + 0.01 }), 'stand.load').outcome).toBe('pass')
    expect(judge(setup, stand({ madeForVolumeL: totalKg / 1.4 - 0.01 }), 'stand.load').outcome).toBe('nodata')
  })

  it('leaves the tighter side of its top as what is to spare', () => {
    const top = judge(setup, stand({ topLengthMm: 650, topWidthMm: 430 }), 'stand.footprint')
    expect(top).toMatchObject({ outcome: 'pass', measured: 420, limit: 430 })
    expectWithin(top.margin, 10 / 430, 1e-12)
    // Both to a maker's ± 3 mm and a tape's ± 1 mm, uniform: u = √(3² + 1²)/√3 = 1.8257; z = 2/u = 1.0954; Φ = 0.8634.
    const close = judge(setup, stand({ topLengthMm: 650, topWidthMm: 422 }), 'stand.footprint')
    expectWithin(close.probability, 0.8634, 1e-3)
  })
})

describe('water, salt and sand, worked out by hand', () => {
  it('makes of a rated membrane what pressure, cold and concentration leave', () => {
    // Membrane maker's technical manual, form 45-D01504-en. Three litres of waste: Y = 1/4, ln(1/(1 − Y))/Y = 1.150728.
    const stronger = Math.log(1 / 0.75) / 0.25
    const osmoticKPa = (tds: number, celsius: number) => ((tds * stronger * (celsius + 320)) / 491000) * 100
    expectWithin(osmoticKPa(250, 25), 20.2, 0.02)
    const drive = (350 - osmoticKPa(250, 15)) / (345 - osmoticKPa(250, 25))
    const cold = Math.exp(3020 * (1 / 298 - 1 / 288))
    expectWithin(cold, 0.703, 1e-3)
    const unit = piece('ro-unit', {
      membraneLpd: 284,
      testPressureKPa: 345,
      testTempC: 25,
      testTdsPpm: 250,
      wasteRatio: 3,
      boosterIncluded: false,
    })
    const output = judge(wholeSetup(), unit, 'ro-unit.output')
    expectWithin(output.measured as number, 284 * drive * cold, 1e-6)
    expectWithin(output.measured as number, 203.1, 0.2)
    expectWithin(output.limit as number, 20 / 7, 1e-12)
    // 84 L at 203 L a day.
    expect(output.message).toContain('the first fill takes less than a day')
  })

  it('takes two and a tenth, so three, packs of salt for 84 L of 40 each', () => {
    const packs = (salinityPpt: number) =>
      judge(
        wholeSetup({}, { goals: { ...wholeSetup().goals, salinityPpt } }),
        piece('salt-mix', { makesL: 40 }),
        'salt-mix.amount',
      ).measured
    expect(packs(35)).toBe(3)
    // 84 × 33/35 / 40 = 1.98.
    expect(packs(33)).toBe(2)
  })

  it('takes area by depth by bulk density of sand', () => {
    const sand = (values: Readonly<Record<string, unknown>>, setup = wholeSetup()) =>
      judge(setup, piece('sand', { packKg: 9, ...values }), 'sand.amount')
    // 0.6 × 0.29 × 0.04 m³ = 6.96 L; 2.8 × 0.55 = 1.54 kg/L.
    expectWithin(sand({}).measured as number, 6.96 * 1.54, 1e-9)
    expect(toPlain(sand({}).message)).toBe('10.7 kg for a bed 40 mm deep: 2 bags of 9 kg.')
    expectWithin(sand({ bulkDensityKgL: 1.25 }).measured as number, 8.7, 1e-9)
    // Published worked bed: 1.176 × 0.576 × 0.05 m at 2800 kg/m³ and 45 % pores: 52.16 kg.
    const wide = wholeSetup(
      { outerLengthMm: 1200, outerWidthMm: 600, wallMm: 12, displayLengthMm: 1176, displayWidthMm: 576 },
      { goals: { ...wholeSetup().goals, sandDepthMm: 50 } },
    )
    expectWithin(sand({}, wide).measured as number, 52.16, 0.005)
  })

  it('shows on a NaCl scale 36.5 in water of 35', () => {
    // CRC Handbook, 57th ed., p. D-252 (seen quoted): 3.65 % NaCl bends light as sea water of 35 does.
    const meter = piece('salinity-meter', { scales: ['nacl'] })
    const at = (salinityPpt: number) =>
      toPlain(
        judge(wholeSetup({}, { goals: { ...wholeSetup().goals, salinityPpt } }), meter, 'salinity-meter.scale').message,
      )
    expect(at(35)).toContain('in water of 35 ppt it shows 36.5 ppt')
    // 33 × 36.5/35 = 34.41.
    expect(at(33)).toContain('in water of 33 ppt it shows 34.4 ppt')
  })

  it('lays one wavemaker’s flow over the water, with what the others add', () => {
    const maker = (values: Readonly<Record<string, unknown>>) => piece('wavemaker', { flowMinLph: 500, ...values })
    const setup = wholeSetup({}, { items: [item('other', maker({ flowMaxLph: 1260 }))] })
    // (1260 + 840)/84 = 25 at most, 1000/84 = 11.9 at least: judged at 25.
    expectWithin(judge(setup, maker({ flowMaxLph: 840 }), 'wavemaker.flow').measured as number, 25, 1e-9)
  })
})
