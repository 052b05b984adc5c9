import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import {
  fittingsK,
  flowSpeedMS,
  frictionFactor,
  pipeLossM,
  reynoldsNumber,
  roughFrictionFactor,
  systemHeadM,
  type Pipe,
} from '#shared/engine/physics/flow'
import { seawaterKinematicViscosityM2S } from '#shared/engine/physics/seawater'
import { expectWithin, expectWithinShare } from './within'

/** Colebrook 1939, solved here by iterating: independent of Swamee & Jain's approximation of it. */
function colebrook(reynolds: number, roughness: number): number {
  let x = 8
  for (let step = 0; step < 100; step += 1) x = -2 * Math.log10(roughness / 3.7 + (2.51 * x) / reynolds)
  return 1 / (x * x)
}

describe('the friction factor', () => {
  it('is that of the published values for Swamee & Jain', () => {
    // Test suite of CalebBell/fluids: Re 1e5, ε/D 1e-4 (to the last digit); smooth pipe at Re 1e4 computed, 1e-6.
    expectWithin(frictionFactor(1e5, 1e-4), 0.0184524, 5e-8)
    expectWithin(frictionFactor(1e4, 0), 0.0309721, 1e-6)
  })

  it('stays within 3 % of Colebrook where it is stated to hold', () => {
    // The same suite, Colebrook: 0.018513866077471648. The stated accuracy of Swamee & Jain (1976) is 1–3 %.
    expectWithin(colebrook(1e5, 1e-4), 0.018513866077471648, 1e-9)
    expectWithin(colebrook(1e4, 0), 0.030883, 1e-6)
    fc.assert(
      fc.property(
        fc.double({ min: 3.7, max: 8, noNaN: true }),
        fc.double({ min: -6, max: -2, noNaN: true }),
        (re, rough) => {
          expectWithinShare(frictionFactor(10 ** re, 10 ** rough), colebrook(10 ** re, 10 ** rough), 0.035)
        },
      ),
    )
  })

  it('below Re 2300 is 64/Re and from there on turbulent', () => {
    // Hagen–Poiseuille, and Colebrook.
    expectWithin(frictionFactor(1000, 1e-3), 0.064, 1e-12)
    expectWithin(frictionFactor(2299, 1e-3), 64 / 2299, 1e-12)
    expectWithinShare(frictionFactor(2300, 1e-3), colebrook(2300, 1e-3), 0.06)
  })

  it('of fully rough flow is what Colebrook comes to at endless Re', () => {
    expectWithinShare(roughFrictionFactor(1e-3), colebrook(1e15, 1e-3), 1e-6)
  })
})

