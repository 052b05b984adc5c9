import type { Printer } from '../../units/print'
import { lacking, type Candidate, type Judgement, type KindRules, type Say } from '../rule'
import type { Scene } from '../scene'
import { findRatedDriveKPa, membraneFlowLpd } from '../physics/membrane'
import type { Item, Specs } from '../types'
import { beSure, doubt, type Doubt } from '../doubt'
import { probabilityAtLeast } from '../physics/conformance'
import type { Plan } from '../setup/plan'
import { readFlag, readMeasure, readNumber, readSet } from '../values'
import { joinNames } from '../counting'
import { createRuleMaker } from './build-rule'
import { hasAreas, noAreas } from './shape'

const wantedStages = ['sediment', 'carbon', 'membrane', 'deionisation']

function judgeStages(_scene: Scene, { piece }: Candidate): Judgement {
  const stages = readSet<string>(piece.specs, 'stages')
  if (stages === undefined) return lacking(['stages'], () => 'Nobody has recorded its stages.')
  if (!stages.includes('membrane'))
    return { outcome: 'fail', measured: stages, say: () => 'Has no membrane: it cannot make pure water.' }
  const missing = wantedStages.filter((stage) => !stages.includes(stage))
  return {
    outcome: missing.length > 0 ? 'change' : 'pass',
    measured: stages,
    ...(missing.length > 0 && {
      asks: { need: 'filter-stage', amount: missing.length, unit: 'count' as const, lacks: missing },
    }),
    say: () =>
      missing.length > 0
        ? `It lacks ${joinNames(missing)}: add ${missing.length === 1 ? 'that stage' : 'those stages'}.`
        : 'Sediment, carbon, membrane and deionisation.',
  }
}

const findBooster = (others: readonly Item[]) => others.find((item) => item.piece.kind === 'booster-pump')

/** What stands between the tap and the membrane: a pump of its own, one in the setup, or nothing. */
interface Feed {
  readonly hasOwnBooster: boolean
  /** Booster pumps of which one raises the pressure, the candidate first. */
  readonly others: readonly Item[]
}

/** Pressure at the membrane, kPa: its rated one behind a booster of its own, a booster's outlet, else the tap's. */
export function findPressureKPa({ plan }: Scene, specs: Specs, { hasOwnBooster, others }: Feed): number {
  const { feedKPa } = plan.water
  if (hasOwnBooster) return Math.max(feedKPa, readNumber(specs, 'testPressureKPa') ?? feedKPa)
  const booster = findBooster(others)
  return Math.max(feedKPa, (booster && readNumber(booster.piece.specs, 'outletKPa')) ?? feedKPa)
}

const outputKeys = ['membraneLpd', 'testPressureKPa', 'testTempC', 'wasteRatio']

/** Litres a day that the unit makes on a feed; no data, and why, where that cannot be told. */
export function findOutputLpd(scene: Scene, specs: Specs, feed: Feed): number | Judgement {
  const [ratedLpd, testPressureKPa, testTempC, wasteRatio] = outputKeys.map((key) => readNumber(specs, key))
  if (ratedLpd === undefined || testPressureKPa === undefined || testTempC === undefined || wasteRatio === undefined)
    return lacking(
      outputKeys.filter((key) => readNumber(specs, key) === undefined),
      () => 'Nobody has recorded all that its output is computed from.',
    )
  const testTdsPpm = readNumber(specs, 'testTdsPpm')
  const rating = { ratedLpd, testPressureKPa, testTempC, ...(testTdsPpm !== undefined && { testTdsPpm }) }
  if (findRatedDriveKPa(rating, wasteRatio) <= 0)
    return lacking(
      ['testPressureKPa'],
      (words) =>
        `Its maker’s test pressure of ${words.measure(testPressureKPa, 'kPa')} cannot be right: it does not overcome osmosis.`,
    )
  const { feedTempC, feedTdsPpm } = scene.plan.water
  const feedKPa = findPressureKPa(scene, specs, feed)
  return membraneFlowLpd(rating, { feedKPa, feedTempC, feedTdsPpm, wasteRatio })
}

/** Of the tap's pressure, which its owner read on a gauge or which was assumed. */
export const doubtFeed = ({ assumed, water }: Plan): Doubt =>
  doubt(
    { value: water.feedKPa, source: assumed.has('water.feedKPa') ? 'estimate' : 'measured' },
    'other',
    'measure the pressure at your tap',
  )

/** Of an output in litres a day that follows from what the membrane is rated for. */
export const doubtOutput = (specs: Specs, lpd: number): Doubt =>
  doubt(
    { value: lpd, source: readMeasure(specs, 'membraneLpd')?.source ?? 'estimate' },
    'other',
    'check what its membrane is rated for',
  )

/** "3 days", "less than a day" */
const sayDays = (days: number, words: Printer) => {
  const printed = words.number(days, 'count')
  return days < 0.95 ? 'less than a day' : printed === '1' ? 'a day' : `${printed} days`
}

