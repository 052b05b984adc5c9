import { lacking, type Candidate, type Judgement, type KindRules } from '../rule'
import type { Scene } from '../scene'
import { thresholds } from '../thresholds'
import { isWithinMm, readFlag, readMeasure, readNumber, readSet, readText } from '../values'
import { combineUncertainties, probabilityAtMost, standardUncertainty } from '../physics/conformance'
import { createRuleMaker } from './build-rule'

function judgeWall({ plan }: Scene, { piece }: Candidate): Judgement | null {
  const form = readText(piece.specs, 'form')
  if (form === undefined) return lacking(['form'], () => 'Nobody has recorded whether it is a magnet or has a handle.')
  if (form !== 'magnet') return null
  const min = readNumber(piece.specs, 'wallMinMm')
  const max = readMeasure(piece.specs, 'wallMaxMm')
  const { wallMm, source, plusMinus } = plan.tank
  if (!max) return lacking(['wallMaxMm'], () => 'Nobody has recorded the wall that its magnet holds through.')
  const low = min ?? 0
  const u = combineUncertainties(
    standardUncertainty(wallMm, source, plusMinus, 'length'),
    standardUncertainty(max.value, max.source, max.plusMinus, 'other'),
  )
  const base = {
    measured: wallMm,
    limit: [low, max.value] as const,
    probability: () => probabilityAtMost(wallMm, max.value, u),
  }
  if (!isWithinMm(wallMm, max.value))
    return {
      ...base,
      outcome: 'fail',
      say: (words) => `Its magnet holds through ${words.length(max.value)}, and the wall is ${words.length(wallMm)}.`,
    }
  if (isWithinMm(low, wallMm))
    return { ...base, outcome: 'pass', say: (words) => `Its magnet holds through the ${words.length(wallMm)} wall.` }
  const isNear = isWithinMm(low * thresholds.magnetThinShare.value, wallMm)
  return {
    ...base,
    outcome: isNear ? 'change' : 'fail',
    say: (words) =>
      `Made for walls from ${words.length(low)}, and this one is ${words.length(wallMm)}: ${isNear ? 'stronger than needed, so mind the seams' : 'far too strong'}.`,
  }
}

function judgeMaterial({ plan }: Scene, { piece }: Candidate): Judgement {
  const blades = readSet<string>(piece.specs, 'blades')
  if (plan.tank.material === 'glass') {
    if (readText(piece.specs, 'form') === 'magnet') return { outcome: 'pass', say: () => 'Safe on glass.' }
    if (blades === undefined) return lacking(['blades'], () => 'Nobody has recorded its blades.')
    return { outcome: 'pass', measured: blades, say: () => 'Safe on glass.' }
  }
  const isSafe = readFlag(piece.specs, 'acrylicSafe')
  if (blades?.includes('steel')) {
    const hasSofter = blades.some((blade) => blade !== 'steel')
    return {
      outcome: hasSofter ? 'change' : 'fail',
      measured: blades,
      say: () =>
        hasSofter ? 'On acrylic use its plastic or pad only: steel scratches.' : 'Its steel blade scratches acrylic.',
    }
  }
  if (isSafe === undefined && !(readText(piece.specs, 'form') === 'handheld' && blades !== undefined))
    return lacking(['acrylicSafe'], () => 'Nobody has recorded whether it is safe on acrylic.')
  return isSafe === false
    ? { outcome: 'fail', say: () => 'Not safe on acrylic.' }
    : { outcome: 'pass', say: () => 'Safe on acrylic.' }
}

function judgeReach({ plan }: Scene, { piece }: Candidate): Judgement | null {
  if (readText(piece.specs, 'form') !== 'handheld') return null
  const length = readMeasure(piece.specs, 'lengthMm')
  if (!length) return lacking(['lengthMm'], () => 'Nobody has recorded its length yet.')
  const neededMm = plan.tank.outerHeightMm + thresholds.scraperReachMm.value
  const reaches = isWithinMm(neededMm, length.value)
  return {
    outcome: reaches ? 'pass' : 'change',
    measured: length.value,
    limit: neededMm,
    say: (words) =>
      reaches
        ? 'Reaches the bottom without wetting your hand.'
        : `${words.length(neededMm - length.value)} short of the bottom with a dry hand.`,
  }
}

const rule = createRuleMaker('scraper')

export const scraperRules: KindRules = {
  rules: [
    rule('wall', {
      label: 'Magnet through the wall',
      worst: 'fail',
      unit: 'mm',
      rule: `The wall within its range; thinner down to ${thresholds.magnetThinShare.value} of its least is a change.`,
      reads: ['form', 'wallMinMm', 'wallMaxMm'],
      uses: ['tank.wallMm'],
      failLabel: 'made for another wall',
      judge: judgeWall,
    }),
    rule('acrylic', {
      label: 'Safe on the pane',
      worst: 'fail',
      unit: null,
      rule: 'On acrylic it has to be safe there: plastic or pad; steel beside those is a change, steel alone fails. On glass all pass.',
      reads: ['form', 'blades', 'acrylicSafe'],
      uses: ['tank.material'],
      failLabel: 'scratching acrylic',
      judge: judgeMaterial,
    }),
    rule('reach', {
      label: 'Reach',
      worst: 'change',
      unit: 'mm',
      limitIs: 'least',
      rule: `A handle as long as the tank is high, and ${thresholds.scraperReachMm.value} mm.`,
      reads: ['form', 'lengthMm'],
      uses: ['tank.outerHeightMm'],
      failLabel: 'too short',
      judge: judgeReach,
    }),
  ],
  feltThrough: ['form'],
}
