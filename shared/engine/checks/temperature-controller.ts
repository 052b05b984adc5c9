import { sumHeaterW } from '../heat-budget'
import { lacking, type Candidate, type Judgement, type KindRules, type Rule } from '../rule'
import type { Scene } from '../scene'
import { practiceBasis } from '../thresholds'
import { readMeasure, readNumber } from '../values'
import { countOf } from '../counting'
import { beSure, doubt } from '../doubt'
import { probabilityAtLeast } from '../physics/conformance'

const heatersOf = ({ others }: Scene) => others.filter((item) => item.piece.kind === 'heater')

function judgeLoad(scene: Scene, { piece, quantity }: Candidate): Judgement {
  const load = readMeasure(piece.specs, 'maxLoadW')
  if (!load) return lacking(['maxLoadW'], () => 'Nobody has recorded the load it can switch.')
  const fedW = sumHeaterW(scene.others)
  const capacityW = load.value * quantity
  const powers = heatersOf(scene).map(({ piece: heater }) => readNumber(heater.specs, 'powerW'))
  const strongestW = Math.max(0, ...powers.filter((power) => power !== undefined))
  if (strongestW > load.value)
    return {
      outcome: 'fail',
      measured: load.value,
      limit: strongestW,
      ...beSure(
        (u) => probabilityAtLeast(load.value, strongestW, u),
        () => [doubt(load, 'other', 'check the load it can switch')],
      ),
      say: (words) => `Switches ${words.power(load.value)}, too little for a heater of ${words.power(strongestW)}.`,
    }
  if (capacityW >= fedW && powers.includes(undefined))
    return lacking([], () => 'A heater in the setup states no power, so what it has to switch is not known.')
  return {
    outcome: capacityW >= fedW ? 'pass' : 'fail',
    measured: capacityW,
    limit: fedW,
    ...beSure(
      (u) => probabilityAtLeast(capacityW, fedW, u),
      () => [doubt(load, 'other', 'check the load it can switch', quantity)],
    ),
    say: (words) =>
      fedW === 0
        ? `Switches up to ${words.power(capacityW)}; there is no heater in the setup to hold against it.`
        : capacityW >= fedW
          ? `Switches ${words.power(capacityW)}, and the heaters take ${words.power(fedW)}.`
          : `Switches ${words.power(capacityW)}, too little for heaters of ${words.power(fedW)}.`,
  }
}

function judgeOutlets(scene: Scene, { piece, quantity }: Candidate): Judgement {
  const outlets = readNumber(piece.specs, 'outlets')
  if (outlets === undefined) return lacking(['outlets'], () => 'Nobody has recorded how many outlets it has.')
  const plugs = heatersOf(scene).reduce(
    (sum, item) => sum + item.quantity * (readNumber(item.piece.specs, 'plugs') ?? 1),
    0,
  )
  return {
    outcome: outlets * quantity >= plugs ? 'pass' : 'fail',
    measured: outlets * quantity,
    limit: plugs,
    say: () =>
      plugs === 0
        ? `Has ${countOf(outlets * quantity, 'outlet')}; there is no heater in the setup to plug in.`
        : `Has ${countOf(outlets * quantity, 'outlet')} for ${countOf(plugs, 'heater plug')}.`,
  }
}

function judgeRange({ plan }: Scene, { piece }: Candidate): Judgement {
  const min = readNumber(piece.specs, 'rangeMinC')
  const max = readNumber(piece.specs, 'rangeMaxC')
  const missing = [...(min === undefined ? ['rangeMinC'] : []), ...(max === undefined ? ['rangeMaxC'] : [])]
  const goalC = plan.goals.temperatureC
  if ((min !== undefined && goalC < min) || (max !== undefined && goalC > max))
    return {
      outcome: 'fail',
      measured: goalC,
      limit: min !== undefined && max !== undefined ? [min, max] : (min ?? max ?? null),
      ...((min === undefined || max === undefined) && { margin: null }),
      say: (words) => {
        const range =
          min !== undefined && max !== undefined
            ? `its range is ${words.pair([min, max], 'C')}`
            : min !== undefined
              ? `it starts at ${words.temperature(min)}`
              : `it ends at ${words.temperature(max ?? goalC)}`
        return `Cannot be set to ${words.temperature(goalC)}: ${range}.`
      },
    }
  if (min === undefined || max === undefined)
    return lacking(missing, () => 'Nobody has recorded the range it can be set to.')
  return {
    outcome: 'pass',
    measured: goalC,
    limit: [min, max],
    say: (words) => `Can be set to ${words.temperature(goalC)}: its range is ${words.pair([min, max], 'C')}.`,
  }
}

const rule = (check: string, parts: Omit<Rule, 'id' | 'worst' | 'basis'>): Rule => ({
  id: `temperature-controller.${check}`,
  worst: 'fail',
  basis: practiceBasis,
  ...parts,
})

export const temperatureControllerRules: KindRules = {
  rules: [
    rule('load', {
      label: 'Heaters it can switch',
      unit: 'W',
      limitIs: 'least',
      rule: 'Its greatest load is at least the power of the heaters it feeds.',
      reads: ['maxLoadW'],
      uses: [],
      failLabel: 'too weak for the heaters',
      judge: judgeLoad,
    }),
    rule('outlets', {
      label: 'Outlets for heaters',
      unit: 'count',
      limitIs: 'least',
      rule: 'It has an outlet for each heater plug.',
      reads: ['outlets'],
      uses: [],
      failLabel: 'with too few outlets',
      judge: judgeOutlets,
    }),
    rule('range', {
      label: 'Range',
      unit: 'C',
      rule: 'Its range holds the goal temperature.',
      reads: ['rangeMinC', 'rangeMaxC'],
      uses: ['goals.temperatureC'],
      failLabel: 'unable to hold the temperature',
      judge: judgeRange,
    }),
  ],
}
