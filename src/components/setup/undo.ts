import type { RawSetup } from './edit-raw'
import { dropItem, pickItem, putBack } from './items-raw'

/** What was in the place of a piece before it was swapped, and what came with the swap; one text in the address. */
export interface Undo {
  readonly id: string
  readonly fields: RawSetup
  readonly added: readonly string[]
}

const longest = 3_000

/** With a tank go the places of what stood in its chambers. */
const isOfSwap = (path: string, id: string): boolean => id === 'tank' && /^items\.[^.]+\.place$/.test(path)

function pickSwapped(raw: RawSetup, id: string): RawSetup {
  const places = Object.entries(raw).filter(([path]) => isOfSwap(path, id))
  return { ...pickItem(raw, id), ...Object.fromEntries(places) }
}

/** Undefined where it is too much for an address. */
export function writeUndo(raw: RawSetup, id: string, added: readonly string[] = []): string | undefined {
  const text = `${[id, ...added].join('.')}~${new URLSearchParams(pickSwapped(raw, id)).toString()}`
  return text.length > longest ? undefined : text
}

/** Null where there is nothing to go back to. */
export function readUndo(text: string | null): Undo | null {
  if (text === null || text.length > longest) return null
  const [, ids = '', query = ''] = /^([A-Za-z0-9][\w-]*(?:\.[A-Za-z0-9][\w-]*)*)~(.+)$/.exec(text) ?? []
  const [id = '', ...added] = ids.split('.')
  const fields = pickSwapped(Object.fromEntries(new URLSearchParams(query)), id)
  return Object.keys(fields).length === 0 ? null : { id, fields, added }
}

export function applyUndo(raw: RawSetup, { id, fields, added }: Undo): RawSetup {
  const left = added.reduce<RawSetup>((rest, one) => dropItem(rest, one), raw)
  const own = Object.entries(fields).filter(([path]) => !isOfSwap(path, id))
  const places = Object.entries(fields).filter(([path]) => isOfSwap(path, id))
  return { ...putBack(left, id, Object.fromEntries(own)), ...Object.fromEntries(places) }
}