describe('worked pipes', () => {
  it('carry 200 L/min of water at 30 °C in 52.48 mm at Re 100 600 and f 0.0179', () => {
    // Flow of Fluids (TP-410M), example 7.1; smooth plastic; Re 0.6 %, f 2e-4.
    const reynolds = reynoldsNumber(flowSpeedMS(200 * 60, 52.48), 52.48, seawaterKinematicViscosityM2S(0, 30))
    expectWithinShare(reynolds, 100600, 6e-3)
    expectWithin(frictionFactor(reynolds, 0.0015 / 52.48), 0.0179, 2e-4)
  })

  it('have f 0.0225 at Re 128 000 and ε/D 0.0013, and lose 117.4 m', () => {
    // White, Fluid Mechanics, example 6.7: 0.2 m³/s, 200 mm, 500 m, ν 1e-5 m²/s; f by Moody's chart and the head by
    // Colebrook, from which Swamee & Jain part by up to 2 %.
    const reynolds = reynoldsNumber(flowSpeedMS(0.2 * 3.6e6, 200), 200, 1e-5)
    expectWithinShare(reynolds, 128000, 6e-3)
    expectWithinShare(frictionFactor(reynolds, 0.0013), 0.0225, 0.02)
    const pipe = { boreMm: 200, lengthMm: 500000, fittingsK: 0, roughnessMm: 0.26 }
    expectWithinShare(pipeLossM(0.2 * 3.6e6, pipe, 1e-5), 117.4, 0.01)
  })

  it('lose 4.5 ft in 200 ft of 0.5 ft pipe at 6.05 ft/s', () => {
    // White, Fluid Mechanics, example 6.8, after Moody 1944: ν 1.1e-5 ft²/s, ε/d 0.0008; f 0.01982, V 6.046 ft/s.
    // Swamee & Jain within 1 %.
    const ft = 304.8
    const reynolds = reynoldsNumber((6.046 * ft) / 1000, 0.5 * ft, 1.1e-5 * 0.3048 ** 2)
    expectWithinShare(reynolds, 274800, 2e-3)
    expectWithinShare(frictionFactor(reynolds, 0.0008), 0.01982, 0.01)
    const flowLph = ((6.046 * ft) / 1000) * (Math.PI / 4) * (0.5 * 0.3048) ** 2 * 3.6e6
    const pipe: Pipe = { boreMm: 0.5 * ft, lengthMm: 200 * ft, fittingsK: 0, roughnessMm: 0.0004 * ft }
    expectWithinShare(pipeLossM(flowLph, pipe, 1.1e-5 * 0.3048 ** 2) / 0.3048, 4.5, 0.01)
  })

  it('take 2.945 m of head from a return pump at 4000 L/h', () => {
    // Computed by an independent code: salinity 35, 25 °C, 25 mm bore, 3 m, ε 1.5 µm, ΣK 4.25, 1.20 m of lift; 0.2 %, and
    // 0.5 % for the friction factor alone.
    const pipe: Pipe = { boreMm: 25, lengthMm: 3000, fittingsK: 4.25 }
    const speed = flowSpeedMS(4000, 25)
    expectWithinShare(speed, 2.2635, 2e-3)
    expectWithinShare(reynoldsNumber(speed, 25), 60400, 2e-3)
    expectWithinShare(frictionFactor(reynoldsNumber(speed, 25), 0.0015 / 25), 0.02024, 5e-3)
    expectWithinShare(pipeLossM(4000, { ...pipe, fittingsK: 0 }), 0.635, 5e-3)
    expectWithinShare(pipeLossM(4000, pipe) - pipeLossM(4000, { ...pipe, fittingsK: 0 }), 1.11, 2e-3)
    expectWithinShare(systemHeadM(4000, 1.2, pipe), 2.945, 2e-3)
  })

  it('count an elbow as 30 f_T beside entry and exit', () => {
    // Flow of Fluids (TP-410M): standard 90° elbow 30 f_T, exit 1.0; sharp entry 0.5 (from memory).
    expectWithin(fittingsK(0, 20), 1.5, 1e-12)
    expectWithinShare(fittingsK(2, 20) - 1.5, 60 * colebrook(1e15, 0.0015 / 20), 1e-6)
  })
})

describe('the head that a system takes', () => {
  it('rises with flow, length and lift, and falls with bore', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 10, max: 20000, noNaN: true }),
        fc.double({ min: 8, max: 60, noNaN: true }),
        fc.double({ min: 100, max: 6000, noNaN: true }),
        (flowLph, boreMm, lengthMm) => {
          const pipe: Pipe = { boreMm, lengthMm, fittingsK: 3 }
          const head = systemHeadM(flowLph, 1, pipe)
          expect(systemHeadM(flowLph * 1.01, 1, pipe)).toBeGreaterThan(head)
          expect(systemHeadM(flowLph, 1, { ...pipe, lengthMm: lengthMm + 10 })).toBeGreaterThan(head)
          expect(systemHeadM(flowLph, 1.1, pipe)).toBeGreaterThan(head)
          expect(systemHeadM(0, 1, pipe)).toBe(1)
        },
      ),
    )
  })
})
