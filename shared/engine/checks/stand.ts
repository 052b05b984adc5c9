import { lacking, type Candidate, type Judgement, type KindRules, type Rule } from '../rule'
import type { Scene } from '../scene'
import { practiceBasis } from '../thresholds'
import type { Value } from '../types'
import { readMeasure } from '../values'
import { displayUses, hasAreas, noAreas } from './shape'
import { compareFootprints, describeFootprint, isMadeForTank, massBasis, rateStand } from './support'
import { findTankSize } from './tank-size'

/** The setup's tank as it stands on something: its outside size with where that comes from. */
export const measureTank = ({ plan }: Scene): readonly [Value<number>, Value<number>] => [
  findTankSize(plan, 'outerLengthMm'),
  findTankSize(plan, 'outerWidthMm'),
]

function judgeFootprint(scene: Scene, { piece }: Candidate): Judgement {
  const length = readMeasure(piece.specs, 'topLengthMm')
  const width = readMeasure(piece.specs, 'topWidthMm')
  const missing = [...(length ? [] : ['topLengthMm']), ...(width ? [] : ['topWidthMm'])]
  if (!length || !width) return lacking(missing, () => 'Nobody has recorded the size of its top yet.')
  const compared = compareFootprints(measureTank(scene), [length, width])
  const level =
    scene.plan.tank.rim === 'rimless'
      ? [() => 'A rimless tank needs a level, flat top, and the mat that its maker asks for, if any.']
      : []
  const found = describeFootprint(compared, 'stand')
  return { ...found, cautions: [...(found.cautions ?? []), ...level] }
}

const loadUses: readonly string[] = [
  'goals.rockKg',
  'goals.sandDepthMm',
  'tank.waterLineMm',
  'tank.outerHeightMm',
  'tank.bottomMm',
  'tank.material',
  ...displayUses,
  'goals.salinityPpt',
  'goals.temperatureC',
]

/** A stand that is too weak is not made strong by filling the tank less: nobody can be relied on to. */
const restsOfOverload = (): readonly string[] => loadUses.filter((path) => path !== 'tank.waterLineMm')

/** The filled weight follows from areas; a stand that is made for this very tank holds it whatever it weighs. */
function judgeLoad({ plan }: Scene, { piece }: Candidate): Judgement {
  if (hasAreas(plan)) {
    const rated = rateStand(piece.specs, plan, ['loadRatingKg'])
    return rated.outcome === 'fail' ? { ...rated, rests: restsOfOverload } : rated
  }
  if (!isMadeForTank(piece.specs, plan)) return noAreas(plan)
  return { outcome: 'pass', say: () => 'The stand is made for this tank.' }
}

const rule = (check: string, parts: Omit<Rule, 'id' | 'worst'>): Rule => ({
  id: `stand.${check}`,
  worst: 'fail',
  ...parts,
})

export const standRules: KindRules = {
  rules: [
    rule('footprint', {
      label: 'Top under the tank',
      unit: 'mm',
      basis: practiceBasis,
      rule: 'The top is at least as long and as wide as the tank, turned by 90° if need be; far larger is a caution.',
      reads: ['topLengthMm', 'topWidthMm'],
      uses: ['tank.outerLengthMm', 'tank.outerWidthMm'],
      failLabel: 'too small for the tank',
      judge: judgeFootprint,
    }),
    rule('load', {
      label: 'Load rating',
      unit: 'kg',
      basis: massBasis,
      rule: 'Its rating is at least the filled weight of the tank: shell, water, rock and sand. Without a rating, what its maker says it is made for; else nobody can tell.',
      reads: ['loadRatingKg', 'madeForTanks', 'madeForVolumeL'],
      uses: loadUses,
      failLabel: 'rated for less weight',
      judge: judgeLoad,
    }),
  ],
  targetReads: ['topLengthMm', 'topWidthMm'],
  target: (scene, { piece }) => {
    const length = readMeasure(piece.specs, 'topLengthMm')
    const width = readMeasure(piece.specs, 'topWidthMm')
    if (!length || !width) return null
    const { spareMm, widestMm } = compareFootprints(measureTank(scene), [length, width])
    return spareMm + widestMm
  },
  feltThrough: ['topLengthMm', 'topWidthMm', 'loadRatingKg', 'madeForTanks', 'madeForVolumeL', 'massKg'],
}
