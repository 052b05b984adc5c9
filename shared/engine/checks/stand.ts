import { lacking, type Candidate, type Judgement, type KindRules, type Rule } from '../rule'
import type { Scene } from '../scene'
import { practiceBasis } from '../thresholds'
import type { Value } from '../types'
import { readMeasure } from '../values'
import { compareFootprints, describeFootprint, massBasis, rateStand } from './support'

/** The setup's tank as it stands on something: its outside size with where that comes from. */
function measureTank({ plan }: Scene): readonly [Value<number>, Value<number>] {
  const { tank } = plan
  const size = (value: number): Value<number> => ({
    value,
    source: tank.source,
    ...(tank.plusMinus !== undefined && { plusMinus: tank.plusMinus }),
  })
  return [size(tank.outerLengthMm), size(tank.outerWidthMm)]
}

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
      uses: ['tank.outerLengthMm', 'tank.outerWidthMm', 'tank.rim'],
      failLabel: 'too small for the tank',
      judge: judgeFootprint,
    }),
    rule('load', {
      label: 'Load rating',
      unit: 'kg',
      basis: massBasis,
      rule: 'Its rating is at least the filled weight of the tank: shell, water, rock and sand. Without a rating, what its maker says it is made for; else nobody can tell.',
      reads: ['loadRatingKg', 'madeForTanks', 'madeForVolumeL'],
      uses: [
        'goals.rockKg',
        'goals.sandDepthMm',
        'tank.waterLineMm',
        'tank.outerLengthMm',
        'tank.outerWidthMm',
        'tank.outerHeightMm',
        'tank.wallMm',
        'tank.bottomMm',
        'tank.material',
        'goals.salinityPpt',
      ],
      failLabel: 'rated for less weight',
      judge: ({ plan }, { piece }) => rateStand(piece.specs, plan, ['loadRatingKg']),
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
