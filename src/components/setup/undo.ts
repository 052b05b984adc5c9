import type { RawSetup } from './edit-raw'
import { dropItem, pickItem, putBack } from './items-raw'

/** What was in the place of a piece before it was swapped, and what came with the swap; one text in the address. */
export interface Undo {
  readonly id: string
  readonly fields: RawSetup
  readonly added: readonly string[]
}

const longest = 3_000

/** Undefined where it is too much for an address. */
export function writeUndo(raw: RawSetup, id: string, added: readonly string[] = []): string | undefined {
  const text = `${[id, ...added].join('.')}~${new URLSearchParams(pickItem(raw, id)).toString()}`
  return text.length > longest ? undefined : text
}

/** Null where there is nothing to go back to. */
export function readUndo(text: string | null): Undo | null {
  if (text === null || text.length > longest) return null
  const [, ids = '', query = ''] = /^([A-Za-z0-9][\w-]*(?:\.[A-Za-z0-9][\w-]*)*)~(.+)$/.exec(text) ?? []
  const [id = '', ...added] = ids.split('.')
  const fields = pickItem(Object.fromEntries(new URLSearchParams(query)), id)
  return Object.keys(fields).length === 0 ? null : { id, fields, added }
}

export const applyUndo = (raw: RawSetup, { id, fields, added }: Undo): RawSetup =>
  putBack(
    added.reduce<RawSetup>((left, one) => dropItem(left, one), raw),
    id,
    fields,
  )
