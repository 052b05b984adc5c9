import type { UnitSystem } from '../../units/systems'
import { judgeAll } from '../assess'
import type { AssessedCandidate } from '../candidates'
import { getRules } from '../checks/index'
import { outcomeOf } from '../concession'
import { findOutcome } from '../judge'
import { isDemand } from '../knock-ons'
import type { Candidate, Rule } from '../rule'
import { createScene, type Scene } from '../scene'
import { findSide } from '../sides'
import { findContradictions } from '../setup/contradictions'
import { resolve } from '../setup/resolve'
import type { Outcome, Setup, Verdict } from '../types'
import { decideVerdict } from '../verdict'
import { listKnobs, type Knob } from './knobs'
import { createLadder } from './steps'

/** The smallest change to one number of the setup with which a piece that does not fit would. */
export interface FoundTurn {
  readonly knob: Knob
  readonly to: number
  /** The value one step less, with which it would not. */
  readonly short: number
  readonly verdict: 'fits' | 'changes'
}

/** How the setup with a change in it judges the piece, what it asks of the rest included. */
export type JudgeAnew = (change: (setup: Setup) => Setup) => Verdict

/** Scenes with one number said otherwise, the same for every piece of a page. */
function changeScene(scene: Scene, knob: Knob, value: number): Scene {
  const key = `turned ${knob.path}=${value}`
  const known = scene.kept.get(key) as Scene | undefined
  if (known) return known
  const plan = resolve(knob.give(scene.plan.setup, value))
  const items = new Map(plan.setup.items.map((item) => [item.id, item]))
  const others = scene.others.map((other) => items.get(other.id) ?? other)
  const changed = createScene(plan, others)
  scene.kept.set(key, changed)
  return changed
}

/** More than any scale has. */
const mostSteps = 2 ** 20

/** What a check has to give at least, where another verdict is wanted than the piece has. */
const keepsBy: Readonly<Record<'no' | 'changes', (outcome: Outcome | undefined) => boolean>> = {
  no: (outcome) => outcome !== 'fail',
  changes: (outcome) => outcome !== 'fail' && outcome !== 'change',
}

const wantedBy: Readonly<Record<'no' | 'changes', readonly Verdict[]>> = { no: ['fits', 'changes'], changes: ['fits'] }

interface Search {
  readonly scene: Scene
  readonly candidate: Candidate
  /** Those that are not kept first: they tell soonest. */
  readonly rules: readonly Rule[]
  readonly failing: readonly Rule[]
  readonly from: 'no' | 'changes'
}

const isKeptIn = ({ candidate, from }: Search, rules: readonly Rule[], scene: Scene): boolean =>
  rules.every((rule) => keepsBy[from](findOutcome(scene, rule, candidate)))

type Test = (count: number) => boolean
/** On which side of what is asked for so many steps lead. */
type Side = (count: number) => -1 | 0 | 1 | undefined

/** Between too few steps and too many, as a skimmer's water may be too deep or too shallow, some that are just right. */
function findBetween(few: number, many: number, keeps: Test, sideAt: Side): number | undefined {
  const start = sideAt(few)
  if (start === undefined || sideAt(many) !== -start) return undefined
  let [low, high] = [few, many]
  while (high - low > 1) {
    const middle = Math.floor((low + high) / 2)
    if (keeps(middle)) return middle
    if (sideAt(middle) === start) low = middle
    else high = middle
  }
  return undefined
}

/** The fewest steps up to `most` with which every check is kept, walking away from none. */
function findFewest(most: number, keeps: Test, sideAt: Side): number | undefined {
  let last = 0
  for (let stride = 1; ; stride *= 2) {
    const count = Math.min(stride, most)
    let kept = keeps(count) ? count : findBetween(last, count, keeps, sideAt)
    while (kept !== undefined && kept - last > 1) {
      const middle = Math.floor((kept + last) / 2)
      if (keeps(middle)) kept = middle
      else last = middle
    }
    if (kept !== undefined || count === most) return kept
    last = count
  }
}

