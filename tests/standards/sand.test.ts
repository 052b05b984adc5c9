import { describe, expect, it } from 'vitest'
import {
  bulkDensityKgL,
  carbonateIn,
  classifyGrain,
  middleGrainMm,
  moveGrain,
  movingSpeedMS,
  sandBedKg,
} from '#shared/engine/physics/sand'
import { expectWithin, expectWithinShare } from './within'

describe('a grain size', () => {
  // Wentworth 1922.
  it.each([
    [3, 'granules'],
    [1.5, 'very coarse sand'],
    [1, 'very coarse sand'],
    [0.7, 'coarse sand'],
    [0.3, 'medium sand'],
    [0.2, 'fine sand'],
    [0.1, 'very fine sand'],
    [0.05, 'silt'],
  ])('of %f mm is %s', (grain, name) => {
    expect(classifyGrain(grain)).toBe(name)
  })

  it('between 0.5 and 2 mm is 1 mm in the middle', () => {
    expectWithin(middleGrainMm(0.5, 2), 1, 1e-12)
  })
})

describe('moving sand', () => {
  // Soulsby 1997, Dynamics of Marine Sands, computed by an independent code; 5e-4. Quartz 2650 kg/m³ in the sea at 10 °C.
  it.each([
    [0.2, 4.0627, 0.05535, 0.02019],
    [0.5, 10.1566, 0.03286, 0.0663],
    [1, 20.3133, 0.03018, 0.11421],
  ])('of quartz, %f mm', (grain, size, shields, settling) => {
    const quartz = { grainDensityKgM3: 2650, waterDensityKgM3: 1027, viscosityM2S: 1.36e-6 }
    const motion = moveGrain(grain, quartz)
    expectWithinShare(motion.size, size, 5e-4)
    expectWithinShare(motion.shields, shields, 5e-4)
    expectWithinShare(motion.settlingMS, settling, 5e-4)
  })

  // The same for carbonate 2800 kg/m³ at salinity 35, 25 °C, in half a metre of water.
  it.each([
    [0.125, 3.3588, 0.06321, 0.13771, 0.0116, 0.01325, 0.2656],
    [0.25, 6.7175, 0.04002, 0.17439, 0.01305, 0.03847, 0.2707],
    [0.5, 13.4351, 0.03048, 0.26562, 0.01611, 0.07707, 0.3026],
    [1, 26.8702, 0.03189, 0.5558, 0.02331, 0.12431, 0.3964],
    [2, 53.7404, 0.04081, 1.42241, 0.03728, 0.18424, 0.5743],
  ])('of carbonate, %f mm', (grain, size, shields, stress, friction, settling, speed) => {
    const water = carbonateIn(35, 25)
    const motion = moveGrain(grain, water)
    expectWithinShare(motion.size, size, 5e-4)
    expectWithinShare(motion.shields, shields, 5e-4)
    expectWithinShare(motion.stressPa, stress, 5e-4)
    expectWithinShare(motion.frictionVelocityMS, friction, 5e-4)
    expectWithinShare(motion.settlingMS, settling, 5e-4)
    expectWithinShare(movingSpeedMS(grain, 500, water), speed, 5e-4)
  })
})

describe('a bed of sand', () => {
  it('of 1.176 × 0.576 × 0.05 m at 2800 kg/m³ and 45 % pores weighs 52.16 kg', () => {
    // By hand.
    expectWithin(sandBedKg(1176, 576, 50, bulkDensityKgL(2.8, 0.45)), 52.16, 0.005)
  })
})
