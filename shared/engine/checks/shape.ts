import type { Judgement } from '../rule'
import type { Plan } from '../setup/plan'

/** Whether the tank's areas follow from its outside size: other shapes are recorded, and their formulas are on the way. */
export const hasAreas = ({ tank }: Plan): boolean => tank.shape === 'rectangle' || tank.shape === 'cube'

export const noAreas = ({ tank }: Plan): Judgement => ({
  outcome: 'nodata',
  missing: [],
  say: () => `The surface of a ${tank.shape.replaceAll('-', ' ')} tank cannot be computed yet.`,
})
