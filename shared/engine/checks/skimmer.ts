import { lacking, type Candidate, type Judgement, type KindRules } from '../rule'
import type { Scene } from '../scene'
import { thresholds } from '../thresholds'
import { readMeasure, readNumber } from '../values'
import { chooseBasin, describeBody, listBodySizes, tryBody, type BodyFit } from './body-space'
import { createRuleMaker } from './build-rule'
import { findPumpBasins } from './pump-flow'

const bodyKeys = ['lengthMm', 'widthMm', 'heightMm'] as const

/** The roomiest place for its body, deep enough for its least depth; or what its size lacks. */
function place(scene: Scene, candidate: Candidate): BodyFit | readonly string[] | undefined {
  const { specs } = candidate.piece
  const [length, width, height] = bodyKeys.map((key) => readMeasure(specs, key))
  if (!length || !width || !height) return bodyKeys.filter((key) => readNumber(specs, key) === undefined)
  const depth = readMeasure(specs, 'waterDepthMinMm') ?? { ...height, value: 0 }
  const body = {
    length,
    width,
    height,
    depth,
    clearanceMm: thresholds.pumpClearanceMm.value,
    quantity: candidate.quantity,
  }
  return chooseBasin(findPumpBasins(scene, candidate).map((basin) => tryBody(body, basin, scene.others)))
}

const isFit = (found: BodyFit | readonly string[] | undefined): found is BodyFit =>
  found !== undefined && 'basin' in found

function judgeSpace(scene: Scene, candidate: Candidate): Judgement {
  const found = place(scene, candidate)
  if (found === undefined) return { outcome: 'fail', say: () => 'The setup has no such chamber.' }
  if (!isFit(found)) return lacking(found, () => 'Nobody has recorded its outside size yet.')
  return {
    outcome: found.fits ? 'pass' : 'fail',
    measured: found.measuredMm,
    limit: found.limitMm,
    probability: found.probability,
    ...(found.fits && { placement: { chamber: found.basin.id, position: 'upright' as const, angleDeg: 90 } }),
    rests: () => listBodySizes(found),
    say: describeBody(found),
  }
}

function judgeDepth(scene: Scene, candidate: Candidate): Judgement {
  const { specs } = candidate.piece
  const min = readNumber(specs, 'waterDepthMinMm')
  const max = readNumber(specs, 'waterDepthMaxMm')
  const missing = [...(min === undefined ? ['waterDepthMinMm'] : []), ...(max === undefined ? ['waterDepthMaxMm'] : [])]
  if (min === undefined || max === undefined)
    return lacking(missing, () => 'Nobody has recorded the water depth it works in.')
  const found = place(scene, candidate)
  const basin = isFit(found) ? found.basin : findPumpBasins(scene, candidate)[0]
  if (!basin) return { outcome: 'fail', say: () => 'The setup has no such chamber.' }
  const depth = basin.waterDepthMm
  return {
    outcome: depth >= min && depth <= max ? 'pass' : 'fail',
    measured: depth,
    limit: [min, max],
    rests: () => [basin.path === 'tank' ? 'tank.waterLineMm' : `${basin.path}.waterDepthMm`],
    say: (words) =>
      `Works in ${words.pair([min, max], 'mm')} of water, and the ${basin.name} has ${words.length(depth)}.`,
  }
}

function judgeRating({ plan }: Scene, { piece }: Candidate): Judgement {
  const rated = readNumber(piece.specs, 'ratedVolumeL')
  if (rated === undefined) return lacking(['ratedVolumeL'], () => 'Nobody has recorded the volume it is rated for.')
  const { ratedL } = plan.tank
  return {
    outcome: rated >= ratedL ? 'pass' : 'change',
    measured: rated,
    limit: ratedL,
    say: (words) => `Its maker rates it for ${words.volume(rated)}; the tank holds ${words.volume(ratedL)}.`,
  }
}

const rule = createRuleMaker('skimmer')

export const skimmerRules: KindRules = {
  rules: [
    rule('space', {
      label: 'Room for the body',
      worst: 'fail',
      unit: 'mm',
      rule: `Its body in a chamber with what else is there, ${thresholds.pumpClearanceMm.value} mm to each side.`,
      reads: [...bodyKeys, 'waterDepthMinMm'],
      uses: [
        'tank.chambers.*.lengthMm',
        'tank.chambers.*.widthMm',
        'tank.chambers.*.waterDepthMm',
        'tank.sump.lengthMm',
        'tank.sump.widthMm',
        'tank.sump.waterDepthMm',
        'tank.displayLengthMm',
        'tank.displayWidthMm',
        'tank.waterLineMm',
      ],
      failLabel: 'too large for the place',
      judge: judgeSpace,
    }),
    rule('depth', {
      label: 'Water depth',
      worst: 'fail',
      unit: 'mm',
      rule: 'The water in its place within the depths that it works in.',
      reads: ['waterDepthMinMm', 'waterDepthMaxMm', ...bodyKeys],
      uses: ['tank.chambers.*.waterDepthMm', 'tank.sump.waterDepthMm', 'tank.waterLineMm'],
      failLabel: 'made for another depth',
      judge: judgeDepth,
    }),
    rule('rating', {
      label: 'Rated volume',
      worst: 'change',
      unit: 'L',
      limitIs: 'least',
      rule: 'Rated for at least the tank’s volume.',
      reads: ['ratedVolumeL'],
      uses: ['tank.volumeL'],
      failLabel: 'rated for a smaller tank',
      judge: judgeRating,
    }),
  ],
}
