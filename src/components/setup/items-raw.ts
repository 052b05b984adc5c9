import { isKindKey, type KindKey } from '#shared/kinds/index'
import type { RawSetup } from './edit-raw'

/** One piece of a setup as its link has it; what could not be read is as it was typed. */
export interface LinkItem {
  readonly id: string
  readonly kind: KindKey | null
  /** Slug of its catalogue entry; null where somebody described it. */
  readonly slug: string | null
  readonly state: 'have' | 'planned' | 'gone'
  readonly quantity: number
}

const stateOf = (text: string | undefined): LinkItem['state'] => (text === 'planned' || text === 'gone' ? text : 'have')

const idOf = (path: string): string | undefined => {
  const [section, id] = path.split('.')
  return section === 'items' ? id : undefined
}

/** The pieces in the order in which the link names them. */
export function listItems(raw: RawSetup): readonly LinkItem[] {
  const ids = [...new Set(Object.keys(raw).flatMap((path) => idOf(path) ?? []))]
  return ids.map((id) => {
    const kind = raw[`items.${id}.kind`] ?? ''
    const quantity = Number(raw[`items.${id}.quantity`] ?? 1)
    return {
      id,
      kind: isKindKey(kind) ? kind : null,
      slug: raw[`items.${id}.gear`] ?? null,
      state: stateOf(raw[`items.${id}.state`]),
      quantity: Number.isInteger(quantity) && quantity > 0 ? quantity : 1,
    }
  })
}

/** The fields of one piece, or with `tank` those of the tank. */
export const pickItem = (raw: RawSetup, id: string): RawSetup =>
  Object.fromEntries(Object.entries(raw).filter(([path]) => isOf(path, id)))

const isOf = (path: string, id: string): boolean =>
  id === 'tank' ? path.startsWith('tank.') : path.startsWith(`items.${id}.`)

export const dropItem = (raw: RawSetup, id: string): RawSetup =>
  Object.fromEntries(Object.entries(raw).filter(([path]) => !isOf(path, id)))

/** A free id that says what it is: `heater`, `heater-2`. */
function chooseId(raw: RawSetup, word: string): string {
  const taken = new Set(listItems(raw).map(({ id }) => id))
  let id = word
  for (let number = 2; taken.has(id); number += 1) id = `${word}-${number}`
  return id
}

export interface Added {
  readonly raw: RawSetup
  readonly id: string
}

/** Puts a piece of the catalogue into the setup, or with no slug one to be described. A tank takes the tank's place. */
export function addItem(raw: RawSetup, kind: KindKey, slug: string | null, quantity = 1): Added {
  if (kind === 'tank') return { raw: slug === null ? raw : { ...raw, 'tank.gear': slug }, id: 'tank' }
  const id = chooseId(raw, kind)
  return {
    id,
    raw: {
      ...raw,
      [`items.${id}.kind`]: kind,
      ...(slug !== null && { [`items.${id}.gear`]: slug }),
      ...(quantity > 1 && { [`items.${id}.quantity`]: String(quantity) }),
    },
  }
}

/** Puts a piece in that is yet to be bought; `word` says what it is for where its kind is not at hand. */
export function planItem(raw: RawSetup, word: string, kind: KindKey | null, slug: string, quantity: number): Added {
  const id = chooseId(raw, word)
  return {
    id,
    raw: {
      ...raw,
      ...(kind !== null && { [`items.${id}.kind`]: kind }),
      [`items.${id}.gear`]: slug,
      ...(quantity > 1 && { [`items.${id}.quantity`]: String(quantity) }),
      [`items.${id}.state`]: 'planned',
    },
  }
}

const namedPlaces = new Set(['display', 'cabinet', 'hang-on', 'outside'])

/** A piece of the catalogue in the place of another, yet to be bought. Of a tank nothing stays, its chambers neither. */
export function replaceItem(raw: RawSetup, id: string, kind: KindKey, slug: string, quantity: number): RawSetup {
  if (id === 'tank') {
    const isOfOldChamber = ([path, text]: readonly [string, string]) =>
      /^items\.[^.]+\.place$/.test(path) && !namedPlaces.has(text)
    const kept = Object.entries(dropItem(raw, 'tank')).filter((entry) => !isOfOldChamber(entry))
    return { ...Object.fromEntries(kept), 'tank.gear': slug }
  }
  const own = pickItem(raw, id)
  const place = own[`items.${id}.place`]
  const height = own[`items.${id}.mountHeightMm`]
  const fields: RawSetup = {
    [`items.${id}.kind`]: kind,
    [`items.${id}.gear`]: slug,
    ...(quantity > 1 && { [`items.${id}.quantity`]: String(quantity) }),
    [`items.${id}.state`]: 'planned',
    ...(place !== undefined && { [`items.${id}.place`]: place }),
    ...(height !== undefined && { [`items.${id}.mountHeightMm`]: height }),
  }
  return putBack(raw, id, fields)
}

/** Other fields for a piece, at its old place among the others. */
export function putBack(raw: RawSetup, id: string, fields: RawSetup): RawSetup {
  const entries = Object.entries(raw)
  const at = entries.findIndex(([path]) => isOf(path, id))
  const kept = entries.filter(([path]) => !isOf(path, id))
  const before = at < 0 ? kept.length : entries.slice(0, at).length
  return Object.fromEntries([...kept.slice(0, before), ...Object.entries(fields), ...kept.slice(before)])
}
