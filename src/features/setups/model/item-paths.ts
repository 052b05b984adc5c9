import { getKind, type KindKey } from '#shared/kinds/index'
import type { SetupField } from '#shared/kinds/setup-fields'
import type { Attribute } from '#shared/kinds/types'
import { findItemField } from '#shared/schemas/setup-link-items'
import type { LinkItem } from '../../../components/setup/items-raw'

/** Kinds whose place in the water is judged. */
const placed: ReadonlySet<KindKey> = new Set<KindKey>(['heater', 'return-pump', 'wavemaker', 'skimmer', 'auto-top-off'])

export const isPlaced = ({ kind }: LinkItem): boolean => kind !== null && placed.has(kind)

/** Points of a curve that a form asks for; a link can hold more. */
const points = 2

function listKeys(attribute: Attribute): readonly string[] {
  if (attribute.type !== 'group') return [attribute.key]
  const keys = attribute.fields.flatMap((field) => (field.type === 'group' ? [] : [field.key]))
  if (!attribute.many) return keys.map((key) => `${attribute.key}.${key}`)
  return Array.from({ length: points }, (_, at) => keys.map((key) => `${attribute.key}.${at}.${key}`)).flat()
}

function toFields({ id, kind }: LinkItem, keys: readonly string[]): readonly SetupField[] {
  return keys.flatMap((key) => {
    const attribute = findItemField(key, kind ?? undefined)
    return attribute ? [{ path: `items.${id}.${key}`, attribute }] : []
  })
}

/** What a piece can be described by; a piece of the catalogue is described there. */
export function listSpecFields(item: LinkItem, role: 'check' | 'other'): readonly SetupField[] {
  if (item.kind === null || item.slug !== null) return []
  const keys = getKind(item.kind)
    .attributes.filter((attribute) => (attribute.role === 'check') === (role === 'check'))
    .flatMap(listKeys)
  return toFields(
    item,
    keys.map((key) => `specs.${key}`),
  )
}

export const listCountFields = (item: LinkItem): readonly SetupField[] =>
  toFields(item, ['quantity', ...(item.kind === 'light' ? ['mountHeightMm'] : [])])

/** Every path of a piece that the form asks for or carries along by itself. */
export function listAskedPaths(item: LinkItem): readonly string[] {
  const own = ['kind', 'gear', 'state', ...(isPlaced(item) ? ['place'] : [])].map((key) => `items.${item.id}.${key}`)
  const fields = [...listCountFields(item), ...listSpecFields(item, 'check'), ...listSpecFields(item, 'other')]
  return [...own, ...fields.map(({ path }) => path)]
}
