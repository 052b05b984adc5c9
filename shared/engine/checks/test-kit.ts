import { lacking, type Candidate, type Judgement, type KindRules } from '../rule'
import type { Scene } from '../scene'
import { readSet } from '../values'
import { createRuleMaker } from './build-rule'

/** What the cycle of a new tank is followed by. */
export const cycleParameters = ['ammonia', 'nitrite', 'nitrate'] as const

function judgeCoverage({ others }: Scene, { piece }: Candidate): Judgement {
  const own = readSet<string>(piece.specs, 'parameters')
  if (own === undefined) return lacking(['parameters'], () => 'Nobody has recorded what it measures.')
  const there = others
    .filter((item) => item.piece.kind === 'test-kit')
    .flatMap((item) => readSet<string>(item.piece.specs, 'parameters') ?? [])
  const missing = cycleParameters.filter((parameter) => !own.includes(parameter) && !there.includes(parameter))
  return {
    outcome: missing.length > 0 ? 'change' : 'pass',
    measured: own,
    ...(missing.length > 0 && { asks: { need: 'cycle-tests', amount: missing.length, unit: 'count' as const } }),
    say: () => {
      const list = own.join(', ')
      if (missing.length === 0)
        return `Measures ${list}${there.length > 0 ? '; with the other kits nothing is missing for the cycle' : ''}.`
      return `Measures ${list}; a test for ${missing.join(' and ')} is still missing.`
    },
  }
}

const rule = createRuleMaker('test-kit')

export const testKitRules: KindRules = {
  rules: [
    rule('coverage', {
      label: 'What it measures',
      worst: 'change',
      unit: null,
      rule: 'With the other kits ammonia, nitrite and nitrate.',
      reads: ['parameters'],
      failLabel: 'measuring too little',
      judge: judgeCoverage,
    }),
  ],
  feltThrough: ['parameters'],
}
