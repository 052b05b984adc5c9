import type { Bench } from '../bench'
import { assessAll, judgeAll } from '../assess'
import { nameOf, type RawKnockOn } from '../knock-ons'
import { createScene } from '../scene'
import type { Item } from '../types'
import { isHelperKind } from './meeting-kinds'
import { assessOutfit, changeItems, describeState, findNew, isWorseOff, type Outfit, type State } from './outfit'

/** Whether something would be asked for, or fail or stay unjudged, that is not so in the other state. */
const isWorse = (state: State, than: State): boolean =>
  findNew(state.unmet, than.unmet).length > 0 || isWorseOff(state, than)

/** The setup as it was, what is gone still there, without one of its items. */
function assessWithout({ before, kind, gone }: Bench, item: Item): State {
  const { plan } = before
  const items = plan.items.filter((other) => other !== item)
  const tank = kind === 'tank' && gone ? judgeAll(createScene(plan, items), gone.item) : []
  return describeState(assessAll(plan, items), tank)
}

/** Items of the setup as it was, of kinds that serve others, without which something would have been asked for. */
export const listNeeded = (bench: Bench, before: State): readonly Item[] =>
  bench.scene.others
    .filter(({ piece }) => isHelperKind(piece.kind))
    .filter((item) => isWorse(assessWithout(bench, item), before))

/** Of the items that something needed before, those that nothing needs with the replacement: a controller for a heater that has its own. */
export function findFreed(outfit: Outfit, needed: readonly Item[], after: State): readonly RawKnockOn[] {
  return needed.flatMap((item): RawKnockOn[] => {
    const without = changeItems(
      outfit,
      outfit.items.filter(({ id }) => id !== item.id),
    )
    if (isWorse(assessOutfit(without), after)) return []
    return [
      { kind: 'freed', subject: item.id, from: null, to: null, say: () => `${nameOf(item)} is no longer needed.` },
    ]
  })
}
