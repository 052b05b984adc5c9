import { findSetupField } from '../kinds/setup-fields'
import type { Attribute } from '../kinds/types'
import type { Printer } from '../units/print'
import type { Say } from './rule'
import type { Scene } from './scene'
import { Ways, type Asked, type Condition, type Turn } from './ways'

/**
 * What would keep a check that fails on assumed values: one of them elsewhere in its usual range, as far as the rest of
 * the setup allows, or other choices. Undefined where nothing does.
 */
export function findCondition(scene: Scene, assumed: readonly string[], asked: Asked): (() => Condition) | undefined {
  if (assumed.length === 0) return undefined
  const key = `ways out of ${assumed.join(' ')}`
  let ways = scene.kept.get(key) as Ways | undefined
  if (!ways) scene.kept.set(key, (ways = new Ways(scene, assumed)))
  const way = ways.find(asked)
  if (!way) return undefined
  let condition: Condition | undefined
  return () => (condition ??= way.turn(asked.isKept))
}

function printTurn({ path, turnsAt, until, assumed, toward }: Turn, words: Printer): readonly [string, string] {
  const attribute: Attribute | undefined = findSetupField(path)?.attribute
  if (attribute?.type === 'measure' && typeof turnsAt === 'number' && typeof assumed === 'number') {
    const [at, was] = words.apart(turnsAt, assumed, attribute.unit)
    if (until !== undefined) {
      const ends = [Math.min(turnsAt, until), Math.max(turnsAt, until)] as const
      return [words.pair(ends, attribute.unit), was]
    }
    return [`${toward === 'less' ? 'at most' : 'at least'} ${at}`, was]
  }
  const label = (value: string | number) =>
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
