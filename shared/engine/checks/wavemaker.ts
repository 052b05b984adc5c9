import {
  countOfThese,
  isMultiplied,
  lacking,
  type Candidate,
  type Judgement,
  type KindRules,
  type Rule,
  type Say,
} from '../rule'
import type { Scene } from '../scene'
import { defaults } from '../setup/defaults'
import { practiceBasis, thresholds } from '../thresholds'
import type { Item, Piece } from '../types'
import { beSure, doubt, doubtTank } from '../doubt'
import { probabilityAtMost, probabilityReaches } from '../physics/conformance'
import type { Printer } from '../../units/print'
import { sayUncounted } from '../counting'
import { readMeasure, readNumber } from '../values'
import { judgeMagnetWall } from './magnet-wall'
import { hasAreas, noAreas, waterUses } from './shape'
import { findTankSize } from './tank-size'

interface Others {
  /** Set as low and as high as they go, L/h; one without a least flow runs at its only speed. */
  readonly leastLph: number
  readonly mostLph: number
  readonly cautions: readonly Say[]
}

function sumOthers(others: readonly Item[]): Others {
  const wavemakers = others.filter(({ piece }) => piece.kind === 'wavemaker')
  const known = wavemakers.flatMap(({ piece, quantity }) => {
    const most = readNumber(piece.specs, 'flowMaxLph')
    return most === undefined
      ? []
      : [{ least: quantity * (readNumber(piece.specs, 'flowMinLph') ?? most), most: quantity * most }]
  })
  const unknown = wavemakers.length - known.length
  return {
    leastLph: known.reduce((sum, { least }) => sum + least, 0),
    mostLph: known.reduce((sum, { most }) => sum + most, 0),
    cautions: unknown > 0 ? [sayUncounted(unknown, 'flow')] : [],
  }
}

const chooseBand = ({ plan }: Scene): readonly [number, number] =>
  defaults.circulationPerHour[plan.goals.coral.includes('sps') ? 'sps' : 'usual']

const doubtFlow = ({ specs }: Piece, perHour: number) =>
  doubt(
    { value: perHour, source: (specs['flowMaxLph'] ?? specs['flowMinLph'])?.source ?? 'estimate' },
    'other',
    'check its flow',
  )

function judgeFlow(scene: Scene, candidate: Candidate): Judgement {
  const { piece, quantity, mayMultiply } = candidate
  const most = readNumber(piece.specs, 'flowMaxLph')
  if (most === undefined) return lacking(['flowMaxLph'], () => 'Nobody has recorded its flow yet.')
  if (!hasAreas(scene.plan)) return noAreas(scene.plan)
  const least = readNumber(piece.specs, 'flowMinLph')
  const litres = scene.plan.tank.waterL
  const { leastLph, mostLph, cautions } = sumOthers(scene.others)
  const [low, high] = chooseBand(scene)
  const highest = (count: number) => (mostLph + most * count) / litres
  const lowest = (leastLph + (least ?? most) * quantity) / litres
  const judged = Math.max(lowest, Math.min(highest(quantity), high))
  const sureness = beSure(
    (u) => probabilityReaches([lowest, highest(quantity)], low, high, u),
    () => [doubtFlow(piece, judged), doubtTank(judged, scene.plan.tank)],
  )
  const base = { measured: judged, limit: [low, high] as const, cautions, ...sureness }
  const times = (words: Printer, perHour: number) => `${words.number(perHour, '/h')} times an hour`
  const usual = (words: Printer) => `${words.number(low, '/h')} to ${words.number(high, '/h')} are usual`
  const lead = mostLph > 0 ? 'With the others it' : 'It'
  if (highest(quantity) < low) {
    const counts = mayMultiply === false || isMultiplied(candidate) ? [] : listCounts(quantity)
    const enough = counts.find((count) => highest(count) >= low)
    if (enough !== undefined)
      return {
        ...base,
        outcome: 'change',
        enough,
        say: (words) =>
          `${countOfThese(enough)}: ${quantity === 1 ? 'one moves' : `${quantity} move`} the water only ${times(words, highest(quantity))}; ${usual(words)}.`,
      }
    return {
      ...base,
      outcome: 'change',
      say: (words) =>
        `Too weak: ${lead.toLowerCase()} moves the water ${times(words, highest(quantity))}; ${usual(words)}.`,
    }
  }
  if (lowest > high) {
    if (least === undefined)
      return lacking(
        ['flowMinLph'],
        (words) =>
          `${lead} moves the water ${times(words, highest(quantity))}; ${usual(words)}, and nobody has recorded how low it can be set.`,
      )
    return {
      ...base,
      outcome: 'change',
      say: (words) =>
        `Too strong: even at its lowest ${lead.toLowerCase()} moves the water ${times(words, lowest)}; ${usual(words)}.`,
    }
  }
  if (isMultiplied(candidate))
    return {
      ...base,
      outcome: 'change',
      say: (words) =>
        `${countOfThese(quantity)}: together they move the water up to ${times(words, highest(quantity))}.`,
    }
  return {
    ...base,
    outcome: 'pass',
    say: (words) => `${lead} moves the water up to ${times(words, highest(quantity))}; ${usual(words)}.`,
  }
}

