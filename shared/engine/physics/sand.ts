import { requireFinite } from './finite'
import { seawaterDensityKgM3, seawaterKinematicViscosityM2S } from './seawater'

/** As in the source of the formulas below, m/s². */
const gravity = 9.81

/** Each class of grains ends below its size, mm. Source: Wentworth 1922, d = 2^−φ mm. */
export const grainClasses = [
  [0.0625, 'silt'],
  [0.125, 'very fine sand'],
  [0.25, 'fine sand'],
  [0.5, 'medium sand'],
  [1, 'coarse sand'],
  [2, 'very coarse sand'],
  [4, 'granules'],
  [64, 'pebbles'],
] as const

/** Name of a grain size; a limit belongs to the coarser class. RangeError for NaN. */
export function classifyGrain(grainMm: number): string {
  requireFinite({ grainMm })
  return grainClasses.find(([below]) => grainMm < below)?.[1] ?? 'cobbles'
}

/** Middle of a range of grain sizes on Wentworth's scale, mm: the geometric mean. RangeError for NaN. */
export function middleGrainMm(grainMinMm: number, grainMaxMm: number): number {
  requireFinite({ grainMinMm, grainMaxMm })
  return Math.sqrt(Math.max(0, grainMinMm * grainMaxMm))
}

export interface GrainWater {
  readonly grainDensityKgM3: number
  readonly waterDensityKgM3: number
  readonly viscosityM2S: number
}

/** Carbonate grains (2800 kg/m³) in sea water. RangeError for NaN. */
export function carbonateIn(salinityPpt: number, temperatureC: number): GrainWater {
  return {
    grainDensityKgM3: 2800,
    waterDensityKgM3: seawaterDensityKgM3(salinityPpt, temperatureC),
    viscosityM2S: seawaterKinematicViscosityM2S(salinityPpt, temperatureC),
  }
}

export interface GrainMotion {
  /** D*, dimensionless grain size. */
  readonly size: number
  /** θcr, Shields parameter at which grains begin to move. */
  readonly shields: number
  /** τcr and u*cr, stress on the bed and its friction velocity at that point. */
  readonly stressPa: number
  readonly frictionVelocityMS: number
  /** Speed at which one grain sinks in still water. */
  readonly settlingMS: number
}

/**
 * When sand moves and how fast it sinks. Source: Soulsby 1997, Dynamics of Marine Sands, for natural quartz grains: flaky
 * or porous carbonate sinks slower and moves earlier. RangeError for NaN.
 */
export function moveGrain(grainMm: number, water: GrainWater): GrainMotion {
  const { grainDensityKgM3, waterDensityKgM3, viscosityM2S } = water
  requireFinite({ grainMm, grainDensityKgM3, waterDensityKgM3, viscosityM2S })
  const d = grainMm / 1000
  const size = d * Math.cbrt((gravity * (grainDensityKgM3 / waterDensityKgM3 - 1)) / viscosityM2S ** 2)
  const shields = 0.3 / (1 + 1.2 * size) + 0.055 * (1 - Math.exp(-0.02 * size))
  const stressPa = shields * gravity * (grainDensityKgM3 - waterDensityKgM3) * d
  const settlingMS = (viscosityM2S / d) * (Math.sqrt(10.36 ** 2 + 1.049 * size ** 3) - 10.36)
  return { size, shields, stressPa, frictionVelocityMS: Math.sqrt(stressPa / waterDensityKgM3), settlingMS }
}

/** Mean speed over the water's depth at which grains begin to move, m/s: 7 (h/d)^(1/7) √(g(s−1)d θcr); D* above 0.1. */
export function movingSpeedMS(grainMm: number, depthMm: number, water: GrainWater): number {
  requireFinite({ depthMm })
  const { shields } = moveGrain(grainMm, water)
  const excess = water.grainDensityKgM3 / water.waterDensityKgM3 - 1
  return 7 * (depthMm / grainMm) ** (1 / 7) * Math.sqrt((gravity * excess * grainMm * shields) / 1000)
}

/** Dry mass of a bed, kg, from its area, depth and bulk density (kg/L). RangeError for NaN. */
export function sandBedKg(lengthMm: number, widthMm: number, depthMm: number, bulkDensityKgL: number): number {
  requireFinite({ lengthMm, widthMm, depthMm, bulkDensityKgL })
  return (lengthMm * widthMm * depthMm * bulkDensityKgL) / 1e6
}

/** Bulk density of a packing of grains with a share of pores between them (0.40–0.50 for carbonate sand), kg/L. */
export function bulkDensityKgL(solidKgL: number, porosity: number): number {
  requireFinite({ solidKgL, porosity })
  return solidKgL * (1 - porosity)
}
