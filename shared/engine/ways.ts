import { findSetupField } from '../kinds/setup-fields'
import { labelSetupPath } from './assumptions'
import { findMargin } from './margin'
import { findLast } from './physics/bisect'
import type { Judgement, Rule } from './rule'
import { listTrading, once, vary, type Scene } from './scene'
import { findContradictions } from './setup/contradictions'
import { giveValue } from './setup/give'
import { findPeak, listInnerShares } from './inner-ways'
import { findSide } from './sides'
import { listUsual } from './usual'

type Assumed = number | string

/** One assumed value, and the value from which on (`toward`) a check is kept; a choice has no way. */
export interface Turn {
  readonly path: string
  readonly label: string
  readonly turnsAt: Assumed
  /** Where it is no longer kept on the same way, if it is not to the end of the usual range. */
  readonly until?: number
  readonly toward: 'more' | 'less' | null
  readonly assumed: Assumed
}

/** What has to hold instead of what was assumed. */
export type Condition = readonly Turn[]

/** Whether the check is kept in that scene. */
export type IsKept = (scene: Scene) => boolean

/** A check that is not kept as things were assumed, and how to ask it again. */
export interface Asked {
  readonly isKept: IsKept
  readonly look: (scene: Scene) => Judgement | null
  readonly rule: Rule
  readonly judgement: Judgement
}

/** A setup that could as well be meant, and what would have to hold for a check that is kept in it. */
export interface Way {
  readonly scene: Scene
  readonly turn: (isKept: IsKept) => Condition
}

/** One assumed measure, towards one end of its usual range, as far as the rest of what was said allows. */
interface Direction {
  readonly scene: Scene
  readonly path: string
  readonly used: number
  readonly reach: number
  readonly toward: 'more' | 'less'
}

const countContradictions = ({ plan }: Scene): number => findContradictions(plan.setup).length

/** How far towards `end` an assumed value can go before the rest of what was said rules it out. */
function findReach(scene: Scene, path: string, used: number, end: number): number {
  const before = once(scene, countContradictions)
  const isPossible = (share: number) =>
    findContradictions(giveValue(scene.plan.setup, path, used + share * (end - used))).length <= before
  return used + (findLast(isPossible, 0, 1, 1e-3) ?? 0) * (end - used)
}

const valueAt = ({ used, reach }: Direction, share: number): number => used + share * (reach - used)

/** A scene that nobody will ask for again. */
const varyOnce = (direction: Direction, share: number): Scene =>
  vary({ ...direction.scene, kept: new Map() }, direction.path, valueAt(direction, share))

/** The way that goes `share` of a direction, on which the check is kept at that point. */
function createWay(direction: Direction, share: number): Way {
  const { scene, path, used, toward } = direction
  const turn = (isKept: IsKept): Condition => {
    const isKeptAt = (at: number) => isKept(varyOnce(direction, at))
    const first = findLast((at) => !isKeptAt(at), 0, share) ?? 0
    const last = share === 1 || isKeptAt(1) ? 1 : (findLast(isKeptAt, share, 1) ?? share)
    const label = labelSetupPath(path, scene.plan)
    const turned: Turn = { path, label, assumed: used, turnsAt: valueAt(direction, first), toward }
    return [last === 1 ? turned : { ...turned, until: valueAt(direction, last) }]
  }
  return { scene: vary(scene, path, valueAt(direction, share)), turn }
}

function listDirections(scene: Scene, path: string): readonly Direction[] {
  const key = `directions ${path}`
  const known = scene.kept.get(key) as readonly Direction[] | undefined
  if (known) return known
  const used = scene.plan.assumed.get(path)
  const attribute = findSetupField(path)?.attribute
  const found =
    typeof used === 'number' && attribute?.type === 'measure'
      ? attribute.usual.flatMap((end, index): readonly Direction[] => {
          if (index === 0 ? end >= used : end <= used) return []
          const reach = findReach(scene, path, used, end)
          return reach === used ? [] : [{ scene, path, used, reach, toward: index === 0 ? 'less' : 'more' }]
        })
      : []
  scene.kept.set(key, found)
  return found
}

interface Choice {
  readonly path: string
  readonly used: Assumed
  readonly values: readonly Assumed[]
}

