import type { KindKey } from '../../kinds/index'
import { createScene, withItems, type Scene } from '../scene'
import { resolve } from '../setup/resolve'
import type { Setup } from '../types'

/** What a piece of a kind is drawn in: the setup without what it takes the place of. RangeError without size and volume. */
export function sceneFor(setup: Setup, kind: KindKey): Scene {
  const others = setup.items.filter(({ state, piece }) => state !== 'gone' && piece.kind !== kind)
  return createScene(resolve(withItems(setup, others)), others)
}
