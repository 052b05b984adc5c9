import { describe, expect, it } from 'vitest'
import { axialIntensityUmolSSr, lambertianOrder, ppfdInAirUmol, spotDiameterMm } from '#shared/engine/physics/beam'
import { expectWithin, expectWithinShare } from './within'

describe('a generalised Lambertian beam', () => {
  // m = −ln 2/ln cos θ½, Kahn & Barry 1997 (cited from memory); computed by an independent code, 5e-5.
  it.each([
    [120, 1],
    [90, 2],
    [70, 3.47467],
    [60, 4.81884],
    [45, 8.75478],
    [40, 11.14341],
    [30, 19.99373],
  ])('of %d° has the order %f', (angle, order) => {
    expectWithin(lambertianOrder(angle), order, 5e-5)
  })

  // 100 µmol/s from 0.30 m: (m+1)Φ/2πd² cosᵐθ cosθ, computed by an independent code; 1e-3 on the axis, 0.02 off it.
  it.each([
    [1, 353.678, 88.419],
    [2, 530.516, 93.783],
    [4.81884, 1029.0, null],
  ])('of order %f gives %f µmol/(m² s) straight below', (order, axial, aside) => {
    const intensity = axialIntensityUmolSSr(100, order)
    expectWithin(ppfdInAirUmol(intensity, order, 300, 0), axial, axial === 1029 ? 0.02 : 1e-3)
    if (aside !== null) expectWithin(ppfdInAirUmol(intensity, order, 300, 300), aside, 0.02)
  })

  it('puts all its photons on the plane below', () => {
    for (const order of [1, 2, 4.81884, 19.99373]) {
      const intensity = axialIntensityUmolSSr(100, order)
      // Rings in equal steps of the angle; r = h tan θ.
      let sum = 0
      for (let step = 0; step < 20000; step += 1) {
        const [inner, outer] = [step, step + 1].map((at) => 0.3 * Math.tan((at / 20000) * (Math.PI / 2 - 1e-4)))
        const middle = ((inner ?? 0) + (outer ?? 0)) / 2
        sum +=
          ppfdInAirUmol(intensity, order, 300, middle * 1000) * 2 * Math.PI * middle * ((outer ?? 0) - (inner ?? 0))
      }
      expectWithinShare(sum, 100, 2e-3)
    }
  })

  it('halves at the edge of its angle, as the angle is defined', () => {
    const order = lambertianOrder(90)
    const along = ppfdInAirUmol(1, order, 300, 300) / Math.cos(Math.PI / 4)
    const straight = ppfdInAirUmol(1, order, Math.hypot(300, 300), 0)
    expectWithinShare(along / straight, 0.5, 1e-9)
  })

  it('falls to 0.4444 from 30 to 45 cm', () => {
    // Inverse square of a point source.
    expectWithin(ppfdInAirUmol(1, 1, 450, 0) / ppfdInAirUmol(1, 1, 300, 0), 0.4444, 1e-4)
  })

  // 2h tan(θ/2), in cm; 1e-3.
  it.each([
    [30, 60, 34.641],
    [30, 90, 60],
    [30, 120, 103.923],
    [20, 120, 69.282],
  ])('from %d cm at %d° lights a spot of %f cm', (height, angle, diameter) => {
    expectWithin(spotDiameterMm(angle, height * 10) / 10, diameter, 1e-3)
  })

  it('cannot be measured at no distance', () => {
    expect(() => ppfdInAirUmol(1, 1, 0, 0)).toThrow(RangeError)
    expect(() => lambertianOrder(Number.NaN)).toThrow(RangeError)
  })
})
