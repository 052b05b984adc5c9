import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { findLongestMm } from '#shared/engine/physics/geometry'
import { layRodFlat, leanRod } from '#shared/engine/physics/rod'
import { expectWithin } from './within'

const space = { lengthMm: 600, widthMm: 400, heightMm: 350 }

describe('a rod leaning in a box', () => {
  it('of 30 mm in 600 × 400 × 350 may be 750 long and not 760', () => {
    // Twice Carver's theorem, computed by an independent code: ℓ = 693.726; 75 × 3 fits in ℓ × 35 and 76 × 3 does not.
    expect(leanRod({ lengthMm: 750, diameterMm: 30 }, space).fits).toBe(true)
    expect(leanRod({ lengthMm: 760, diameterMm: 30 }, space).fits).toBe(false)
  })

  it('reaches from corner to corner when it has no thickness', () => {
    // √(600² + 400² + 350²) = 801.56.
    expectWithin(leanRod({ lengthMm: 0, diameterMm: 0 }, space).slackMm, Math.hypot(600, 400, 350), 0.01)
  })

  it('lies inside its run and its height at the angle that it is drawn at, and at none flatter', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 100, max: 800, noNaN: true }),
        fc.double({ min: 5, max: 60, noNaN: true }),
        fc.double({ min: 60, max: 600, noNaN: true }),
        (lengthMm, diameterMm, heightMm) => {
          const { fits, angleDeg, slackMm } = leanRod({ lengthMm, diameterMm }, { ...space, heightMm })
          expect(fits).toBe(slackMm !== null && slackMm >= 0)
          if (angleDeg === null) {
            expect(fits).toBe(false)
            return
          }
          const longest = findLongestMm(diameterMm, [600, 400]) ?? 0
          const isInside = (degrees: number, mm: number) => {
            const angle = (degrees * Math.PI) / 180
            const run = lengthMm * Math.cos(angle) + diameterMm * Math.sin(angle)
            const rise = lengthMm * Math.sin(angle) + diameterMm * Math.cos(angle)
            return run <= longest + mm && rise <= heightMm + mm
          }
          // Right at the limit the angle is ill-conditioned: a thousandth of a millimetre.
          expect(isInside(angleDeg, 1e-3)).toBe(true)
          for (let flatter = 0; flatter < angleDeg - 0.05; flatter += 0.1) expect(isInside(flatter, 0)).toBe(false)
        },
      ),
    )
  })

  it('stands nearly upright where leaning lower would lift its corner too high', () => {
    // 100 × 30 in a run of 50 and a height of 102: at the first angle that the run allows, 78°, its corner is at 104.
    const { angleDeg } = leanRod({ lengthMm: 100, diameterMm: 30 }, { lengthMm: 50, widthMm: 30, heightMm: 102 })
    const angle = ((angleDeg ?? 0) * Math.PI) / 180
    expectWithin(100 * Math.sin(angle) + 30 * Math.cos(angle), 102, 1e-6)
    expect(100 * Math.cos(angle) + 30 * Math.sin(angle)).toBeLessThan(50)
  })

  it('lies down where its length alone is within the run', () => {
    // 98 × 30 in a run of 100: tilted a little its corners would reach 102, flat it has 2 to spare.
    const lying = leanRod({ lengthMm: 98, diameterMm: 30 }, { lengthMm: 100, widthMm: 30, heightMm: 40 })
    expect(lying).toMatchObject({ fits: true, angleDeg: 0 })
  })

  it('fits whenever it fits flat or upright', () => {
    const side = fc.double({ min: 40, max: 500, noNaN: true })
    fc.assert(
      fc.property(
        side,
        side,
        side,
        fc.double({ min: 20, max: 500, noNaN: true }),
        (lengthMm, widthMm, heightMm, long) => {
          const rod = { lengthMm: long, diameterMm: 20 }
          const upright = long <= heightMm
          const flat = layRodFlat(rod, [lengthMm, widthMm]).fits && rod.diameterMm <= heightMm
          if (upright || flat) expect(leanRod(rod, { lengthMm, widthMm, heightMm }).slackMm).toBeGreaterThan(-1e-6)
        },
      ),
    )
  })

  it('has no slack at all when it is too thick for the box', () => {
    expect(leanRod({ lengthMm: 10, diameterMm: 900 }, space)).toEqual({ fits: false, slackMm: null, angleDeg: null })
  })
})

describe('a rod lying flat', () => {
  it('may be 693.7 mm long in 600 × 400 at a thickness of 30', () => {
    // Carver's theorem, computed by an independent code.
    expectWithin(layRodFlat({ lengthMm: 600, diameterMm: 30 }, [600, 400]).slackMm, 93.726, 1e-3)
    expect(layRodFlat({ lengthMm: 600, diameterMm: 30 }, [600, 400]).angleDeg).toBe(0)
    expect(layRodFlat({ lengthMm: 700, diameterMm: 30 }, [600, 400])).toMatchObject({ fits: false, angleDeg: null })
  })
})
