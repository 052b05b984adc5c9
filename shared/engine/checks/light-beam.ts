import { probabilityAtLeast, standardUncertainty } from '../physics/conformance'
import { countOfThese, isMultiplied, lacking, type Candidate, type Judgement, type Rule, type Say } from '../rule'
import type { Scene } from '../scene'
import { thresholds } from '../thresholds'
import { readMeasure } from '../values'
import { getAttribute } from '../../kinds/index'
import { hasAreas, noAreas } from './shape'
import {
  chooseBand,
  chooseHeightMm,
  findLowerMm,
  findSpill,
  isDimmable,
  lightPlane,
  listMissing,
  shareOf,
  type Plane,
} from './light-plane'

const lampReads = [
  'layout',
  'lengthMm',
  'widthMm',
  'beamAngleDeg',
  'ppfdUmol',
  'ppfdAtMm',
  'photonFluxUmolS',
  'dimmable',
  'mountsIncluded',
]
const planeUses = [
  'goals.coral',
  'tank.waterLineMm',
  'tank.displayLengthMm',
  'tank.displayWidthMm',
  'tank.outerLengthMm',
  'tank.outerWidthMm',
  'tank.outerHeightMm',
]

/** Heights that a lens is usually hung at, tried where nobody said one; a light on legs stands where its legs are. */
const usualHeightsMm = [100, 150, 200, 250, 300, 400]

interface Lit {
  readonly band: readonly [number, number]
  readonly plane: Plane
  readonly count: number
  readonly isHeightGiven: boolean
  readonly at: (count: number, heightMm?: number) => Plane
}

/** What both beam checks look at; a judgement where there is nothing to look at, null where it does not apply. */
function light(scene: Scene, { piece, quantity, mountHeightMm }: Candidate): Lit | Judgement | null {
  const band = chooseBand(scene.plan.goals.coral)
  if (!band) return null
  const missing = listMissing(piece)
  if (missing.length > 0) {
    const names = missing.map((key) => getAttribute('light', key)?.label ?? key)
    return lacking(missing, () => `Nobody has recorded its ${names.join(', ')} yet.`)
  }
  if (!hasAreas(scene.plan)) return noAreas(scene.plan)
  const usual = mountHeightMm ?? chooseHeightMm(piece.specs)
  const at = (count: number, heightMm = usual) => lightPlane(scene, piece.specs, count, heightMm, band)
  return { band, plane: at(quantity), count: quantity, isHeightGiven: mountHeightMm !== undefined, at }
}

const isLit = (found: Lit | Judgement): found is Lit => 'plane' in found

/** Outcomes that a light of unknown dimming would have, agreed or not. */
function agree(dimmable: boolean | undefined, judge: (dimmable: boolean) => Judgement): Judgement {
  if (dimmable !== undefined) return judge(dimmable)
  const [dimmed, full] = [judge(true), judge(false)]
  if (dimmed.outcome === full.outcome) return full
  return lacking(['dimmable'], () => 'It depends on whether it can be dimmed, and nobody has recorded that.')
}

const sayHeight =
  (heightMm: number, isGiven: boolean): Say =>
  (words) =>
    isGiven ? '' : ` (lens ${words.length(heightMm)} above the water, assumed)`

/** The same check at other usual heights: a height that nobody gave condemns nothing. */
function tryHeights(lit: Lit, judge: (plane: Plane) => Judgement): Judgement {
  const first = judge(lit.plane)
  if (first.outcome !== 'fail' || lit.isHeightGiven) return first
  const better = usualHeightsMm
    .filter((heightMm) => heightMm !== lit.plane.heightMm)
    .sort((a, b) => Math.abs(a - lit.plane.heightMm) - Math.abs(b - lit.plane.heightMm))
    .find((heightMm) => judge(lit.at(lit.count, heightMm)).outcome === 'pass')
  if (better === undefined) return first
  return {
    ...first,
    outcome: 'change',
    say: (words) =>
      `${first.say(words)} It works with the lens ${words.length(better)} above the water; we assumed ${words.length(lit.plane.heightMm)}.`,
  }
}

function judgeIntensity(scene: Scene, candidate: Candidate): Judgement | null {
  const lit = light(scene, candidate)
  if (!lit || !isLit(lit)) return lit
  const { specs } = candidate.piece
  const reading = readMeasure(specs, 'ppfdUmol') ?? readMeasure(specs, 'photonFluxUmolS')
  const [low, high] = lit.band
  const judgeAt = (plane: Plane, dimmable: boolean): Judgement => {
    const { brightestUmol, aboveShare } = plane
    const u = reading
      ? (brightestUmol * standardUncertainty(reading.value, reading.source, reading.plusMinus, 'other')) / reading.value
      : 0
    const base = { measured: brightestUmol, limit: low, probability: () => probabilityAtLeast(brightestUmol, low, u) }
    const print = (words: Parameters<Say>[0], umol: number) => words.measure(umol, 'umol/m2/s')
    const height = sayHeight(plane.heightMm, lit.isHeightGiven)
    if (brightestUmol < low)
      return {
        ...base,
        outcome: 'fail',
        say: (words) =>
          `Too dim: at most ${print(words, brightestUmol)} half way down${height(words)}, where your corals want ${words.pair([low, high], 'umol/m2/s')}.`,
      }
    if (!dimmable && aboveShare > 0.5)
      return {
        ...base,
        outcome: 'fail',
        say: (words) =>
          `Too bright and not dimmable: ${Math.round(aboveShare * 100)} % of the tank gets more than ${print(words, high)}${height(words)}.`,
      }
    return {
      ...base,
      outcome: 'pass',
      say: (words) =>
        `Up to ${print(words, brightestUmol)} half way down${height(words)}; your corals want ${words.pair([low, high], 'umol/m2/s')}.`,
    }
  }
  return tryHeights(lit, (plane) => agree(isDimmable(specs), (dimmable) => judgeAt(plane, dimmable)))
}

