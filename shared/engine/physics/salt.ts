import { requireFinite } from './finite'
import { seawaterDensityKgM3 } from './seawater'

/** Salinity at which makers state how much water a pack makes. */
export const packSalinityPpt = 35

/** Packs of salt for a volume of new water, a fraction: what one pack makes at 35 ppt, in proportion. RangeError for NaN. */
export function saltPacks(volumeL: number, salinityPpt: number, makesL: number): number {
  requireFinite({ volumeL, salinityPpt, makesL })
  if (makesL <= 0) throw new RangeError(`makesL must be above 0, got ${makesL}`)
  return (volumeL * salinityPpt) / packSalinityPpt / makesL
}

/** Whole packs to buy, forgiving a millionth. RangeError for NaN. */
export function countPacks(packs: number): number {
  requireFinite({ packs })
  return Math.max(0, Math.ceil(packs - 1e-6))
}

/** Natural sea water as a salt mix states it. */
export interface WaterChemistry {
  readonly alkalinityDkh: number
  readonly calciumPpm: number
  readonly magnesiumPpm: number
}

/** mol/kg in the Reference Composition at salinity 35 (Millero et al. 2008), Ca and Mg; eq/kg, alkalinity (from memory). */
const reference = { calciumMolKg: 0.0102821, magnesiumMolKg: 0.0528171, alkalinityEqKg: 0.0023 }

/** IUPAC, g/mol. */
const molarMass = { calcium: 40.078, magnesium: 24.305 }

/** 1 meq/L = 2.8 dKH (convention, from memory). */
const dkhPerMeqL = 2.8

/** Chemistry of natural sea water of a salinity at 25 °C, in the trade's units (ppm as mg/L). RangeError for NaN. */
export function naturalSeawater(salinityPpt: number): WaterChemistry {
  requireFinite({ salinityPpt })
  const kgL = ((seawaterDensityKgM3(salinityPpt, 25) / 1000) * salinityPpt) / 35
  return {
    alkalinityDkh: reference.alkalinityEqKg * 1000 * kgL * dkhPerMeqL,
    calciumPpm: reference.calciumMolKg * molarMass.calcium * 1000 * kgL,
    magnesiumPpm: reference.magnesiumMolKg * molarMass.magnesium * 1000 * kgL,
  }
}
