import { lacking, type Candidate, type Judgement } from '../rule'
import type { Scene } from '../scene'
import type { Plan } from '../setup/plan'
import type { Item, Value } from '../types'
import { readMeasure } from '../values'
import { weighFilled } from '../weight-budget'
import { compareFootprints, describeFootprint, rateStand, warnWeight } from './support'

/** The top of what carries the tank: the setup's stand, or furniture of a size that was given. */
interface Support {
  readonly top: readonly [Value<number>, Value<number>]
  readonly name: 'stand' | 'furniture'
}

const findStand = (others: readonly Item[]) => others.find(({ piece }) => piece.kind === 'stand')

/** Whether anything is known of what carries the tank. */
export const isCarried = ({ plan, others }: Scene): boolean =>
  findStand(others) !== undefined || plan.setup.support !== undefined

/** Null: nothing known carries it, or its size was not said. */
function findSupport({ plan, others }: Scene): Support | 'unmeasured stand' | null {
  const stand = findStand(others)
  if (stand) {
    const length = readMeasure(stand.piece.specs, 'topLengthMm')
    const width = readMeasure(stand.piece.specs, 'topWidthMm')
    return length && width ? { top: [length, width], name: 'stand' } : 'unmeasured stand'
  }
  const { support } = plan.setup
  if (support?.lengthMm === undefined || support.widthMm === undefined) return null
  const given = (value: number): Value<number> => ({ value, source: 'measured' })
  return { top: [given(support.lengthMm), given(support.widthMm)], name: support.kind }
}

/** Whether the tank's footprint stands wholly on the setup's stand or furniture, turned by 90° if need be. */
export function judgeFootprint(scene: Scene, { piece }: Candidate): Judgement | null {
  const support = findSupport(scene)
  if (support === null) return null
  if (support === 'unmeasured stand')
    return { outcome: 'nodata', missing: [], say: () => 'Nobody has recorded the size of the stand’s top.' }
  const length = readMeasure(piece.specs, 'outerLengthMm')
  const width = readMeasure(piece.specs, 'outerWidthMm')
  const missing = [...(length ? [] : ['outerLengthMm']), ...(width ? [] : ['outerWidthMm'])]
  if (!length || !width) return lacking(missing, () => 'Nobody has recorded its outside size yet.')
  return describeFootprint(compareFootprints([length, width], support.top), support.name)
}

/** Whether the stand is rated for the filled weight of `filled`, which is the setup with this tank in it. */
export function judgeLoad(scene: Scene, filled: Plan): Judgement {
  const stand = findStand(scene.others)
  if (stand) return rateStand(stand.piece.specs, filled, [])
  const { totalKg } = weighFilled(filled)
  return {
    outcome: 'pass',
    measured: totalKg,
    limit: null,
    cautions: [warnWeight(totalKg)],
    say: (words) => `Filled, it weighs about ${words.mass(totalKg)}; what carries it must hold that.`,
  }
}
