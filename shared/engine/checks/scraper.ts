import { lacking, type Candidate, type Judgement, type KindRules } from '../rule'
import type { Scene } from '../scene'
import { thresholds } from '../thresholds'
import { beSure, doubt } from '../doubt'
import { probabilityAtLeast } from '../physics/conformance'
import { isWithinMm, readFlag, readMeasure, readSet, readText } from '../values'
import { createRuleMaker } from './build-rule'
import { judgeMagnetWall } from './magnet-wall'
import { findTankSize } from './tank-size'

function judgeWall({ plan }: Scene, { piece }: Candidate): Judgement | null {
  const form = readText(piece.specs, 'form')
  if (form === undefined) return lacking(['form'], () => 'Nobody has recorded whether it is a magnet or has a handle.')
  if (form !== 'magnet') return null
  const [min, max] = [readMeasure(piece.specs, 'wallMinMm'), readMeasure(piece.specs, 'wallMaxMm')]
  return judgeMagnetWall(findTankSize(plan, 'wallMm'), min, max, thresholds.magnetThinShare.value)
}

function judgeGlass(isMagnet: boolean, blades: readonly string[] | undefined): Judgement {
  if (!isMagnet && blades === undefined) return lacking(['blades'], () => 'Nobody has recorded its blades.')
  return { outcome: 'pass', ...(blades && { measured: blades }), say: () => 'Safe on glass.' }
}

/** Steel alone scratches; beside something softer it can be left out. */
function judgeSteel(blades: readonly string[]): Judgement {
  const hasSofter = blades.some((blade) => blade !== 'steel')
  return {
    outcome: hasSofter ? 'change' : 'fail',
    measured: blades,
    say: () =>
      hasSofter ? 'On acrylic use its plastic or pad only: steel scratches.' : 'Its steel blade scratches acrylic.',
  }
}

function judgeMaterial({ plan }: Scene, { piece }: Candidate): Judgement {
  const form = readText(piece.specs, 'form')
  const recorded = readSet<string>(piece.specs, 'blades')
  const blades = recorded && recorded.length > 0 ? recorded : undefined
  if (plan.tank.material === 'glass') return judgeGlass(form === 'magnet', blades)
  if (form === undefined) return lacking(['form'], () => 'Nobody has recorded whether it is a magnet or has a handle.')
  const isSafe = readFlag(piece.specs, 'acrylicSafe')
  const unsafe: Judgement = { outcome: 'fail', say: () => 'Its maker says that it is not safe on acrylic.' }
  if (form === 'magnet' && isSafe === false) return unsafe
  if (blades?.includes('steel')) return judgeSteel(blades)
  if (isSafe === false) return unsafe
  if (isSafe === undefined && (form === 'magnet' || !blades))
    return lacking(['acrylicSafe'], () => 'Nobody has recorded whether it is safe on acrylic.')
  return { outcome: 'pass', ...(blades && { measured: blades }), say: () => 'Safe on acrylic.' }
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
    ...beSure(
      (u) => probabilityAtLeast(length.value, neededMm, u),
      () => [
        doubt(length, 'length', 'check its length'),
        doubt(findTankSize(plan, 'outerHeightMm'), 'length', 'measure the tank'),
      ],
    ),
    say: (words) =>
      reaches
        ? 'It reaches the bottom without wetting your hand.'
        : `It is ${words.length(neededMm - length.value)} too short to reach the bottom with a dry hand.`,
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
      rule: 'On acrylic a magnet has to be stated safe there, and a handle has to hold plastic or a pad; steel beside those is a change, steel alone fails. On glass all pass.',
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