const listCounts = (above: number): readonly number[] =>
  Array.from({ length: Math.max(0, thresholds.wavemakerMost.value - above) }, (_, index) => above + 1 + index)

function judgeWall({ plan }: Scene, { piece }: Candidate): Judgement {
  const min = readMeasure(piece.specs, 'wallMinMm')
  const max = readMeasure(piece.specs, 'wallMaxMm')
  return judgeMagnetWall(findTankSize(plan, 'wallMm'), min, max)
}

function judgeSand(scene: Scene, { piece, quantity }: Candidate): Judgement | null {
  const grains = scene.others
    .filter((item) => item.piece.kind === 'sand')
    .map((item) => readNumber(item.piece.specs, 'grainMinMm'))
  const isFine = grains.some((grainMm) => grainMm !== undefined && grainMm < thresholds.sandBlowsMm.value)
  if (!isFine && !grains.includes(undefined)) return null
  const least = readNumber(piece.specs, 'flowMinLph')
  const most = readNumber(piece.specs, 'flowMaxLph')
  if (least === undefined && most === undefined)
    return lacking(['flowMaxLph'], () => 'Nobody has recorded its flow yet.')
  if (!hasAreas(scene.plan)) return noAreas(scene.plan)
  const { leastLph, cautions } = sumOthers(scene.others)
  const limit = thresholds.sandBlowsTurnover.value
  const perHour = (leastLph + (least ?? most ?? 0) * quantity) / scene.plan.tank.waterL
  if (perHour > limit && least === undefined)
    return lacking(['flowMinLph'], () => 'Nobody has recorded whether it can be set low enough for the sand.')
  if (perHour > limit && !isFine)
    return { outcome: 'nodata', missing: [], say: () => 'Nobody has recorded how fine the sand in the setup is.' }
  return {
    outcome: perHour > limit ? 'change' : 'pass',
    measured: perHour,
    limit,
    ...beSure(
      (u) => probabilityAtMost(perHour, limit, u),
      () => [doubtFlow(piece, perHour), doubtTank(perHour, scene.plan.tank)],
    ),
    cautions,
    say: (words) =>
      perHour > limit
        ? `The fine sand in the setup will blow about: even at its lowest the water is moved ${words.number(perHour, '/h')} times an hour.`
        : 'It can be set low enough for the sand in the setup.',
  }
}

const rule = (check: string, parts: Omit<Rule, 'id' | 'basis'>): Rule => ({
  id: `wavemaker.${check}`,
  basis: practiceBasis,
  ...parts,
})

export const wavemakerRules: KindRules = {
  rules: [
    rule('flow', {
      label: 'Circulation',
      worst: 'change',
      unit: '/h',
      rule: 'With the other wavemakers 10 to 40 times the water an hour, for small-polyp corals 20 to 60; too weak names how many would do, up to three.',
      reads: ['flowMinLph', 'flowMaxLph'],
      uses: ['goals.coral', ...waterUses],
      failLabel: 'too weak or too strong',
      judge: judgeFlow,
    }),
    rule('wall', {
      label: 'Magnet through the wall',
      worst: 'fail',
      unit: 'mm',
      rule: 'The tank’s wall within the range that its magnet holds through.',
      reads: ['wallMinMm', 'wallMaxMm'],
      uses: ['tank.wallMm'],
      failLabel: 'made for another wall',
      judge: judgeWall,
    }),
    rule('sand', {
      label: 'Sand',
      worst: 'change',
      unit: '/h',
      rule: `Over sand with grains under ${thresholds.sandBlowsMm.value} mm it can be set to no more than ${thresholds.sandBlowsTurnover.value} times the water an hour.`,
      reads: ['flowMinLph', 'flowMaxLph'],
      uses: waterUses,
      failLabel: 'too strong for the sand',
      judge: judgeSand,
    }),
  ],
  feltThrough: ['powerW', 'plugs', 'flowMinLph', 'flowMaxLph'],
}
