import { probabilityAtLeast, standardUncertainty } from '../physics/conformance'
import { countOfThese, isMultiplied, lacking, type Candidate, type Judgement, type Rule, type Say } from '../rule'
import type { Scene } from '../scene'
import { thresholds } from '../thresholds'
import { readMeasure } from '../values'
import { getAttribute } from '../../kinds/index'
import { joinNames } from '../counting'
import type { Specs } from '../types'
import { displayUses, hasAreas, noAreas } from './shape'
import {
  chooseBand,
  chooseHeightMm,
  findLowerMm,
  findSpill,
  isDimmable,
  lightPlane,
  listMissing,
  shareOf,
  standsOnLegs,
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
/** The display and its water: other sizes bear on the plane through these alone. */
const planeRests = ['goals.coral', 'tank.waterLineMm', 'tank.displayLengthMm', 'tank.displayWidthMm']
const planeUses = [...planeRests, ...displayUses.slice(2), 'tank.outerHeightMm']

/** Heights that a lens is usually at, tried where nobody said one: hung or on an arm, and on legs (common practice). */
const usualHeightsMm = { free: [100, 150, 200, 250, 300, 400], legs: [40, 60, 80, 100, 150] } as const

interface Lit {
  readonly band: readonly [number, number]
  /** "your corals", or which ones were assumed. */
  readonly whose: string
  readonly count: number
  readonly heightMm: number
  readonly isHeightGiven: boolean
  /** Up to so many are tried. */
  readonly most: number
  readonly at: (count: number, heightMm: number) => Plane
}

/** What both beam checks look at; a judgement where there is nothing to look at, null where it does not apply. */
function light(scene: Scene, candidate: Candidate): Lit | Judgement | null {
  const { piece, quantity, mountHeightMm, mayMultiply } = candidate
  const { goals, assumed } = scene.plan
  const band = chooseBand(goals.coral)
  if (!band) return null
  const missing = listMissing(piece)
  if (missing.length > 0) {
    const names = missing.map((key) => getAttribute('light', key)?.label ?? key)
    return lacking(missing, () => `Nobody has recorded its ${joinNames(names)} yet.`)
  }
  if (!hasAreas(scene.plan)) return noAreas(scene.plan)
  return {
    band,
    whose: assumed.has('goals.coral') ? 'soft and large-polyp corals' : 'your corals',
    count: quantity,
    most: mayMultiply === false || isMultiplied(candidate) ? quantity : thresholds.lightMostUnits.value,
    heightMm: mountHeightMm ?? chooseHeightMm(piece.specs),
    isHeightGiven: mountHeightMm !== undefined,
    at: (count, heightMm) => lightPlane(scene, piece.specs, count, heightMm, band),
  }
}

const isLit = (found: Lit | Judgement): found is Lit => 'band' in found

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

type JudgeLit = (lit: Lit) => Judgement

/** The same check at other usual heights: a height that nobody gave condemns nothing. */
function tryHeights(lit: Lit, specs: Specs, judge: JudgeLit): Judgement {
  const first = judge(lit)
  if (first.outcome !== 'fail' || lit.isHeightGiven) return first
  const better = usualHeightsMm[standsOnLegs(specs) ? 'legs' : 'free']
    .filter((heightMm) => heightMm !== lit.heightMm)
    .sort((a, b) => Math.abs(a - lit.heightMm) - Math.abs(b - lit.heightMm))
    .find((heightMm) => judge({ ...lit, heightMm, most: lit.count }).outcome === 'pass')
  if (better === undefined) return first
  return {
    ...first,
    outcome: 'change',
    say: (words) =>
      `${first.say(words)} It works with the lens ${words.length(better)} above the water; we assumed ${words.length(lit.heightMm)}.`,
  }
}

/** The same check under other corals: those that nobody named condemn nothing either. */
function judgeLit(scene: Scene, candidate: Candidate, judge: (lit: Lit, dimmable: boolean) => Judgement) {
  const lit = light(scene, candidate)
  if (!lit || !isLit(lit)) return lit
  const { specs } = candidate.piece
  const judgeOne: JudgeLit = (tried) => agree(isDimmable(specs), (dimmable) => judge(tried, dimmable))
  const found = { ...tryHeights(lit, specs, judgeOne), rests: () => planeRests }
  const strong = chooseBand(['sps'])
  if (found.outcome !== 'fail' || !strong || !scene.plan.assumed.has('goals.coral')) return found
  const at: Lit['at'] = (count, heightMm) => lightPlane(scene, specs, count, heightMm, strong)
  if (judgeOne({ ...lit, band: strong, at, most: lit.count }).outcome !== 'pass') return found
  const say: Say = (words) => `${found.say(words)} It suits small-polyp corals; we assumed soft and large-polyp ones.`
  return { ...found, outcome: 'change' as const, say }
}

const isEnough = (share: number) => share >= thresholds.lightCoverPass.value

/** The fewest of the light, from what is asked about on, that cover the plane; undefined where four do not. */
function findEnough(lit: Lit, dimmable: boolean): number | undefined {
  for (let { count } = lit; count <= lit.most; count += 1)
    if (isEnough(shareOf(lit.at(count, lit.heightMm), dimmable))) return count
  return undefined
}

const judgeIntensity = (scene: Scene, candidate: Candidate): Judgement | null =>
  judgeLit(scene, candidate, (lit, dimmable) => {
    const { specs } = candidate.piece
    const count = findEnough(lit, dimmable) ?? lit.count
    const { brightestUmol, aboveShare } = lit.at(count, lit.heightMm)
    const [low, high] = lit.band
    const reading = readMeasure(specs, 'ppfdUmol') ?? readMeasure(specs, 'photonFluxUmolS')
    const probability = () => {
      if (!reading || reading.value === 0) return brightestUmol >= low ? 1 : 0
      const { value, source, plusMinus } = reading
      const u = (brightestUmol * standardUncertainty(value, source, plusMinus, 'other')) / value
      return probabilityAtLeast(brightestUmol, low, u)
    }
    const base = { measured: brightestUmol, limit: low, probability }
    const height = sayHeight(lit.heightMm, lit.isHeightGiven)
    const wants: Say = (words) => `${lit.whose} want ${words.pair([low, high], 'umol/m2/s')}`
    const brightest: Say = (words) =>
      `${words.measure(brightestUmol, 'umol/m2/s')} half way down${count > lit.count ? ` under ${countOfThese(count).toLowerCase()}` : ''}${height(words)}`
    if (brightestUmol < low)
      return { ...base, outcome: 'fail', say: (words) => `Too dim: at most ${brightest(words)}; ${wants(words)}.` }
    if (!dimmable && aboveShare > brightMost)
      return {
        outcome: 'fail',
        measured: brightestUmol,
        limit: null,
        margin: (brightMost - aboveShare) / brightMost,
        say: (words) =>
          `Too bright and not dimmable: ${Math.round(aboveShare * 100)} % of the tank gets more than ${words.measure(high, 'umol/m2/s')}${height(words)}; ${wants(words)}.`,
      }
    return { ...base, outcome: 'pass', say: (words) => `Up to ${brightest(words)}; ${wants(words)}.` }
  })

/** Share of the plane that a light which cannot be dimmed may put above the band. */
const brightMost = 0.5

const judgeCoverage = (scene: Scene, candidate: Candidate): Judgement | null =>
  judgeLit(scene, candidate, (lit, dimmable) => {
    const plane = lit.at(lit.count, lit.heightMm)
    const share = shareOf(plane, dimmable)
    const setting = dimmable && plane.bestPercent < 100 ? ` at ${plane.bestPercent} %` : ''
    const height = sayHeight(lit.heightMm, lit.isHeightGiven)
    const covers: Say = (words) => `${Math.round(share * 100)} % of the tank${setting}${height(words)}`
    const enough = findEnough(lit, dimmable)
    const cautions = warnSpill(scene, candidate, enough ?? lit.count, lit.heightMm)
    const base = { measured: share, limit: thresholds.lightCoverPass.value, cautions }
    if (enough === lit.count && isMultiplied(candidate))
      return {
        ...base,
        outcome: 'change',
        say: (words) => `${countOfThese(lit.count)}: together they light ${covers(words)}, one alone too little.`,
      }
    if (enough === lit.count) return { ...base, outcome: 'pass', say: (words) => `Lights ${covers(words)}.` }
    if (enough !== undefined)
      return {
        ...base,
        outcome: 'change',
        enough,
        say: (words) =>
          `${countOfThese(enough)}: ${lit.count === 1 ? 'one lights' : `${lit.count} light`} only ${covers(words)}.`,
      }
    if (share >= thresholds.lightCoverChange.value)
      return { ...base, outcome: 'change', say: (words) => `Lights ${covers(words)}: the ends stay dim.` }
    return { ...base, outcome: 'fail', cautions: [], say: (words) => `Lights only ${covers(words)}.` }
  })

function warnSpill(scene: Scene, { piece }: Candidate, count: number, heightMm: number): readonly Say[] {
  const spill = findSpill(scene, piece.specs, count, heightMm)
  if (spill <= thresholds.lightSpill.value) return []
  return [
    (words) => {
      const lower = findLowerMm(scene, piece.specs, count, heightMm)
      const limit = `${thresholds.lightSpill.value * 100} %`
      const cure =
        lower === null
          ? `no height brings that under ${limit}`
          : `with the lens ${words.length(lower)} above the water it is under ${limit}`
      return `${Math.round(spill * 100)} % of its light misses the water; ${cure}. Estimates are estimates: measure before trusting livestock to them.`
    },
  ]
}

/** For ordering: how little of the plane is left out, then how little light is spilled. */
export function rankLight(scene: Scene, candidate: Candidate): number | null {
  const lit = light(scene, candidate)
  if (!lit || !isLit(lit)) return null
  const { heightMm, count } = lit
  const share = shareOf(lit.at(count, heightMm), isDimmable(candidate.piece.specs) ?? false)
  return Math.round((1 - share) * 100) + findSpill(scene, candidate.piece.specs, count, heightMm)
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
  rule: 'At full power, with as many as cover the tank, the brightest point half way down the water reaches the lower end of the band that the corals are kept under; a light that cannot be dimmed must not put more than half of the plane above the upper end. Fish only: not judged.',
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
