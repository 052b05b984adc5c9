import { getAttribute } from '../../kinds/index'
import { joinNames, sayUncounted } from '../counting'
import { lacking, type Candidate, type Judgement, type KindRules } from '../rule'
import type { Scene } from '../scene'
import type { Item } from '../types'
import { readSet } from '../values'
import { createRuleMaker } from './build-rule'

/** What the cycle of a new tank is followed by. */
export const cycleParameters = ['ammonia', 'nitrite', 'nitrate'] as const

/** The names of parameters as they are written: "pH". */
function nameParameters(parameters: readonly string[]): string {
  const attribute = getAttribute('test-kit', 'parameters')
  const options = attribute && 'options' in attribute ? attribute.options : []
  return joinNames(parameters.map((one) => options.find(({ value }) => value === one)?.label ?? one))
}

const listKits = (others: readonly Item[]) =>
  others.filter((item) => item.piece.kind === 'test-kit').map((item) => item.piece.specs)

/** What the cycle is followed by and no kit of the setup measures. */
function findWanted({ others }: Scene): readonly string[] {
  const there = listKits(others).flatMap((specs) => readSet<string>(specs, 'parameters') ?? [])
  return cycleParameters.filter((parameter) => !there.includes(parameter))
}

function judgeCoverage(scene: Scene, { piece }: Candidate): Judgement {
  const own = readSet<string>(piece.specs, 'parameters')
  if (own === undefined) return lacking(['parameters'], () => 'Nobody has recorded what it measures.')
  const unknown = listKits(scene.others).filter((specs) => specs['parameters'] === undefined).length
  const missing = findWanted(scene).filter((parameter) => !own.includes(parameter))
  const isAlone = cycleParameters.every((parameter) => own.includes(parameter))
  return {
    outcome: missing.length > 0 ? 'change' : 'pass',
    measured: own,
    ...(missing.length > 0 && {
      asks: { need: 'cycle-tests', amount: missing.length, unit: 'count' as const, lacks: missing },
    }),
    cautions: unknown > 0 ? [sayUncounted(unknown, 'parameters')] : [],
    say: () => {
      const measures = own.length > 0 ? `Measures ${nameParameters(own)}` : 'Measures nothing that is asked for'
      if (missing.length > 0) return `${measures}; a test for ${nameParameters(missing)} is still missing.`
      return isAlone ? `${measures}.` : `${measures}; with the other kits nothing is missing for the cycle.`
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
  joint: { key: 'parameters', findWanted },
}