function judgeCoverage(scene: Scene, candidate: Candidate): Judgement | null {
  const lit = light(scene, candidate)
  if (!lit || !isLit(lit)) return lit
  const { piece, mayMultiply } = candidate
  const { lightCoverPass, lightCoverChange, lightMostUnits } = thresholds
  const isEnough = (share: number) => share >= lightCoverPass.value
  const judgeAt = (plane: Plane, dimmable: boolean): Judgement => {
    const share = shareOf(plane, dimmable)
    const setting = dimmable && plane.bestPercent < 100 ? ` at ${plane.bestPercent} %` : ''
    const covers = `${Math.round(share * 100)} % of the tank${setting}`
    const base = { measured: share, limit: lightCoverPass.value }
    if (isEnough(share) && isMultiplied(candidate))
      return {
        ...base,
        outcome: 'change',
        say: () => `${countOfThese(lit.count)}: together they light ${covers}, one alone does not.`,
      }
    if (isEnough(share))
      return {
        ...base,
        outcome: 'pass',
        cautions: warnSpill(scene, candidate, plane),
        say: (words) => `Lights ${covers}${sayHeight(plane.heightMm, lit.isHeightGiven)(words)}.`,
      }
    if (mayMultiply !== false && !isMultiplied(candidate)) {
      for (let count = lit.count + 1; count <= lightMostUnits.value; count += 1)
        if (isEnough(shareOf(lit.at(count, plane.heightMm), dimmable)))
          return {
            ...base,
            outcome: 'change',
            enough: count,
            say: () =>
              `${countOfThese(count)}: ${lit.count === 1 ? 'one lights' : `${lit.count} light`} only ${covers}.`,
          }
    }
    if (share >= lightCoverChange.value)
      return {
        ...base,
        outcome: 'change',
        cautions: warnSpill(scene, candidate, plane),
        say: () => `Lights ${covers}: the ends stay dim.`,
      }
    return { ...base, outcome: 'fail', say: () => `Lights only ${covers}.` }
  }
  return tryHeights(lit, (plane) => agree(isDimmable(piece.specs), (dimmable) => judgeAt(plane, dimmable)))
}

function warnSpill(scene: Scene, { piece, quantity }: Candidate, { heightMm }: Plane): readonly Say[] {
  const spill = findSpill(scene, piece.specs, quantity, heightMm)
  if (spill <= thresholds.lightSpill.value) return []
  return [
    (words) => {
      const lower = findLowerMm(scene, piece.specs, quantity, heightMm)
      const cure =
        lower === null ? 'no height brings it under' : `${words.length(lower)} above the water brings it under`
      return `${Math.round(spill * 100)} % of its light misses the water; ${cure} ${thresholds.lightSpill.value * 100} %. Estimates are estimates: measure before trusting livestock to them.`
    },
  ]
}

/** For ordering: how little of the plane is left out, then how little light is spilled. */
export function rankLight(scene: Scene, candidate: Candidate): number | null {
  const lit = light(scene, candidate)
  if (!lit || !isLit(lit)) return null
  const share = shareOf(lit.plane, isDimmable(candidate.piece.specs) ?? false)
  return Math.round((1 - share) * 100) + findSpill(scene, candidate.piece.specs, candidate.quantity, lit.plane.heightMm)
}

export const lightTargetReads = lampReads

const model = {
  type: 'physics' as const,
  source:
    'Generalised Lambertian beam (Kahn & Barry 1997, Proceedings of the IEEE 85:265), refraction by Snell’s law, attenuation 0.14 per metre (Pope & Fry 1997, Applied Optics 36:8710); bands are common practice',
}

export const lightIntensity: Rule = {
  id: 'light.intensity',
  label: 'Brightness',
  worst: 'fail',
  unit: 'umol/m2/s',
  limitIs: 'least',
  basis: model,
  rule: 'At full power the brightest point half way down the water reaches the lower end of the band that the corals are kept under; a light that cannot be dimmed must not put more than half of the plane above the upper end. Fish only: not judged.',
  reads: lampReads,
  uses: planeUses,
  failLabel: 'too dim or too bright',
  judge: judgeIntensity,
}

export const lightCoverage: Rule = {
  id: 'light.coverage',
  label: 'Coverage',
  worst: 'fail',
  unit: 'fraction',
  limitIs: 'least',
  basis: model,
  rule: `Share of the plane half way down that is in the band at the best dimming: ${thresholds.lightCoverPass.value * 100} % passes; else as many as reach it, up to ${thresholds.lightMostUnits.value}; else from ${thresholds.lightCoverChange.value * 100} % with dim ends. Reflections are left out.`,
  reads: lampReads,
  uses: planeUses,
  failLabel: 'covering too little of the tank',
  judge: judgeCoverage,
}
