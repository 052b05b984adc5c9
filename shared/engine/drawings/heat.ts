import { hasAreas } from '../checks/shape'
import { findColdestHeldC, findHeaterNeed, findStuckOn, findUnheatedC, lossAt, sumHeaterW } from '../heat-budget'
import { once } from '../scene'
import type { Setup } from '../types'
import { sceneFor } from './scene'

export interface HeatPoint {
  readonly roomC: number
  /** Heaters must give at least so much to hold the goal, W: by ASHRAE's evaporation, and by Shah's. */
  readonly needW: number
  readonly needUpperW: number
}

/** What it takes to hold the goal, from the coldest room to the warmest. */
export interface HeatDrawing {
  readonly goalC: number
  readonly points: readonly HeatPoint[]
  readonly heaterW: number
  /** Given to the water by pumps. */
  readonly gainW: number
  /** Down to this room the heaters hold the goal by the upper figure; null without heaters. */
  readonly heldC: number | null
  readonly coldestC: number
  readonly warmestC: number
  /** Where the water settles in the warmest room with no heater on. */
  readonly unheatedC: number
  /** Where it goes there if heaters never switch off; null without heaters. */
  readonly stuckOnC: number | null
}

const steps = 24

/** Null where the shape of the tank does not tell its areas. RangeError where it has neither size nor volume. */
export function drawHeat(setup: Setup): HeatDrawing | null {
  const scene = sceneFor(setup, 'heater')
  const { plan } = scene
  if (!hasAreas(plan)) return null
  const { coldestC, warmestC } = plan.room
  const goalC = plan.goals.temperatureC
  const heaterW = sumHeaterW(setup.items.filter(({ state }) => state !== 'gone'))
  const { gainW } = once(scene, findHeaterNeed)
  const points = Array.from({ length: steps + 1 }, (_, step) => {
    const roomC = coldestC + (step / steps) * (warmestC - coldestC)
    const loss = lossAt(plan, goalC, roomC)
    return {
      roomC,
      needW: Math.max(0, loss.totalW - gainW),
      needUpperW: Math.max(0, loss.totalUpperW - gainW),
    }
  })
  return {
    goalC,
    points,
    heaterW,
    gainW,
    heldC: heaterW > 0 ? findColdestHeldC(scene, heaterW, 'totalUpperW') : null,
    coldestC,
    warmestC,
    unheatedC: findUnheatedC(scene),
    stuckOnC: heaterW > 0 ? findStuckOn(scene, heaterW).equilibriumC : null,
  }
}
