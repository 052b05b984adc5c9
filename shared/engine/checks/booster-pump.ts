import { lacking, type Candidate, type Judgement, type KindRules } from '../rule'
import type { Scene } from '../scene'
import { readFlag, readNumber } from '../values'
import { createRuleMaker } from './build-rule'
import { findOutputLpd } from './ro-unit'

const findUnit = ({ others }: Scene) => others.find((item) => item.piece.kind === 'ro-unit')

const noUnit: Judgement = {
  outcome: 'nodata',
  missing: [],
  say: () => 'There is no RO/DI unit in the setup to hold it against.',
}

function judgeInlet({ plan }: Scene, { piece }: Candidate): Judgement {
  const least = readNumber(piece.specs, 'inletMinKPa')
  if (least === undefined) return lacking(['inletMinKPa'], () => 'Nobody has recorded the inlet pressure it needs.')
  const { feedKPa } = plan.water
  return {
    outcome: feedKPa >= least ? 'pass' : 'fail',
    measured: feedKPa,
    limit: least,
    say: (words) =>
      `Needs ${words.measure(least, 'kPa')} at its inlet, and your tap has ${words.measure(feedKPa, 'kPa')}.`,
  }
}

function judgePressure(scene: Scene, { piece }: Candidate): Judgement {
  const outlet = readNumber(piece.specs, 'outletKPa')
  if (outlet === undefined) return lacking(['outletKPa'], () => 'Nobody has recorded the pressure it gives.')
  const unit = findUnit(scene)
  if (!unit) return noUnit
  const least = readNumber(unit.piece.specs, 'minFeedKPa')
  if (least === undefined)
    return { outcome: 'nodata', missing: [], say: () => 'Nobody has recorded the pressure that the RO/DI unit needs.' }
  return {
    outcome: outlet >= least ? 'pass' : 'fail',
    measured: outlet,
    limit: least,
    say: (words) => `Gives ${words.measure(outlet, 'kPa')}, and the RO/DI unit needs ${words.measure(least, 'kPa')}.`,
  }
}

function judgeFlow(scene: Scene, { piece, quantity }: Candidate): Judgement {
  const most = readNumber(piece.specs, 'maxLpd')
  const missing = [
    ...(most === undefined ? ['maxLpd'] : []),
    ...(readNumber(piece.specs, 'outletKPa') === undefined ? ['outletKPa'] : []),
  ]
  if (most === undefined || missing.length > 0)
    return lacking(
      missing,
      () => `Nobody has recorded the ${most === undefined ? 'flow it delivers' : 'pressure it gives'}.`,
    )
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
      say: () => 'Nobody has recorded all that the RO/DI unit’s output is computed from.',
    }
  const deliveredLpd = most * quantity
  const neededLpd = output * unit.quantity * (1 + waste)
  return {
    outcome: deliveredLpd >= neededLpd ? 'pass' : 'fail',
    measured: deliveredLpd,
    limit: neededLpd,
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
