import { doubtTank, type Doubt } from '../doubt'
import type { Judgement } from '../rule'
import type { Plan } from '../setup/plan'
import { readNumber } from '../values'

/** Whether the tank's areas follow from its outside size: other shapes are recorded, and their formulas are on the way. */
export const hasAreas = ({ tank }: Plan): boolean => tank.shape === 'rectangle' || tank.shape === 'cube'

export const noAreas = ({ tank }: Plan): Judgement => ({
  outcome: 'nodata',
  missing: [],
  say: () => `Areas and volumes of a ${tank.shape.replaceAll('-', ' ')} tank cannot be computed yet.`,
})

/** Whether somebody stated the tank's volume; otherwise it follows from the sizes in `grossUses`. */
export const isVolumeStated = ({ setup }: Plan): boolean =>
  setup.tank.volumeL !== undefined || readNumber(setup.tank.specs, 'nominalVolumeL') !== undefined

/** A volume that somebody stated is what makers' ratings speak of and no measurement; one that was computed has its doubts. */
export const doubtRated = (plan: Plan): readonly Doubt[] =>
  isVolumeStated(plan) ? [] : [doubtTank(plan.tank.ratedL, plan.tank)]

export const hasRatedVolume = (plan: Plan): boolean => isVolumeStated(plan) || hasAreas(plan)

/** Setup paths that the volume inside the tank, and its sump, rests on. */
export const grossUses: readonly string[] = [
  'tank.waterLineMm',
  'tank.wallMm',
  'tank.filtration',
  'tank.sump.lengthMm',
  'tank.sump.widthMm',
  'tank.sump.waterDepthMm',
  'tank.shape',
]

/** The same for the water that is moved and salted: less rock, and sand over the display, where both are known. */
export const waterUses: readonly string[] = [
  'tank.outerLengthMm',
  'tank.outerWidthMm',
  'tank.outerHeightMm',
  ...grossUses,
  'tank.displayLengthMm',
  'tank.displayWidthMm',
]

/** Setup paths of the display's size in plan. */
export const displayUses: readonly string[] = [
  'tank.displayLengthMm',
  'tank.displayWidthMm',
  'tank.outerLengthMm',
  'tank.outerWidthMm',
  'tank.wallMm',
  'tank.chambers.*.widthMm',
  'tank.shape',
]
