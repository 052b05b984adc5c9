import { getKind, type KindKey } from '../kinds/index'
import type { Attribute, BareSpecs, GroupAttribute } from '../kinds/types'
import type { Printer } from '../units/print'
import { judgePairs } from './judge-pairs'
import { judgeValue } from './judge-value'
import type { Doubt, SpecsChange } from './types'

const isObject = (value: unknown): value is BareSpecs =>
  typeof value === 'object' && value !== null && !Array.isArray(value)

const toNumber = (value: unknown): number | undefined => (typeof value === 'number' ? value : undefined)

/** The entry that this one was: the same id, else the same place in the list. */
function findEarlier(entry: BareSpecs, at: number, earlier: readonly unknown[]): BareSpecs {
  const found =
    entry['id'] === undefined ? earlier[at] : earlier.find((one) => isObject(one) && one['id'] === entry['id'])
  return isObject(found) ? found : {}
}

const toList = (value: unknown): readonly unknown[] =>
  Array.isArray(value) ? value : value === undefined ? [] : [value]

function judgeGroup(group: GroupAttribute, path: string, value: unknown, before: unknown, printer: Printer): Doubt[] {
  const earlier = toList(before)
  return toList(value).flatMap((entry, at) => {
    if (!isObject(entry)) return []
    const was = findEarlier(entry, at, earlier)
    const place = group.many ? `${path}.${at}` : path
    return group.fields.flatMap((field) =>
      judge(field, `${place}.${field.key}`, entry[field.key], was[field.key], printer),
    )
  })
}

function judge(
  attribute: Attribute,
  path: string,
  value: unknown,
  before: unknown,
  printer: Printer,
): readonly Doubt[] {
  if (attribute.type === 'group') return judgeGroup(attribute, path, value, before, printer)
  if (attribute.type !== 'measure' || typeof value !== 'number') return []
  const doubt = judgeValue(path, attribute, value, toNumber(before), printer)
  return doubt ? [doubt] : []
}

/**
 * Every number of a change that deserves a second look, in the order of the spec sheet: at most one question a number,
 * and none about what stays as it is. Total: values of a wrong type are somebody else's finding.
 */
export function findDoubts(kind: KindKey, change: SpecsChange, printer: Printer): readonly Doubt[] {
  const { values, before } = change
  const single = getKind(kind).attributes.flatMap((attribute) =>
    judge(attribute, attribute.key, values[attribute.key], before[attribute.key], printer),
  )
  const asked = new Set(single.map(({ path }) => path))
  return [...single, ...judgePairs(kind, change, printer).filter(({ path }) => !asked.has(path))]
}
