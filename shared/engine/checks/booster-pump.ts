import { lacking, type Candidate, type Judgement, type KindRules } from '../rule'
import type { Scene } from '../scene'
import { beSure, doubt } from '../doubt'
import { probabilityAtLeast } from '../physics/conformance'
import { readFlag, readMeasure, readNumber } from '../values'
import { createRuleMaker } from './build-rule'
import { doubtFeed, doubtOutput, findOutputLpd } from './ro-unit'

const findUnit = ({ others }: Scene) => others.find((item) => item.piece.kind === 'ro-unit')

const noUnit: Judgement = {
  outcome: 'nodata',
  missing: [],
  say: () => 'There is no RO/DI unit in the setup to hold it against.',
}

function judgeInlet({ plan }: Scene, { piece }: Candidate): Judgement {
  const needed = readMeasure(piece.specs, 'inletMinKPa')
  if (!needed) return lacking(['inletMinKPa'], () => 'Nobody has recorded the inlet pressure it needs.')
  const { feedKPa } = plan.water
  const least = needed.value
  return {
    outcome: feedKPa >= least ? 'pass' : 'fail',
    measured: feedKPa,
    limit: least,
    ...beSure(
      (u) => probabilityAtLeast(feedKPa, least, u),
      () => [doubtFeed(plan), doubt(needed, 'other', 'check the pressure it needs')],
    ),
    say: (words) =>
      `Needs ${words.measure(least, 'kPa')} at its inlet, and your tap has ${words.measure(feedKPa, 'kPa')}.`,
  }
}

function judgePressure(scene: Scene, { piece }: Candidate): Judgement {
  const given = readMeasure(piece.specs, 'outletKPa')
  if (!given) return lacking(['outletKPa'], () => 'Nobody has recorded the pressure it gives.')
  const unit = findUnit(scene)
  if (!unit) return noUnit
  const needed = readMeasure(unit.piece.specs, 'minFeedKPa')
  if (!needed)
    return { outcome: 'nodata', missing: [], say: () => 'Nobody has recorded the pressure that the RO/DI unit needs.' }
  const [outlet, least] = [given.value, needed.value]
  return {
    outcome: outlet >= least ? 'pass' : 'fail',
    measured: outlet,
    limit: least,
    ...beSure(
      (u) => probabilityAtLeast(outlet, least, u),
      () => [
        doubt(given, 'other', 'check the pressure it gives'),
        doubt(needed, 'other', 'check the pressure that the RO/DI unit needs'),
      ],
    ),
    say: (words) => `Gives ${words.measure(outlet, 'kPa')}, and the RO/DI unit needs ${words.measure(least, 'kPa')}.`,
  }
}

function judgeFlow(scene: Scene, { piece, quantity }: Candidate): Judgement {
  const most = readMeasure(piece.specs, 'maxLpd')
  const missing = [
    ...(most ? [] : ['maxLpd']),
    ...(readNumber(piece.specs, 'outletKPa') === undefined ? ['outletKPa'] : []),
  ]
  if (!most || missing.length > 0)
    return lacking(missing, () => `Nobody has recorded the ${most ? 'pressure it gives' : 'flow it delivers'}.`)
  const unit = findUnit(scene)
  if (!unit) return noUnit
  const hasOwnBooster = readFlag(unit.piece.specs, 'boosterIncluded') ?? false
  const others = [{ id: 'candidate', piece, quantity, state: 'planned' as const }]
  const output = findOutputLpd(scene, unit.piece.specs, { hasOwnBooster, others })
  const waste = readNumber(unit.piece.specs, 'wasteRatio')
  if (typeof output !== 'number' || waste === undefined)
    return {
      outcome: 'nodata',
      missing: [],
      say: () => 'The RO/DI unit’s output cannot be computed from what is recorded of it.',
    }
  const deliveredLpd = most.value * quantity
  const neededLpd = output * unit.quantity * (1 + waste)
  return {
    outcome: deliveredLpd >= neededLpd ? 'pass' : 'fail',
    measured: deliveredLpd,
    limit: neededLpd,
    ...beSure(
      (u) => probabilityAtLeast(deliveredLpd, neededLpd, u),
      () => [doubt(most, 'other', 'check the flow it delivers', quantity), doubtOutput(unit.piece.specs, neededLpd)],
    ),
    say: (words) =>
      `Delivers ${words.measure(deliveredLpd, 'L/d')}, and the RO/DI unit takes ${words.measure(neededLpd, 'L/d')} with its waste.`,
  }
}

const rule = createRuleMaker('booster-pump')

export const boosterPumpRules: KindRules = {
  rules: [
    rule('pressure', {
      label: 'Outlet pressure',
      worst: 'fail',
      unit: 'kPa',
      limitIs: 'least',
      rule: 'It gives at least the pressure that the RO/DI unit needs.',
      reads: ['outletKPa'],
      failLabel: 'too weak for the RO/DI unit',
      judge: judgePressure,
    }),
    rule('inlet', {
      label: 'Inlet pressure',
      worst: 'fail',
      unit: 'kPa',
      limitIs: 'least',
      rule: 'The tap gives at least the pressure that it needs itself.',
      reads: ['inletMinKPa'],
      uses: ['water.feedKPa'],
      failLabel: 'needing more pressure at the tap',
      judge: judgeInlet,
    }),
    rule('flow', {
      label: 'Flow',
      worst: 'fail',
      unit: 'L/d',
      limitIs: 'least',
      rule: 'It delivers what the RO/DI unit makes and wastes.',
      reads: ['maxLpd', 'outletKPa'],
      uses: ['water.feedTempC', 'water.feedTdsPpm', 'water.feedKPa'],
      failLabel: 'delivering too little',
      judge: judgeFlow,
    }),
  ],
  feltThrough: ['outletKPa', 'powerW', 'plugs'],
}
