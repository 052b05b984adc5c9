import type { Plan } from '../setup/plan'
import type { Value } from '../types'
import { readMeasure } from '../values'

type Size = 'outerLengthMm' | 'outerWidthMm' | 'outerHeightMm' | 'wallMm'

/** A size of the setup's tank with where it comes from; one that nobody said is an estimate. */
export const findTankSize = ({ setup, tank }: Plan, key: Size): Value<number> =>
  readMeasure(setup.tank.specs, key) ?? { value: tank[key], source: 'estimate' }
