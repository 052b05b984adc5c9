import { lacking, type Candidate, type Judgement, type KindRules } from '../rule'
import type { Scene } from '../scene'
import { membraneFlowLpd } from '../physics/membrane'
import type { Item, Specs } from '../types'
import { readFlag, readNumber, readSet } from '../values'
import { createRuleMaker } from './build-rule'

const stageNames: Readonly<Record<string, string>> = {
  sediment: 'sediment',
  carbon: 'carbon',
  membrane: 'membrane',
  deionisation: 'deionisation',
}

function judgeStages(_scene: Scene, { piece }: Candidate): Judgement {
  const stages = readSet<string>(piece.specs, 'stages')
  if (stages === undefined) return lacking(['stages'], () => 'Nobody has recorded its stages.')
  if (!stages.includes('membrane'))
    return { outcome: 'fail', measured: stages, say: () => 'Has no membrane: it cannot make pure water.' }
  const missing = Object.keys(stageNames).filter((stage) => !stages.includes(stage))
  return {
    outcome: missing.length > 0 ? 'change' : 'pass',
    measured: stages,
    ...(missing.length > 0 && { asks: { need: 'filter-stage', amount: missing.length, unit: 'count' as const } }),
    say: () =>
      missing.length > 0
        ? `Add a stage: ${missing.map((stage) => stageNames[stage]).join(' and ')}.`
        : 'Sediment, carbon, membrane and deionisation.',
  }
}

const findBooster = (others: readonly Item[]) => others.find((item) => item.piece.kind === 'booster-pump')

/** Pressure at the membrane, kPa: its rated one behind a booster of its own, a booster's outlet, else the tap's. */
function findPressureKPa({ plan, others }: Scene, specs: Specs): number {
  const { feedKPa } = plan.water
  if (readFlag(specs, 'boosterIncluded')) return Math.max(feedKPa, readNumber(specs, 'testPressureKPa') ?? feedKPa)
  const booster = findBooster(others)
  return Math.max(feedKPa, (booster && readNumber(booster.piece.specs, 'outletKPa')) ?? feedKPa)
}

/** Litres a day that the unit makes at the setup's tap; the attributes it lacks where that cannot be told. */
export function findOutputLpd(scene: Scene, specs: Specs): number | readonly string[] {
  const [ratedLpd, testPressureKPa, testTempC, wasteRatio] = [
    'membraneLpd',
    'testPressureKPa',
    'testTempC',
    'wasteRatio',
  ].map((key) => readNumber(specs, key))
  if (ratedLpd === undefined || testPressureKPa === undefined || testTempC === undefined || wasteRatio === undefined)
    return ['membraneLpd', 'testPressureKPa', 'testTempC', 'wasteRatio'].filter(
      (key) => readNumber(specs, key) === undefined,
    )
  const testTdsPpm = readNumber(specs, 'testTdsPpm')
  const { feedTempC, feedTdsPpm } = scene.plan.water
  return membraneFlowLpd(
    { ratedLpd, testPressureKPa, testTempC, ...(testTdsPpm !== undefined && { testTdsPpm }) },
    { feedKPa: findPressureKPa(scene, specs), feedTempC, feedTdsPpm, wasteRatio },
  )
}

function judgeOutput(scene: Scene, { piece, quantity }: Candidate): Judgement {
  const found = findOutputLpd(scene, piece.specs)
  if (typeof found !== 'number')
    return lacking(found, () => 'Nobody has recorded all that its output is computed from.')
  const outputLpd = found * quantity
  const needLpd = scene.plan.water.litresPerWeek / 7
  const firstFillDays = outputLpd > 0 ? scene.plan.tank.waterL / outputLpd : null
  return {
    outcome: outputLpd >= needLpd ? 'pass' : 'fail',
    measured: outputLpd,
    limit: needLpd,
    say: (words) => {
      const fill = firstFillDays === null ? '' : `; the first fill takes ${words.number(firstFillDays, 'count')} days`
      return outputLpd >= needLpd
        ? `Makes ${words.measure(outputLpd, 'L/d')} at your tap, of ${words.measure(needLpd, 'L/d')} needed${fill}.`
        : `Makes only ${words.measure(outputLpd, 'L/d')} at your tap, and ${words.measure(needLpd, 'L/d')} are needed.`
    },
  }
}

function judgePressure({ plan, others }: Scene, { piece }: Candidate): Judgement {
  if (readFlag(piece.specs, 'boosterIncluded')) return { outcome: 'pass', say: () => 'Comes with a booster pump.' }
  const least = readNumber(piece.specs, 'minFeedKPa')
  if (least === undefined) return lacking(['minFeedKPa'], () => 'Nobody has recorded the pressure it needs.')
  const { feedKPa } = plan.water
  const booster = findBooster(others)
  if (feedKPa < least && booster)
    return {
      outcome: 'pass',
      measured: feedKPa,
      limit: least,
      say: () => 'The booster pump in the setup raises the pressure.',
    }
  return {
    outcome: feedKPa >= least ? 'pass' : 'change',
    measured: feedKPa,
    limit: least,
    ...(feedKPa < least && { asks: { need: 'feed-pressure', amount: least, unit: 'kPa' as const } }),
    say: (words) =>
      `Needs ${words.measure(least, 'kPa')}, and your tap has ${words.measure(feedKPa, 'kPa')}${feedKPa < least ? ': add a booster pump' : ''}.`,
  }
}

const rule = createRuleMaker('ro-unit')

export const roUnitRules: KindRules = {
  rules: [
    rule('stages', {
      label: 'Stages',
      worst: 'fail',
      unit: null,
      rule: 'Without a membrane it fails; a missing sediment, carbon or deionisation stage has to be added.',
      reads: ['stages'],
      failLabel: 'without a membrane',
      judge: judgeStages,
    }),
    rule('output', {
      label: 'Output at your tap',
      worst: 'fail',
      unit: 'L/d',
      limitIs: 'least',
      basis: {
        type: 'physics',
        source: 'Net driving pressure and temperature factor as membrane makers’ technical manuals give them',
      },
      rule: 'Litres a day at the tap’s pressure, temperature and dissolved solids, at least a seventh of what a week takes.',
      reads: ['membraneLpd', 'testPressureKPa', 'testTempC', 'testTdsPpm', 'wasteRatio', 'boosterIncluded'],
      uses: ['water.feedKPa', 'water.feedTempC', 'water.litresPerWeek', 'water.feedTdsPpm'],
      failLabel: 'making too little water',
      judge: judgeOutput,
    }),
    rule('pressure', {
      label: 'Feed pressure',
      worst: 'change',
      unit: 'kPa',
      limitIs: 'least',
      rule: 'The tap’s pressure is at least what it needs, or a booster pump comes with it or is in the setup.',
      reads: ['minFeedKPa', 'boosterIncluded'],
      uses: ['water.feedKPa'],
      failLabel: 'needing more pressure',
      judge: judgePressure,
    }),
  ],
  targetReads: ['membraneLpd', 'testPressureKPa', 'testTempC', 'testTdsPpm', 'wasteRatio', 'boosterIncluded'],
  target: (scene, { piece, quantity }) => {
    const found = findOutputLpd(scene, piece.specs)
    const needLpd = scene.plan.water.litresPerWeek / 7
    return typeof found === 'number' ? Math.abs(found * quantity - needLpd) / Math.max(needLpd, 1e-9) : null
  },
}
