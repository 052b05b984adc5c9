import { beSure, doubt } from '../doubt'
import { probabilityAtLeast } from '../physics/conformance'
import { countOfThese, isMultiplied, type Candidate, type Judgement, type Rule, type Say } from '../rule'
import type { Scene } from '../scene'
import { thresholds } from '../thresholds'
import { readMeasure } from '../values'
import { findEnough, findLit, isLit, judgeLit, planeUses, sayHeight } from './light-lit'
import { chooseHeightMm, findLowerMm, findSpill, isDimmable, shareOf } from './light-plane'

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
const judgeIntensity = (scene: Scene, candidate: Candidate): Judgement | null =>
  judgeLit(scene, candidate, (lit, dimmable) => {
    const { specs } = candidate.piece
    const count = findEnough(lit, dimmable) ?? lit.count
    const { brightestUmol, aboveShare } = lit.at(count, lit.heightMm)
    const [low, high] = lit.band
    const brightMost = thresholds.lightBrightMost.value
    const reading = readMeasure(specs, 'ppfdUmol') ?? readMeasure(specs, 'photonFluxUmolS')
    const sureness = beSure(
      (u) => probabilityAtLeast(brightestUmol, low, u),
      () =>
        reading && reading.value > 0
          ? [doubt(reading, 'other', 'have its light measured', brightestUmol / reading.value)]
          : [],
    )
    const base = { measured: brightestUmol, limit: low, ...sureness }
    const height = sayHeight(lit.heightMm, lit.isHeightGiven)
    const wants: Say = (words) => `${lit.whose} want ${words.pair([low, high], 'umol/m2/s')}`
    const brightest: Say = (words) =>
      `${words.measure(brightestUmol, 'umol/m2/s')} half way down at full power${count > lit.count ? ` under ${countOfThese(count).toLowerCase()}` : ''}${height(words)}`
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

const judgeCoverage = (scene: Scene, candidate: Candidate): Judgement | null =>
  judgeLit(scene, candidate, (lit, dimmable) => {
    const plane = lit.at(lit.count, lit.heightMm)
    const share = shareOf(plane, dimmable)
    const setting = dimmable && share > 0 && plane.bestPercent < 100 ? `, dimmed to ${plane.bestPercent} %` : ''
    const height = sayHeight(lit.heightMm, lit.isHeightGiven)
    const covers: Say = (words) => `${Math.round(share * 100)} % of the tank${setting}${height(words)}`
    const enough = findEnough(lit, dimmable)
    const cautions = warnSpill(scene, candidate, enough ?? lit.count, lit.heightMm)
    const least = thresholds.lightCoverPass.value
    // The share is a model's, whoever measured the light.
    const sureness = beSure(
      (u) => probabilityAtLeast(share, least, u),
      () => [doubt({ value: share, source: 'estimate' }, 'other', 'have its light measured over a tank')],
    )
    const base = {
      measured: share,
      limit: least,
      changeLimit: thresholds.lightCoverChange.value,
      cautions,
      ...sureness,
    }
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

/** Said only where much light misses; told by whoever reads the cautions, since it takes a model of its own. */
function warnSpill(scene: Scene, { piece }: Candidate, count: number, heightMm: number): readonly Say[] {
  return [
    (words) => {
      const spill = findSpill(scene, piece.specs, count, heightMm)
      if (spill <= thresholds.lightSpill.value) return ''
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
  const lit = findLit(scene, candidate)
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

/** Other heights than the usual one are a change anyway. */
const atUsualHeight = (candidate: Candidate): Candidate => ({
  ...candidate,
  mountHeightMm: candidate.mountHeightMm ?? chooseHeightMm(candidate.piece.specs),
})

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
  isModelled: true,
  asPlain: atUsualHeight,
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
  isModelled: true,
  // More than one is a change anyway.
  asPlain: (candidate) => ({ ...atUsualHeight(candidate), mayMultiply: false }),
  judge: judgeCoverage,
}
