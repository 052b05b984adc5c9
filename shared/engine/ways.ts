import { findSetupField } from '../kinds/setup-fields'
import { labelSetupPath } from './assumptions'
import { findLast } from './physics/bisect'
import { once, vary, type Scene } from './scene'
import { findContradictions } from './setup/contradictions'
import { giveValue } from './setup/give'
import { listUsual } from './usual'

type Assumed = number | string

/** One assumed value, and the value from which on (`toward`) a check is kept; a choice has no way. */
export interface Turn {
  readonly path: string
  readonly label: string
  readonly turnsAt: Assumed
  readonly toward: 'more' | 'less' | null
  readonly assumed: Assumed
}

/** What has to hold instead of what was assumed. */
export type Condition = readonly Turn[]

/** Whether the check is kept in that scene. */
export type IsKept = (scene: Scene) => boolean

/** A setup that could as well be meant, and what would have to hold for a check that is kept in it. */
export interface Way {
  readonly scene: Scene
  readonly turn: (isKept: IsKept) => Condition
}

const countContradictions = ({ plan }: Scene): number => findContradictions(plan.setup).length

/** How far towards `end` an assumed value can go before the rest of what was said rules it out. */
function findReach(scene: Scene, path: string, used: number, end: number): number {
  const before = once(scene, countContradictions)
  const isPossible = (share: number) =>
    findContradictions(giveValue(scene.plan.setup, path, used + share * (end - used))).length <= before
  return used + (findLast(isPossible, 0, 1, 1e-3) ?? 0) * (end - used)
}

/** A measure as far as it can go towards either end of its usual range. */
function findMeasureWays(scene: Scene, path: string, used: number, usual: readonly [number, number]): readonly Way[] {
  return usual.flatMap((end, index): Way[] => {
    if (index === 0 ? end >= used : end <= used) return []
    const reach = findReach(scene, path, used, end)
    if (reach === used) return []
    const turn = (isKept: IsKept): Condition => {
      const at = (share: number) => used + share * (reach - used)
      const fails = (share: number) => !isKept(vary({ ...scene, kept: new Map() }, path, at(share)))
      const turnsAt = at(findLast(fails, 0, 1) ?? 0)
      const toward = index === 0 ? 'less' : 'more'
      return [{ path, label: labelSetupPath(path, scene.plan), assumed: used, turnsAt, toward }]
    }
    return [{ scene: vary(scene, path, reach), turn }]
  })
}

const findWaysOfMeasure = (scene: Scene, path: string, used: number, usual: readonly [number, number]) => {
  const key = `ways ${path}`
  const known = scene.kept.get(key) as readonly Way[] | undefined
  if (known) return known
  const found = findMeasureWays(scene, path, used, usual)
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

function* walkWays(scene: Scene, assumed: readonly string[]): Generator<Way> {
  const choices: Choice[] = []
  for (const path of assumed) {
    const used = scene.plan.assumed.get(path)
    const attribute = findSetupField(path)?.attribute
    if (typeof used === 'number' && attribute?.type === 'measure')
      yield* findWaysOfMeasure(scene, path, used, attribute.usual)
    else if (attribute?.type === 'choice' && (typeof used === 'string' || typeof used === 'number'))
      choices.push({ path, used, values: listUsual(attribute).filter((value) => value !== used) })
  }
  yield* walkChoices(scene, choices)
}

/** The ways out of some assumptions: found one by one, as far as somebody looks, and kept for whoever looks next. */
export class Ways {
  private readonly found: Way[] = []
  private readonly more: Iterator<Way>

  constructor(scene: Scene, assumed: readonly string[]) {
    this.more = walkWays(scene, assumed)
  }

  find(isKept: IsKept): Way | undefined {
    for (const way of this.found) if (isKept(way.scene)) return way
    for (let next = this.more.next(); !next.done; next = this.more.next()) {
      this.found.push(next.value)
      if (isKept(next.value.scene)) return next.value
    }
    return undefined
  }
}