/** Every other choice, then two at a time: another voltage brings another plug. */
function* walkChoices(scene: Scene, choices: readonly Choice[]): Generator<Way> {
  const turnTo = ({ path, used }: Choice, turnsAt: Assumed): Turn => ({
    path,
    label: labelSetupPath(path, scene.plan),
    assumed: used,
    turnsAt,
    toward: null,
  })
  for (const one of choices)
    for (const value of one.values) yield { scene: vary(scene, one.path, value), turn: () => [turnTo(one, value)] }
  for (const [index, one] of choices.entries())
    for (const other of choices.slice(index + 1))
      for (const value of one.values)
        for (const also of other.values)
          yield {
            scene: vary(vary(scene, one.path, value), other.path, also),
            turn: () => [turnTo(one, value), turnTo(other, also)],
          }
}

function listChoices(scene: Scene, assumed: readonly string[]): readonly Choice[] {
  return assumed.flatMap((path): readonly Choice[] => {
    const used = scene.plan.assumed.get(path)
    const attribute = findSetupField(path)?.attribute
    if (attribute?.type !== 'choice' || (typeof used !== 'string' && typeof used !== 'number')) return []
    return [{ path, used, values: listUsual(attribute).filter((value) => value !== used) }]
  })
}

/** The ends of all usual ranges, then other choices. */
function* walkWays(scene: Scene, assumed: readonly string[]): Generator<Way> {
  for (const path of assumed) for (const direction of listDirections(scene, path)) yield createWay(direction, 1)
  yield* walkChoices(scene, listChoices(scene, assumed))
}

/** The ways out of some assumptions: found one by one, as far as somebody looks, and kept for whoever looks next. */
export class Ways {
  private readonly found: Way[] = []
  private readonly more: Iterator<Way>

  constructor(
    private readonly scene: Scene,
    private readonly assumed: readonly string[],
  ) {
    this.more = walkWays(scene, assumed)
  }

  find(asked: Asked): Way | undefined {
    const { isKept } = asked
    for (const way of this.found) if (isKept(way.scene)) return way
    for (let next = this.more.next(); !next.done; next = this.more.next()) {
      this.found.push(next.value)
      if (isKept(next.value.scene)) return next.value
    }
    return this.findInside(asked)
  }

  /** Short of the ends: between too little and too much, and where one size of a tank of known volume grows at another's cost. */
  private findInside(asked: Asked): Way | undefined {
    const start = findSide(asked.judgement)
    for (const path of this.assumed)
      for (const direction of listDirections(this.scene, path)) {
        const share = start === undefined ? undefined : this.findBetween(direction, start, asked)
        if (share !== undefined) return createWay(direction, share)
      }
    const trading = listTrading(this.scene)
    for (const path of this.assumed) {
      if (!trading.includes(path)) continue
      for (const direction of listDirections(this.scene, path)) {
        const share = this.findBest(direction, asked)
        if (share !== undefined) return createWay(direction, share)
      }
    }
    return undefined
  }

  /** The share of a direction at which what is measured has come inside an interval that it overshoots at the end. */
  private findBetween(direction: Direction, start: -1 | 0 | 1, { isKept, look }: Asked): number | undefined {
    const end = createWay(direction, 1).scene
    if (start === 0 || findSide(look(end)) !== -start) return undefined
    let [low, high] = [0, 1]
    for (let step = 0; step < 40; step += 1) {
      const middle = (low + high) / 2
      const scene = varyOnce(direction, middle)
      if (isKept(scene)) return middle
      const side = findSide(look(scene))
      if (side === 0 || side === undefined) return undefined
      if (side === start) low = middle
      else high = middle
    }
    return undefined
  }

  /** The share of a direction with the most to spare, where that is enough. */
  private findBest(direction: Direction, { isKept, look, rule }: Asked): number | undefined {
    const sceneAt = (share: number) => vary(direction.scene, direction.path, valueAt(direction, share))
    const inner = listInnerShares(rule).find((share) => isKept(sceneAt(share)))
    if (inner !== undefined || rule.isModelled) return inner
    const marginIn = (scene: Scene): number | null => {
      const judgement = look(scene)
      return judgement && findMargin(rule, judgement)
    }
    const peak = findPeak(
      (share) => marginIn(share === 0 ? direction.scene : sceneAt(share)),
      (share) => marginIn(varyOnce(direction, share)),
    )
    return peak !== undefined && isKept(varyOnce(direction, peak)) ? peak : undefined
  }
}