function judgeOutput(scene: Scene, { piece, quantity }: Candidate): Judgement {
  const { plan, others } = scene
  const hasOwnBooster = readFlag(piece.specs, 'boosterIncluded')
  const found = findOutputLpd(scene, piece.specs, { hasOwnBooster: hasOwnBooster ?? false, others })
  if (typeof found !== 'number') return found
  if (plan.assumed.has('water.litresPerWeek') && !hasAreas(plan)) return noAreas(plan)
  const outputLpd = found * quantity
  const needLpd = plan.water.litresPerWeek / 7
  const isEnough = outputLpd >= needLpd
  if (!isEnough && hasOwnBooster === undefined)
    return lacking(['boosterIncluded'], () => 'Makes too little at your tap, unless a booster pump comes with it.')
  const booster = findBooster(others)
  if (!isEnough && !hasOwnBooster && booster && readNumber(booster.piece.specs, 'outletKPa') === undefined)
    return {
      outcome: 'nodata',
      missing: [],
      say: () => 'Nobody has recorded the pressure that the booster pump gives.',
    }
  const fillDays = outputLpd > 0 && hasAreas(plan) ? plan.tank.waterL / outputLpd : undefined
  return {
    outcome: isEnough ? 'pass' : 'fail',
    measured: outputLpd,
    limit: needLpd,
    ...beSure(
      (u) => probabilityAtLeast(outputLpd, needLpd, u),
      () => [
        doubtOutput(piece.specs, outputLpd),
        { ...doubtFeed(plan), u: (doubtFeed(plan).u * outputLpd) / Math.max(plan.water.feedKPa, 1) },
      ],
    ),
    say: (words) => {
      const fill = fillDays === undefined ? '' : `; the first fill takes ${sayDays(fillDays, words)}`
      const [made, needed] = [words.measure(outputLpd, 'L/d'), words.measure(needLpd, 'L/d')]
      return isEnough
        ? `Makes ${made} at your tap, and you need ${needed}${fill}.`
        : `Makes only ${made} at your tap, and you need ${needed}.`
    },
  }
}

function judgePressure({ plan, others }: Scene, { piece }: Candidate): Judgement {
  const hasOwnBooster = readFlag(piece.specs, 'boosterIncluded')
  if (hasOwnBooster) return { outcome: 'pass', say: () => 'Comes with a booster pump.' }
  const required = readMeasure(piece.specs, 'minFeedKPa')
  if (!required) return lacking(['minFeedKPa'], () => 'Nobody has recorded the pressure it needs.')
  const least = required.value
  const { feedKPa } = plan.water
  const base = {
    measured: feedKPa,
    limit: least,
    ...beSure(
      (u) => probabilityAtLeast(feedKPa, least, u),
      () => [doubtFeed(plan), doubt(required, 'other', 'check the pressure it needs')],
    ),
  }
  const needs: Say = (words) =>
    `Needs ${words.measure(least, 'kPa')}, and your tap has ${words.measure(feedKPa, 'kPa')}`
  if (feedKPa >= least) return { ...base, outcome: 'pass', say: (words) => `${needs(words)}.` }
  const booster = findBooster(others)
  const boostedKPa = booster && readNumber(booster.piece.specs, 'outletKPa')
  if (boostedKPa !== undefined && boostedKPa >= least)
    return {
      outcome: 'pass',
      measured: boostedKPa,
      limit: least,
      say: (words) =>
        `Needs ${words.measure(least, 'kPa')}; the booster pump in the setup gives ${words.measure(boostedKPa, 'kPa')}.`,
    }
  if (booster && boostedKPa === undefined)
    return {
      outcome: 'nodata',
      missing: [],
      say: () => 'Nobody has recorded the pressure that the booster pump gives.',
    }
  if (hasOwnBooster === undefined)
    return lacking(
      ['boosterIncluded'],
      (words) => `${needs(words)}: nobody has recorded whether a booster pump comes with it.`,
    )
  return {
    ...base,
    outcome: 'change',
    asks: { need: 'feed-pressure', amount: least, unit: 'kPa' },
    say: (words) => `${needs(words)}: add a booster pump.`,
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
      rule: 'The tap’s pressure is at least what it needs, or a booster pump comes with it, or one in the setup gives it.',
      reads: ['minFeedKPa', 'boosterIncluded'],
      uses: ['water.feedKPa'],
      failLabel: 'needing more pressure',
      judge: judgePressure,
    }),
  ],
  targetReads: ['membraneLpd', 'testPressureKPa', 'testTempC', 'testTdsPpm', 'wasteRatio', 'boosterIncluded'],
  target: (scene, { piece, quantity }) => {
    const hasOwnBooster = readFlag(piece.specs, 'boosterIncluded') ?? false
    const found = findOutputLpd(scene, piece.specs, { hasOwnBooster, others: scene.others })
    const needLpd = scene.plan.water.litresPerWeek / 7
    return typeof found === 'number' ? Math.abs(found * quantity - needLpd) / Math.max(needLpd, 1e-9) : null
  },
}
