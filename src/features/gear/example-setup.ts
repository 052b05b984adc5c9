import { resolve } from '#shared/engine/setup/resolve'
import type { Setup } from '#shared/engine/types'

/** Tanks of 20, 40, 75, 120, 180 and 300 gallons. */
const volumesL = [75.7, 151.4, 283.9, 454.2, 681.4] as const
const largestL = 1135.6

export interface ExampleSetup {
  readonly setup: Setup
  readonly volumeL: number
}

const toExample = (volumeL: number): ExampleSetup => ({
  setup: { units: 'metric', tank: { specs: {}, volumeL }, items: [] },
  volumeL,
})

/** The smallest tank that a light is not longer than; only its volume is said, all else is as it is assumed. */
export function chooseExample(lightLengthMm: number): ExampleSetup {
  const isLongEnough = ({ setup }: ExampleSetup) => resolve(setup).tank.outerLengthMm >= lightLengthMm
  return volumesL.map(toExample).find(isLongEnough) ?? toExample(largestL)
}
