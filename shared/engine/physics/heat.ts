import { ashraeEvaporationKgM2H, evaporationHeatW, shahEvaporationKgM2H } from './evaporation'
import { requireFinite } from './finite'

export type WallMaterial = 'glass' | 'acrylic'
export type Lid = 'none' | 'mesh' | 'solid'

/** A body of water behind walls: the display with its chambers, or a sump. Inside measures. */
export interface WaterTub {
  readonly insideLengthMm: number
  readonly insideWidthMm: number
  readonly waterDepthMm: number
  readonly wallMm: number
  readonly bottomMm: number
  readonly material: WallMaterial
}

export interface TankHeatInput {
  readonly boxes: readonly WaterTub[]
  /** Lies on the first box; the others are open. */
  readonly lid: Lid
  readonly waterC: number
  readonly roomC: number
  /** 0 to 1 */
  readonly relativeHumidity: number
}

/** Heat lost, in W; what is gained is negative. */
export interface TankHeatLoss {
  readonly sidesW: number
  readonly bottomW: number
  readonly surfaceW: number
  readonly evaporationW: number
  readonly evaporationUpperW: number
  readonly totalW: number
  readonly totalUpperW: number
  readonly evaporationLPerDay: number
  readonly evaporationUpperLPerDay: number
}

/** W/(m K). Soda-lime glass: EN 572-1 and ISO 10456. PMMA: ISO 10456 (EN 12524). */
export const conductivityWMK: Readonly<Record<WallMaterial, number>> = { glass: 1.0, acrylic: 0.18 }

/** Surface resistances in m² K/W for horizontal, downward and upward heat flow: ISO 6946. */
export const surfaceResistanceM2KW = { sides: 0.13, bottom: 0.17, surface: 0.1 } as const

/** Common practice, no published source: a solid lid keeps back nine tenths of the evaporation, a mesh none. */
export const evaporationShareUnder: Readonly<Record<Lid, number>> = { none: 1, mesh: 1, solid: 0.1 }

/** Heat through a wall per square metre and kelvin, W/(m² K): 1/(R + thickness/λ). RangeError for NaN. */
export function wallTransmittanceWM2K(thicknessMm: number, material: WallMaterial, resistanceM2KW: number): number {
  if (!Number.isFinite(thicknessMm + resistanceM2KW)) requireFinite({ thicknessMm, resistanceM2KW })
  return 1 / (resistanceM2KW + thicknessMm / 1000 / conductivityWMK[material])
}

const shareEvaporating = (index: number, lid: Lid): number => (index === 0 ? evaporationShareUnder[lid] : 1)

/** Water that evaporates, L per day, by ASHRAE's model: the same figure as that of `tankHeatLoss`, without the rest. */
export function evaporationLPerDay(input: TankHeatInput): number {
  const evaporatingM2 = input.boxes.reduce(
    (sum, { insideLengthMm, insideWidthMm }, index) =>
      sum + ((insideLengthMm * insideWidthMm) / 1e6) * shareEvaporating(index, input.lid),
    0,
  )
  return ashraeEvaporationKgM2H(input) * evaporatingM2 * 24
}

/**
 * Heat lost by a tank (and sump) at a water and a room temperature: conduction through wetted sides, bottom and surface,
 * plus evaporation by ASHRAE's model (the figure) and, as the upper figure, by Shah's where that is higher.
 * In a room warmer than the water the conductive terms turn negative (the room warms the tank) while evaporation goes on
 * cooling it until the room's vapour pressure reaches that of the surface, and is 0 beyond. A kilogram of evaporated
 * water counts as a litre. RangeError for NaN.
 */
export function tankHeatLoss(input: TankHeatInput): TankHeatLoss {
  const lower = ashraeEvaporationKgM2H(input)
  const upper = Math.max(lower, shahEvaporationKgM2H(input))
  const { sidesW, bottomW, surfaceW, evaporatingM2 } = sumBoxes(input)
  const evaporationW = evaporationHeatW(lower * evaporatingM2, input.waterC)
  const evaporationUpperW = evaporationHeatW(upper * evaporatingM2, input.waterC)
  const conductionW = sidesW + bottomW + surfaceW
  return {
    sidesW,
    bottomW,
    surfaceW,
    evaporationW,
    evaporationUpperW,
    totalW: conductionW + evaporationW,
    totalUpperW: conductionW + evaporationUpperW,
    evaporationLPerDay: lower * evaporatingM2 * 24,
    evaporationUpperLPerDay: upper * evaporatingM2 * 24,
  }
}

/** `totalW` of `tankHeatLoss`, W, without the rest: whoever searches for a temperature asks for it hundreds of times. */
export function tankLossW(input: TankHeatInput): number {
  const { sidesW, bottomW, surfaceW, evaporatingM2 } = sumBoxes(input)
  return sidesW + bottomW + surfaceW + evaporationHeatW(ashraeEvaporationKgM2H(input) * evaporatingM2, input.waterC)
}

/** Conduction through all boxes, W, and the surface that evaporates, m². */
function sumBoxes(input: TankHeatInput) {
  const liftK = input.waterC - input.roomC
  const sum = { sidesW: 0, bottomW: 0, surfaceW: 0, evaporatingM2: 0 }
  input.boxes.forEach((box, index) => {
    const { insideLengthMm, insideWidthMm, waterDepthMm, wallMm, bottomMm, material } = box
    if (!Number.isFinite(insideLengthMm + insideWidthMm + waterDepthMm + wallMm + bottomMm))
      requireFinite({ insideLengthMm, insideWidthMm, waterDepthMm, wallMm, bottomMm })
    const floorM2 = (insideLengthMm * insideWidthMm) / 1e6
    const sidesM2 = (2 * (insideLengthMm + insideWidthMm) * waterDepthMm) / 1e6
    sum.sidesW += sidesM2 * wallTransmittanceWM2K(wallMm, material, surfaceResistanceM2KW.sides) * liftK
    sum.bottomW += floorM2 * wallTransmittanceWM2K(bottomMm, material, surfaceResistanceM2KW.bottom) * liftK
    sum.surfaceW += (floorM2 * liftK) / surfaceResistanceM2KW.surface
    sum.evaporatingM2 += floorM2 * shareEvaporating(index, input.lid)
  })
  return sum
}
