import { defaults } from '../setup/defaults'
import type { Plan } from '../setup/plan'
import type { Filled } from './fill-types'

/**
 * Rock and sand as goals where the setup holds them as packs: a worksheet has no pieces, and the water that they leave is
 * to be the same.
 */
export function tankGoals({ tank, goals, setup }: Plan): Filled {
  const takenL = tank.grossL - tank.waterL
  if (takenL <= 0 || (setup.goals?.rockKg !== undefined && setup.goals.sandDepthMm !== undefined)) return {}
  const sandKg = Math.max(0, takenL - goals.rockKg / defaults.rockSolidDensityKgL) * defaults.sandSolidDensityKgL
  const depthMm = (sandKg * 1e6) / (tank.displayLengthMm * tank.displayWidthMm * defaults.sandBulkDensityKgL)
  return { 'goals.rockKg': goals.rockKg, 'goals.sandDepthMm': depthMm }
}
