import { countOfThese, isMultiplied, lacking, type Candidate, type Judgement, type KindRules, type Rule } from '../rule'
import type { Scene } from '../scene'
import { defaults } from '../setup/defaults'
import { practiceBasis, thresholds } from '../thresholds'
import type { Item } from '../types'
import { isWithinMm, readMeasure, readNumber } from '../values'
import { combineUncertainties, probabilityWithin, standardUncertainty } from '../physics/conformance'

/** Flow in L/h that the other wavemakers add, at most. */
const sumOthersLph = (others: readonly Item[]): number =>
  others.reduce(
    (sum, { piece, quantity }) =>
      piece.kind === 'wavemaker' ? sum + quantity * (readNumber(piece.specs, 'flowMaxLph') ?? 0) : sum,
    0,
  )

const chooseBand = ({ plan }: Scene): readonly [number, number] =>
  defaults.circulationPerHour[plan.goals.coral.includes('sps') ? 'sps' : 'usual']

function judgeFlow(scene: Scene, candidate: Candidate): Judgement {
  const { piece, quantity, mayMultiply } = candidate
  const most = readNumber(piece.specs, 'flowMaxLph')
  if (most === undefined) return lacking(['flowMaxLph'], () => 'Nobody has recorded its flow yet.')
  const least = readNumber(piece.specs, 'flowMinLph') ?? most
  const litres = scene.plan.tank.waterL
  const others = sumOthersLph(scene.others)
  const perHour = (lph: number, count = quantity) => (others + lph * count) / litres
  const [low, high] = chooseBand(scene)
  const judged = Math.max(perHour(least), Math.min(perHour(most), high))
  const base = { measured: judged, limit: [low, high] as const }
  const isStrong = perHour(most) >= low
  if (isStrong && perHour(least) <= high && isMultiplied(candidate))
    return {
      ...base,
      outcome: 'change',
      say: (words) =>
        `${countOfThese(quantity)}: together they move the water ${words.number(perHour(most), '/h')} times an hour.`,
    }
  if (isStrong && perHour(least) <= high)
    return {
      ...base,
      outcome: 'pass',
      say: (words) =>
        `Moves the water up to ${words.number(perHour(most), '/h')} times an hour; ${words.number(low, '/h')} to ${words.number(high, '/h')} are usual.`,
    }
  if (!isStrong) {
    if (mayMultiply !== false && !isMultiplied(candidate))
      for (let count = quantity + 1; count <= thresholds.wavemakerMost.value; count += 1)
        if (perHour(most, count) >= low)
          return {
            ...base,
            outcome: 'change',
            enough: count,
            say: (words) =>
              `${countOfThese(count)}: one moves the water only ${words.number(perHour(most), '/h')} times an hour.`,
          }
    return {
      ...base,
      outcome: 'change',
      say: (words) =>
        `Too weak alone: ${words.number(perHour(most), '/h')} times an hour, where ${words.number(low, '/h')} to ${words.number(high, '/h')} are usual.`,
    }
  }
  return {
    ...base,
    outcome: 'change',
    say: (words) =>
      `Too strong even at its lowest: ${words.number(perHour(least), '/h')} times an hour, where ${words.number(low, '/h')} to ${words.number(high, '/h')} are usual.`,
  }
}

function judgeWall({ plan }: Scene, { piece }: Candidate): Judgement {
  const min = readMeasure(piece.specs, 'wallMinMm')
  const max = readMeasure(piece.specs, 'wallMaxMm')
  const { wallMm, source, plusMinus } = plan.tank
  if (max && !isWithinMm(wallMm, max.value))
    return {
      outcome: 'fail',
      measured: wallMm,
      limit: [min?.value ?? 0, max.value],
      say: (words) => `Its magnet holds through ${words.length(max.value)}, and the wall is ${words.length(wallMm)}.`,
    }
  if (min && !isWithinMm(min.value, wallMm))
    return {
      outcome: 'fail',
      measured: wallMm,
      limit: [min.value, max?.value ?? min.value],
      say: (words) =>
        `Its magnet is made for walls from ${words.length(min.value)}, and this one is ${words.length(wallMm)}.`,
    }
  if (!max) return lacking(['wallMaxMm'], () => 'Nobody has recorded the wall that its magnet holds through.')
  const low = min?.value ?? 0
  const u = combineUncertainties(
    standardUncertainty(wallMm, source, plusMinus, 'length'),
    standardUncertainty(max.value, max.source, max.plusMinus, 'other'),
  )
  return {
    outcome: 'pass',
    measured: wallMm,
    limit: [low, max.value],
    probability: () => probabilityWithin(wallMm, low === 0 ? -1e6 : low, max.value, u),
    say: (words) => `Its magnet holds through the ${words.length(wallMm)} wall.`,
  }
}

function judgeSand(scene: Scene, { piece, quantity }: Candidate): Judgement | null {
  const fine = scene.others.some(
    (item) =>
      item.piece.kind === 'sand' &&
      (readNumber(item.piece.specs, 'grainMinMm') ?? Infinity) < thresholds.sandBlowsMm.value,
  )
  if (!fine) return null
  const least = readNumber(piece.specs, 'flowMinLph') ?? readNumber(piece.specs, 'flowMaxLph')
  if (least === undefined) return lacking(['flowMaxLph'], () => 'Nobody has recorded its flow yet.')
  const perHour = (sumOthersLph(scene.others) + least * quantity) / scene.plan.tank.waterL
  const isStrong = perHour > thresholds.sandBlowsTurnover.value
  return {
    outcome: isStrong ? 'change' : 'pass',
    measured: perHour,
    limit: thresholds.sandBlowsTurnover.value,
    say: () =>
      isStrong
        ? 'The fine sand in the setup will blow about, even at its lowest.'
        : 'Gentle enough at its lowest for the fine sand in the setup.',
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
      uses: ['goals.coral', 'tank.outerLengthMm', 'tank.outerWidthMm', 'tank.outerHeightMm', 'tank.waterLineMm'],
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
      uses: [],
      failLabel: 'too strong for the sand',
      judge: judgeSand,
    }),
  ],
  feltThrough: ['powerW', 'plugs', 'flowMaxLph'],
}
