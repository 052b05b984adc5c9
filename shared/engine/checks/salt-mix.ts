import { lacking, type Candidate, type Judgement, type KindRules } from '../rule'
import type { Scene } from '../scene'
import { countPacks, saltPacks } from '../physics/salt'
import { readNumber } from '../values'
import { createRuleMaker } from './build-rule'
import { countOf } from '../counting'
import { hasAreas, noAreas, waterUses } from './shape'

function judgeAmount({ plan }: Scene, { piece }: Candidate): Judgement {
  const makesL = readNumber(piece.specs, 'makesL')
  if (makesL === undefined) return lacking(['makesL'], () => 'Nobody has recorded how much water a pack makes.')
  if (!hasAreas(plan)) return noAreas(plan)
  const { salinityPpt } = plan.goals
  const packs = countPacks(saltPacks(plan.tank.waterL, salinityPpt, makesL))
  return {
    outcome: 'pass',
    measured: packs,
    limit: null,
    say: (words) =>
      `${countOf(packs, 'pack')} for the first fill of ${words.volume(plan.tank.waterL)} at ${words.measure(salinityPpt, 'ppt')}.`,
  }
}

const rule = createRuleMaker('salt-mix')

export const saltMixRules: KindRules = {
  rules: [
    rule('amount', {
      label: 'Amount',
      worst: 'change',
      unit: 'count',
      basis: { type: 'physics', source: 'In proportion to what a pack makes at 35 ppt' },
      rule: 'Whole packs for the first fill. Every marine salt mix is acceptable to start with.',
      reads: ['makesL'],
      uses: ['goals.salinityPpt', ...waterUses],
      failLabel: 'too little',
      judge: judgeAmount,
    }),
  ],
  feltThrough: [],
  targetReads: ['makesL'],
  target: ({ plan }, { piece }) => {
    const makesL = readNumber(piece.specs, 'makesL')
    return makesL === undefined ? null : countPacks(saltPacks(plan.tank.waterL, plan.goals.salinityPpt, makesL))
  },
}
