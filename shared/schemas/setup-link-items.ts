import { getAttribute, isKindKey, kindKeys } from '../kinds/index'
import type { FieldAttribute, GroupAttribute } from '../kinds/types'
import { limits } from '../limits'

const places = ['display', 'cabinet', 'hang-on', 'outside'] as const

const options = (values: readonly string[]) => values.map((value) => ({ value, label: value }))

/** The fields of an item beside its specs, in the order in which a link writes them. */
const ownFields: readonly FieldAttribute[] = [
  { key: 'kind', label: 'kind', type: 'choice', role: 'check', options: options(kindKeys) },
  { key: 'gear', label: 'gear', type: 'text', role: 'check', maxLength: limits.slug },
  {
    key: 'quantity',
    label: 'quantity',
    type: 'measure',
    role: 'check',
    unit: 'count',
    plausible: [1, limits.quantity],
    usual: [1, 4],
  },
  { key: 'state', label: 'state', type: 'choice', role: 'check', options: options(['have', 'planned', 'gone']) },
  { key: 'place', label: 'place', type: 'text', role: 'check', maxLength: limits.itemId, word: true },
  {
    key: 'mountHeightMm',
    label: 'lamp above the water',
    type: 'measure',
    role: 'check',
    unit: 'mm',
    plausible: [0, 5000],
    usual: [60, 500],
  },
]

export const itemFieldKeys = ownFields.map(({ key }) => key)

/** The field of a group that the last words of a path name: `headM`, or in a list of groups `0.headM`. */
function findGroupField({ fields, many }: GroupAttribute, words: readonly string[]): FieldAttribute | undefined {
  const [key, ...deeper] = many && /^\d{1,2}$/.test(words[0] ?? '') ? words.slice(1) : many ? [] : words
  const field = deeper.length === 0 ? fields.find((one) => one.key === key) : undefined
  return field?.type === 'group' ? undefined : field
}

/** The field that `items.<id>.<rest>` names; specs are told apart by the item's kind. */
export function findItemField(rest: string, kind: string | undefined): FieldAttribute | undefined {
  const own = ownFields.find(({ key }) => key === rest)
  if (own !== undefined) return own
  const [section, key, ...deeper] = rest.split('.')
  if (section !== 'specs' || key === undefined) return undefined
  const attribute = kind !== undefined && isKindKey(kind) ? getAttribute(kind, key) : undefined
  if (attribute?.type === 'group') return findGroupField(attribute, deeper)
  return deeper.length > 0 ? undefined : attribute
}

/** Lists of groups come as objects by place; a piece of which only the kind is told has no specs yet. */
export function toItemSpecs(item: Readonly<Record<string, unknown>>): Record<string, unknown> | undefined {
  const { kind, gear, specs } = item
  if (typeof kind !== 'string' || !isKindKey(kind)) return specs as Record<string, unknown> | undefined
  if (specs === undefined) return gear === undefined ? {} : undefined
  return Object.fromEntries(
    Object.entries(specs as Record<string, unknown>).map(([key, value]) => {
      const attribute = getAttribute(kind, key)
      const isList = attribute?.type === 'group' && attribute.many
      return [key, isList ? Object.values(value as Record<string, unknown>) : value]
    }),
  )
}

/** A place in one word: where it is none of the named ones, it is a chamber's id. */
export function readItemPlace(word: string): { readonly in: (typeof places)[number] } | { readonly chamber: string } {
  const named = places.find((place) => place === word)
  return named === undefined ? { chamber: word } : { in: named }
}
