import { lacking, type Candidate, type Judgement, type KindRules } from '../rule'
import type { Scene } from '../scene'
import { thresholds } from '../thresholds'
import { beSure, doubt, doubtBasin } from '../doubt'
import { probabilityAtLeast, probabilityWithin } from '../physics/conformance'
import type { Basin } from '../setup/places'
import type { Specs } from '../types'
import { isWithinMm, readMeasure, readNumber } from '../values'
import { bodyUses, judgeBody, lackWater, listBodyTurns } from './body-judgement'
import { chooseBasin, tryBody, type BodyFit } from './body-space'
import { createRuleMaker } from './build-rule'
import { findPumpBasins } from './pump-flow'
import { doubtRated, grossUses, hasRatedVolume, isVolumeStated, noAreas } from './shape'

const bodyKeys = ['lengthMm', 'widthMm', 'heightMm'] as const

const readDepths = (specs: Specs) =>
  [readMeasure(specs, 'waterDepthMinMm'), readMeasure(specs, 'waterDepthMaxMm')] as const

/** Too deep for it, or too shallow; what is not known keeps it from no basin. */
function isDeepEnough(specs: Specs, { waterDepthMm }: Basin): boolean {
  const [min, max] = readDepths(specs)
  return (!min || isWithinMm(min.value, waterDepthMm)) && (!max || isWithinMm(waterDepthMm, max.value))
}

/** The roomiest place for its body among those of a depth that it works in, else of all; or what its size lacks. */
function place(scene: Scene, candidate: Candidate): BodyFit | readonly string[] | undefined {
  const { specs } = candidate.piece
  const [length, width, height] = bodyKeys.map((key) => readMeasure(specs, key))
  if (!length || !width || !height) return bodyKeys.filter((key) => readNumber(specs, key) === undefined)
  const body = {
    length,
    width,
    height,
    depth: { value: 0, source: height.source },
    clearanceMm: thresholds.pumpClearanceMm.value,
    quantity: candidate.quantity,
  }
  const tried = findPumpBasins(scene, candidate).map((basin) => tryBody(body, basin, scene.others))
  const best = chooseBasin(tried.filter(({ basin }) => isDeepEnough(specs, basin)))
  return best?.fits ? best : chooseBasin(tried)
}

const isFit = (found: BodyFit | readonly string[] | undefined): found is BodyFit =>
  found !== undefined && 'basin' in found

function judgeSpace(scene: Scene, candidate: Candidate): Judgement {
  const found = place(scene, candidate)
  if (found === undefined) return lackWater(candidate.place)
  if (!isFit(found)) return lacking(found, () => 'Nobody has recorded its outside size yet.')
  return judgeBody(found, scene.plan)
}

/** What could bring another depth; of several chambers also what could make it another one's. */
const listDepthTurns = ({ plan }: Scene, basin: Basin): readonly string[] =>
  listBodyTurns(plan, basin).filter((path) => plan.tank.chambers.length > 1 || !/\.(length|width)Mm$/.test(path))

function judgeDepth(scene: Scene, candidate: Candidate): Judgement {
  const { specs } = candidate.piece
  const [min, max] = readDepths(specs)
  const missing = [...(min ? [] : ['waterDepthMinMm']), ...(max ? [] : ['waterDepthMaxMm'])]
  if (!min || !max) return lacking(missing, () => 'Nobody has recorded the water depth it works in.')
  const found = place(scene, candidate)
  const basin = isFit(found) ? found.basin : findPumpBasins(scene, candidate)[0]
  if (!basin) return lackWater(candidate.place)
  const depth = basin.waterDepthMm
  return {
    outcome: isDeepEnough(specs, basin) ? 'pass' : 'fail',
    measured: depth,
    limit: [min.value, max.value],
    ...beSure(
      (u) => probabilityWithin(depth, min.value, max.value, u),
      () => [doubtBasin(basin, depth), doubt(min, 'length', 'check the depths it works in')],
    ),
    rests: () =>
      isDeepEnough(specs, basin)
        ? [basin.path === 'tank' ? 'tank.waterLineMm' : `${basin.path}.waterDepthMm`]
        : listDepthTurns(scene, basin),
    say: (words) =>
      `Works in ${words.pair([min.value, max.value], 'mm')} of water, and the ${basin.name} has ${words.length(depth)}.`,
  }
}

function judgeRating({ plan }: Scene, { piece }: Candidate): Judgement {
  const rated = readNumber(piece.specs, 'ratedVolumeL')
  if (rated === undefined) return lacking(['ratedVolumeL'], () => 'Nobody has recorded the volume it is rated for.')
  if (!hasRatedVolume(plan)) return noAreas(plan)
  const { ratedL } = plan.tank
  return {
    outcome: rated >= ratedL ? 'pass' : 'change',
    measured: rated,
    limit: ratedL,
    ...beSure(
      (u) => probabilityAtLeast(rated, ratedL, u),
      () => doubtRated(plan),
    ),
    rests: () => (isVolumeStated(plan) ? [] : grossUses),
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
      rule: `Its body in a chamber with what else is there, ${thresholds.pumpClearanceMm.value} mm to each side; of several chambers one of a depth that it works in comes first.`,
      reads: [...bodyKeys, 'waterDepthMinMm', 'waterDepthMaxMm'],
      uses: bodyUses,
      failLabel: 'too large for the place',
      judge: judgeSpace,
    }),
    rule('depth', {
      label: 'Water depth',
      worst: 'fail',
      unit: 'mm',
      rule: 'The water in its place within the depths that it works in.',
      reads: ['waterDepthMinMm', 'waterDepthMaxMm', ...bodyKeys],
      // Of several chambers its size chooses one.
      uses: bodyUses,
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
      uses: grossUses,
      failLabel: 'rated for a smaller tank',
      judge: judgeRating,
    }),
  ],
}
