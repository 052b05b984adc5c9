import { findSetupField } from '../kinds/setup-fields'
import type { Attribute } from '../kinds/types'
import type { Printer } from '../units/print'
import { labelSetupPath } from './assumptions'
import { findLast } from './physics/bisect'
import type { Say } from './rule'
import { once, vary, type Scene } from './scene'
import { findContradictions } from './setup/contradictions'
import { giveValue } from './setup/give'
import { listUsual } from './usual'

type Assumed = number | string

/** One assumed value, and the value from which on (`toward`) a check is kept; a choice has no way. */
interface Turn {
  readonly path: string
  readonly label: string
  readonly turnsAt: Assumed
  readonly toward: 'more' | 'less' | null
  readonly assumed: Assumed
}

/** What has to hold instead of what was assumed. */
export type Condition = readonly Turn[]

/** Whether the check is kept in that scene. */
type IsKept = (scene: Scene) => boolean

const countContradictions = ({ plan }: Scene): number => findContradictions(plan.setup).length

/** How far towards `end` an assumed value can go before the rest of what was said rules it out. */
function findReach(scene: Scene, path: string, used: number, end: number): number {
  const key = `reach ${path} ${end}`
  const known = scene.kept.get(key)
  if (typeof known === 'number') return known
  const before = once(scene, countContradictions)
  const isPossible = (share: number) =>
    findContradictions(giveValue(scene.plan.setup, path, used + share * (end - used))).length <= before
  const reach = used + (findLast(isPossible, 0, 1, 1e-3) ?? 0) * (end - used)
  scene.kept.set(key, reach)
  return reach
}

function turnMeasure(scene: Scene, path: string, used: number, usual: readonly [number, number], isKept: IsKept) {
  for (const [index, end] of usual.entries()) {
    if (index === 0 ? end >= used : end <= used) continue
    const reach = findReach(scene, path, used, end)
    if (reach === used || !isKept(vary(scene, path, reach))) continue
    return (): Condition => {
      const at = (share: number) => used + share * (reach - used)
      const fails = (share: number) => !isKept(vary({ ...scene, kept: new Map() }, path, at(share)))
      const turnsAt = at(findLast(fails, 0, 1) ?? 0)
      const toward = index === 0 ? 'less' : 'more'
      return [{ path, label: labelSetupPath(path, scene.plan), assumed: used, turnsAt, toward }]
    }
  }
  return undefined
}

interface Choice {
  readonly path: string
  readonly used: Assumed
  readonly values: readonly Assumed[]
}

/** The first choice that keeps the check, else the first two together: another voltage brings another plug. */
function turnChoices(scene: Scene, choices: readonly Choice[], isKept: IsKept): (() => Condition) | undefined {
  const toTurn = ({ path, used }: Choice, turnsAt: Assumed): Turn => ({
    path,
    label: labelSetupPath(path, scene.plan),
    assumed: used,
    turnsAt,
    toward: null,
  })
  for (const one of choices)
    for (const value of one.values) if (isKept(vary(scene, one.path, value))) return () => [toTurn(one, value)]
  for (const [index, one] of choices.entries())
    for (const other of choices.slice(index + 1))
      for (const value of one.values)
        for (const also of other.values)
          if (isKept(vary(vary(scene, one.path, value), other.path, also)))
            return () => [toTurn(one, value), toTurn(other, also)]
  return undefined
}

/**
 * What would keep a check that fails on assumed values: one of them elsewhere in its usual range, as far as the rest of
 * the setup allows, or other choices. Undefined where nothing does.
 */
export function findCondition(scene: Scene, assumed: readonly string[], isKept: IsKept): (() => Condition) | undefined {
  const choices: Choice[] = []
  for (const path of assumed) {
    const used = scene.plan.assumed.get(path)
    const attribute = findSetupField(path)?.attribute
    if (typeof used === 'number' && attribute?.type === 'measure') {
      const condition = turnMeasure(scene, path, used, attribute.usual, isKept)
      if (condition) return condition
    } else if (attribute?.type === 'choice' && (typeof used === 'string' || typeof used === 'number'))
      choices.push({ path, used, values: listUsual(attribute).filter((value) => value !== used) })
  }
  return turnChoices(scene, choices, isKept)
}

function printTurn({ path, turnsAt, assumed, toward }: Turn, words: Printer): readonly [string, string] {
  const attribute: Attribute | undefined = findSetupField(path)?.attribute
  if (attribute?.type === 'measure' && typeof turnsAt === 'number' && typeof assumed === 'number') {
    const [at, was] = words.apart(turnsAt, assumed, attribute.unit)
    return [`${toward === 'less' ? 'at most' : 'at least'} ${at}`, was]
  }
  const label = (value: Assumed) =>
    (attribute?.type === 'choice' && attribute.options.find((option) => option.value === String(value))?.label) ||
    String(value)
  return [label(turnsAt), label(assumed)]
}

/** "It works if the coldest room is at least 20.8 °C; we assumed 18 °C." */
export const describeCondition =
  (condition: Condition): Say =>
  (words) => {
    const turns = condition.map((turn) => ({ label: turn.label, printed: printTurn(turn, words) }))
    const wanted = turns.map(({ label, printed }) => `the ${label} is ${printed[0]}`).join(' and ')
    return `It works if ${wanted}; we assumed ${turns.map(({ printed }) => printed[1]).join(' and ')}.`
  }
