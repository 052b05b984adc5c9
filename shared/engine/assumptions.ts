import { findSetupField } from '../kinds/setup-fields'
import type { Printer } from '../units/print'
import type { Plan } from './setup/plan'
import type { Assumption } from './types'

type Value = Assumption['value']

/** A setup value in words and the reader's units; undefined where no field describes the path. */
export function printSetupValue(path: string, value: Value, words: Printer): string | undefined {
  if (path === 'goals.turnoverPerHour' && Array.isArray(value)) return words.pair(value as [number, number], '/h')
  const attribute = findSetupField(path)?.attribute
  if (!attribute) return undefined
  if (attribute.type === 'measure' && typeof value === 'number') return words.measure(value, attribute.unit)
  if (typeof value === 'boolean') return value ? 'yes' : 'no'
  const label = (one: unknown) =>
    ('options' in attribute && attribute.options.find((option) => option.value === String(one))?.label) || String(one)
  if (Array.isArray(value)) return value.length === 0 ? 'none' : value.map(label).join(', ')
  return label(value)
}

/** "coldest room"; a chamber's field names the chamber: "water depth of the rear chamber". */
export function labelSetupPath(path: string, { tank }: Plan): string {
  if (path === 'goals.turnoverPerHour') return 'turnover'
  const label = findSetupField(path)?.attribute.label ?? path
  const [, list, place] = path.split('.')
  const chamber = list === 'chambers' ? tank.chambers[Number(place)] : undefined
  return chamber ? `${label.replace(/^chamber /, '')} of the ${chamber.name}` : label
}

/** Every default used, in words: "Coldest room: 18 °C, assumed." */
export function listAssumptions(plan: Plan, words: Printer): readonly Assumption[] {
  return [...plan.assumed].map(([key, value]) => {
    const label = labelSetupPath(key, plan)
    const printed = printSetupValue(key, value, words) ?? String(value)
    return { key, value, message: `${label[0]?.toUpperCase()}${label.slice(1)}: ${printed}, assumed.` }
  })
}
