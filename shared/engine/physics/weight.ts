import { requireFinite } from './finite'
import type { WallMaterial } from './heat'
import { seawaterDensityKgM3 } from './seawater'

/** kg/m³. Soda-lime glass: EN 572-1. PMMA: ISO 10456 (EN 12524). */
export const shellDensityKgM3: Readonly<Record<WallMaterial, number>> = { glass: 2500, acrylic: 1180 }

/** Of the grains themselves, kg/L. Rock counts what displaces water; sand lies between aragonite (2.93) and calcite (2.71). */
export const solidDensityKgL = { rock: 2.7, sand: 2.8 } as const

/** Standard gravity, m/s² (exact by definition). */
export const standardGravityMS2 = 9.80665

export interface OpenBox {
  readonly outerLengthMm: number
  readonly outerWidthMm: number
  readonly outerHeightMm: number
  readonly wallMm: number
  readonly bottomMm: number
  readonly material: WallMaterial
}

/** Inside length × width × water line, in litres. RangeError for NaN. */
export function boxVolumeL(insideLengthMm: number, insideWidthMm: number, waterDepthMm: number): number {
  requireFinite({ insideLengthMm, insideWidthMm, waterDepthMm })
  return (Math.max(0, insideLengthMm) * Math.max(0, insideWidthMm) * Math.max(0, waterDepthMm)) / 1e6
}

/** Mass of an empty box without lid, braces or silicone, kg: outer less inner volume by density. RangeError for NaN. */
export function shellMassKg(box: OpenBox): number {
  const { outerLengthMm, outerWidthMm, outerHeightMm, wallMm, bottomMm } = box
  requireFinite({ wallMm, bottomMm })
  const outerL = boxVolumeL(outerLengthMm, outerWidthMm, outerHeightMm)
  const innerL = boxVolumeL(outerLengthMm - 2 * wallMm, outerWidthMm - 2 * wallMm, outerHeightMm - bottomMm)
  return ((outerL - innerL) * shellDensityKgM3[box.material]) / 1000
}

/** Mass of sea water by EOS-80, kg. RangeError for NaN. */
export function seawaterMassKg(volumeL: number, salinityPpt: number, temperatureC: number): number {
  requireFinite({ volumeL })
  return (volumeL * seawaterDensityKgM3(salinityPpt, temperatureC)) / 1000
}

/** Water left in a tank after rock and sand have taken their place, litres, never below 0. RangeError for NaN. */
export function netVolumeL(
  grossL: number,
  rockKg: number,
  sandKg: number,
  densityKgL: { readonly rock: number; readonly sand: number } = solidDensityKgL,
): number {
  requireFinite({ grossL, rockKg, sandKg, rockKgL: densityKgL.rock, sandKgL: densityKgL.sand })
  return Math.max(0, grossL - rockKg / densityKgL.rock - sandKg / densityKgL.sand)
}

/** Filled mass, kg: shell, water and what lies in it. RangeError for NaN. */
export function filledMassKg(parts: {
  readonly shellKg: number
  readonly waterKg: number
  readonly rockKg: number
  readonly sandKg: number
}): number {
  requireFinite({ ...parts })
  return parts.shellKg + parts.waterKg + parts.rockKg + parts.sandKg
}

/** Pressure of a mass spread evenly over a footprint, kPa. Information, never a pass or fail. RangeError for NaN. */
export function floorPressureKPa(massKg: number, lengthMm: number, widthMm: number): number {
  requireFinite({ massKg, lengthMm, widthMm })
  return (massKg * standardGravityMS2) / ((lengthMm * widthMm) / 1e6) / 1000
}
