import type { GearCount } from '#shared/engine/swap/types'
import type { Replacement } from '#shared/engine/swap/types'
import type { UnitSystem } from '#shared/units/systems'
import type { RawSetup } from '../../../components/setup/edit-raw'
import { planItem, replaceItem } from '../../../components/setup/items-raw'
import { writeSetupHref } from '../../../components/setup/setup-href'
import { writeUndo } from '../../../components/setup/undo'
import { paths } from '../../../config/paths'

export interface PutIn {
  readonly itemId: string
  readonly answer: Pick<Replacement, 'kind' | 'pieces'>
  /** Pieces that go in with it, by what they are for. */
  readonly extras: readonly { readonly need: string; readonly pieces: readonly GearCount[] }[]
}

const toWord = (need: string): string => need.toLowerCase().replaceAll(/[^a-z0-9-]+/g, '-') || 'extra'

/** The setup with the piece, and whatever goes with it, in the place of what is gone; the report's address for it. */
export function writePutInHref(raw: RawSetup, { itemId, answer, extras }: PutIn, system: UnitSystem): string | null {
  const [first, ...rest] = answer.pieces.flatMap(({ gear, quantity }) => (gear ? [{ gear, quantity }] : []))
  if (!first) return null
  const added: string[] = []
  let next = replaceItem(raw, itemId, answer.kind, first.gear.slug, first.quantity)
  const put = (word: string, kind: Replacement['kind'] | null, { gear, quantity }: GearCount) => {
    const planned = planItem(next, word, kind, gear.slug, quantity)
    next = planned.raw
    added.push(planned.id)
  }
  for (const piece of rest) put(answer.kind, answer.kind, piece)
  for (const { need, pieces } of extras) for (const piece of pieces) put(toWord(need), null, piece)
  return writeSetupHref(paths.setup, next, system, { undo: writeUndo(raw, itemId, added) })
}
