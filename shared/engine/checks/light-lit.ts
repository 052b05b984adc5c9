import { getAttribute } from '../../kinds/index'
import { joinNames } from '../counting'
import { isMultiplied, lacking, type Candidate, type Judgement, type Say } from '../rule'
import type { Scene } from '../scene'
import { thresholds } from '../thresholds'
import type { Specs } from '../types'
import {
  chooseBand,
  chooseHeightMm,
  isDimmable,
  lightPlane,
  listMissing,
  shareOf,
  standsOnLegs,
  type Plane,
} from './light-plane'
import { displayUses, hasAreas, noAreas } from './shape'

export const planeUses = ['goals.coral', 'tank.waterLineMm', ...displayUses, 'tank.outerHeightMm']
/** What may turn out otherwise: the display follows from the tank's outside and its chambers, which somebody measured or not. */
const planeTurns = [
  'tank.displayLengthMm',
  'tank.displayWidthMm',
  'goals.coral',
  'tank.waterLineMm',
  'tank.outerLengthMm',
  'tank.outerWidthMm',
  'tank.chambers.*.widthMm',
]

/** Heights that a lens is usually at, tried where nobody said one: hung or on an arm, and on legs (common practice). */
const usualHeightsMm = { free: [100, 150, 200, 250, 300, 400], legs: [40, 60, 80, 100, 150] } as const

/** A light over the setup’s display, and what its corals want. */
export interface Lit {
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
export function findLit(scene: Scene, candidate: Candidate): Lit | Judgement | null {
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

export const isLit = (found: Lit | Judgement): found is Lit => 'band' in found

/** Outcomes that a light of unknown dimming would have, agreed or not. */
function agree(dimmable: boolean | undefined, judge: (dimmable: boolean) => Judgement): Judgement {
  if (dimmable !== undefined) return judge(dimmable)
  const [dimmed, full] = [judge(true), judge(false)]
  if (dimmed.outcome === full.outcome) return full
  return lacking(['dimmable'], () => 'It depends on whether it can be dimmed, and nobody has recorded that.')
}

/** The height in brackets where nobody said one. */
export const sayHeight =
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
export function judgeLit(scene: Scene, candidate: Candidate, judge: (lit: Lit, dimmable: boolean) => Judgement) {
  const lit = findLit(scene, candidate)
  if (!lit || !isLit(lit)) return lit
  const { specs } = candidate.piece
  const judgeOne: JudgeLit = (tried) => agree(isDimmable(specs), (dimmable) => judge(tried, dimmable))
  const tried = tryHeights(lit, specs, judgeOne)
  const found: Judgement = tried.outcome === 'fail' ? { ...tried, rests: () => planeTurns } : tried
  const strong = chooseBand(['sps'])
  if (found.outcome !== 'fail' || !strong || !scene.plan.assumed.has('goals.coral')) return found
  const at: Lit['at'] = (count, heightMm) => lightPlane(scene, specs, count, heightMm, strong)
  if (judgeOne({ ...lit, band: strong, at, most: lit.count }).outcome !== 'pass') return found
  const say: Say = (words) => `${found.say(words)} It suits small-polyp corals; we assumed soft and large-polyp ones.`
  return { ...found, outcome: 'change' as const, say }
}

const isEnough = (share: number) => share >= thresholds.lightCoverPass.value

/** The fewest of the light, from what is asked about on, that cover the plane; undefined where four do not. */
export function findEnough(lit: Lit, dimmable: boolean): number | undefined {
  for (let { count } = lit; count <= lit.most; count += 1)
    if (isEnough(shareOf(lit.at(count, lit.heightMm), dimmable))) return count
  return undefined
}