/** So many steps are possible at most: within what can be at all, and as far as nothing else that was said rules it out. */
function findMost(scene: Scene, knob: Knob, isMore: boolean, valueAt: (count: number) => number): number {
  const key = `turns ${knob.path} ${isMore}`
  const known = scene.kept.get(key)
  if (typeof known === 'number') return known
  const [low, high] = knob.range
  const isPossible = (count: number) => {
    const value = valueAt(count)
    return value >= low && value <= high && findContradictions(knob.give(scene.plan.setup, value)).length === 0
  }
  let [most, beyond] = [0, mostSteps]
  while (beyond - most > 1) {
    const middle = Math.floor((most + beyond) / 2)
    if (isPossible(middle)) most = middle
    else beyond = middle
  }
  scene.kept.set(key, most)
  return most
}

function turn(search: Search, knob: Knob, isMore: boolean, system: UnitSystem): FoundTurn | undefined {
  const { scene, candidate, rules, from, failing } = search
  const valueAt = createLadder(knob.from, knob.attribute.unit, system, isMore, knob.isRelative)
  const most = findMost(scene, knob, isMore, valueAt)
  if (most === 0) return undefined
  const sceneAt = (count: number) => changeScene(scene, knob, valueAt(count))
  const keepsOf = (asked: readonly Rule[]) => (count: number) => isKeptIn(search, asked, sceneAt(count))
  const [worst] = failing
  const start = findSide(worst?.judge(scene, candidate))
  const sideAt: Side = (count) => (start === undefined ? start : findSide(worst?.judge(sceneAt(count), candidate)))
  // More of the same helps or does not: what all of it does not turn nothing short of it will, unless it goes too far.
  if (!keepsOf(failing)(most) && sideAt(most) === start) return undefined
  const count = findFewest(most, keepsOf(rules), sideAt)
  if (count === undefined) return undefined
  const verdict = decideVerdict(judgeAll(sceneAt(count), candidate))
  if (verdict === 'no' || verdict === 'unknown' || !wantedBy[from].includes(verdict)) return undefined
  return { knob, to: valueAt(count), short: valueAt(count - 1), verdict }
}

/** How large a change is beside what it changes: degrees beside those that are usual, since their zero is no nothing. */
function weigh({ knob: { attribute, from }, to }: FoundTurn): number {
  const [low, high] = attribute.usual
  return Math.abs(to - from) / Math.max(attribute.unit === 'C' ? high - low : Math.abs(from), 1e-9)
}

/** Whether there is a verdict to turn: what the rest asks for as well, or a change that states its condition, is not. */
function findWhatFails({ verdict, judged, knockOns }: AssessedCandidate) {
  if (verdict === 'no') return judged.filter((one) => one.outcome === 'fail' || one.eitherWay === 'fail')
  const changes = judged.filter((one) => outcomeOf(one) === 'change')
  const isOwn = verdict === 'changes' && knockOns.filter(isDemand).length === changes.length
  return isOwn && changes.every(({ condition }) => !condition) ? changes : []
}

/** The turn that takes least, undefined where no single number of the setup does it. */
export function findTurn(scene: Scene, assessed: AssessedCandidate, judgeAnew: JudgeAnew): FoundTurn | undefined {
  const { candidate, verdict } = assessed
  const failing = findWhatFails(assessed)
  if (failing.length === 0 || (verdict !== 'no' && verdict !== 'changes')) return undefined
  const asked = failing.map(({ rule }) => rule)
  const rest = getRules(candidate.piece.kind).rules.filter((rule) => !asked.includes(rule))
  const search: Search = { scene, candidate, rules: [...asked, ...rest], failing: asked, from: verdict }
  // Nobody changes what is built to save a change.
  const knobs = listKnobs(scene, failing, candidate).filter((knob) => verdict === 'no' || !knob.isRelative)
  const { units } = scene.plan.setup
  const found = knobs.flatMap((knob) =>
    ([true, false] as const).flatMap((isMore) => {
      if (knob.only && (knob.only === 'more') !== isMore) return []
      return turn(search, knob, isMore, units) ?? []
    }),
  )
  for (const one of found.sort((a, b) => weigh(a) - weigh(b))) {
    const anew = judgeAnew((setup) => one.knob.give(setup, one.to))
    if (anew !== 'no' && anew !== 'unknown' && wantedBy[verdict].includes(anew)) return { ...one, verdict: anew }
  }
  return undefined
}
