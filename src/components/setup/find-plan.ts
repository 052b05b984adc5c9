import { resolve } from '#shared/engine/setup/resolve'
import type { Plan } from '#shared/engine/setup/plan'
import type { Setup } from '#shared/engine/types'

/** Drawn where nothing is said of the tank yet: the volume that beginners' lists start from. */
export const exampleVolumeL = 75.7

export interface DrawnPlan {
  readonly plan: Plan
  /** Neither size nor volume is known: the drawing is an example, and there can be no answers. */
  readonly isExample: boolean
}

/** The setup with what is assumed filled in, as it is drawn; there is always something to draw. */
export function findPlan(setup: Setup): DrawnPlan {
  try {
    return { plan: resolve(setup), isExample: false }
  } catch (error) {
    if (!(error instanceof RangeError)) throw error
  }
  return { plan: resolve({ ...setup, tank: { ...setup.tank, volumeL: exampleVolumeL } }), isExample: true }
}
