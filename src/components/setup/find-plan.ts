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

/** Of a tank of which one side is known: as wide and as high as this share of its length, and filled so far. */
const usualShare = 0.4
const filledShare = 0.85

/** A volume that goes with what sizes are known, so that the drawing looks like a tank. */
function chooseExampleVolumeL({ tank }: Setup): number {
  const read = (key: string): number | undefined => {
    const value = tank.specs[key]?.value
    return typeof value === 'number' && value > 0 ? value : undefined
  }
  const [length, width, height] = [read('outerLengthMm'), read('outerWidthMm'), read('outerHeightMm')]
  const across = width ?? height
  const longest = length ?? (across === undefined ? undefined : across / usualShare)
  if (longest === undefined) return exampleVolumeL
  const usual = longest * usualShare
  return (filledShare * longest * (width ?? usual) * (height ?? usual)) / 1e6
}

/** The setup with what is assumed filled in, as it is drawn; there is always something to draw. */
export function findPlan(setup: Setup): DrawnPlan {
  try {
    return { plan: resolve(setup), isExample: false }
  } catch (error) {
    if (!(error instanceof RangeError)) throw error
  }
  return { plan: resolve({ ...setup, tank: { ...setup.tank, volumeL: chooseExampleVolumeL(setup) } }), isExample: true }
}
