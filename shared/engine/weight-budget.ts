import { filledMassKg, floorPressureKPa, netVolumeL, seawaterMassKg, shellMassKg } from './physics/weight'
import { sandMassKg } from './setup/resolve'
import type { Plan } from './setup/plan'

export interface FilledWeight {
  readonly shellKg: number
  readonly waterKg: number
  readonly rockKg: number
  readonly sandKg: number
  readonly totalKg: number
}

/**
 * What the tank weighs filled, kg: the shell as an open box, the water that rock and sand leave, and those. Rock and sand
 * by the goals, whether given or assumed. A sump stands on its own and is left out.
 */
export function weighFilled({ tank, goals }: Plan): FilledWeight {
  const displayL = (tank.insideLengthMm * tank.insideWidthMm * tank.waterLineMm) / 1e6
  const { rockKg } = goals
  const sandKg = sandMassKg(tank, goals.sandDepthMm)
  const waterKg = seawaterMassKg(netVolumeL(displayL, rockKg, sandKg), goals.salinityPpt, goals.temperatureC)
  const shellKg = tank.dryMassKg ?? shellMassKg(tank)
  return { shellKg, waterKg, rockKg, sandKg, totalKg: filledMassKg({ shellKg, waterKg, rockKg, sandKg }) }
}

/** Pressure of tank and stand on the floor under the stand, or under the tank where there is none, kPa. */
export function findFloorPressureKPa(
  plan: Plan,
  standKg: number,
  footprint?: { lengthMm: number; widthMm: number },
): number {
  const { outerLengthMm, outerWidthMm } = plan.tank
  const { lengthMm, widthMm } = footprint ?? { lengthMm: outerLengthMm, widthMm: outerWidthMm }
  return floorPressureKPa(weighFilled(plan).totalKg + standKg, lengthMm, widthMm)
}
