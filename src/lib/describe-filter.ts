import type { KindKey } from '#shared/kinds/index'
import type { MeasureAttribute, Option } from '#shared/kinds/types'
import { identityAttributes } from '#shared/kinds/common'
import { listFilterable, type FilterableAttribute } from '#shared/schemas/gear-filters'
import { toShown } from '#shared/units/convert'
import { createPrinter, type Printer } from '#shared/units/print'
import { readMeasure } from '#shared/units/read'
import { parseRange } from './ranges'

export const unknownText = 'not recorded yet'

const exact = { exact: true } as const
const metric = createPrinter('metric')

/** An end of a range as its field shows it: in the visitor's unit where that says it wholly, else in the stored one. */
export function printEnd(value: number, { unit }: MeasureAttribute, printer: Printer): string {
  const text = printer.number(value, unit, exact)
  const reading = readMeasure(text, unit, printer.system)
  if (reading.ok && reading.value === value) return text
  return `${toShown(value, unit, 'metric')} ${metric.unitLabel(unit)}`.trim()
}

function describeRange(attribute: MeasureAttribute, text: string, printer: Printer): string {
  const { unit } = attribute
  const range = parseRange(text)
  if (range === null) return text
  const { from, to } = range
  if (from !== null && to !== null) {
    const [low, high] = printer.apart(from, to, unit)
    return from === to ? low : `${low} to ${high}`
  }
  if (from !== null) return `at least ${printer.measure(from, unit)}`
  return to === null ? '' : `at most ${printer.measure(to, unit)}`
}

const yesAndNo: readonly Option[] = [
  { value: 'true', label: 'yes' },
  { value: 'false', label: 'no' },
]

/** What an attribute that is no measure can be chosen as. */
export function listOptions(attribute: Exclude<FilterableAttribute, MeasureAttribute>): readonly Option[] {
  return attribute.type === 'boolean' ? yesAndNo : attribute.options
}

const describeOptions = (options: readonly Option[], text: string): string =>
  text
    .split(',')
    .map((value) => options.find((option) => option.value === value)?.label ?? value)
    .join(' or ')

const statuses = identityAttributes.flatMap((attribute) =>
  attribute.key === 'status' && attribute.type === 'choice' ? attribute.options : [],
)

export function findFilterable(kind: KindKey | null, key: string): FilterableAttribute | undefined {
  return kind === null ? undefined : listFilterable(kind).find((attribute) => attribute.key === key)
}

/** "length 10 in to 12 in", "form glass rod or titanium rod", "power not recorded yet" */
export function describeFilter(kind: KindKey | null, key: string, text: string, printer: Printer): string {
  if (key === 'q') return `“${text}”`
  if (key === 'status') return describeOptions(statuses, text)
  const attribute = findFilterable(kind, key)
  if (attribute === undefined) return `${key} ${text.replaceAll(',', ' or ')}`
  const { label } = attribute
  if (text === 'unknown') return `${label} ${unknownText}`
  if (attribute.type === 'measure') return `${label} ${describeRange(attribute, text, printer)}`
  return `${label}: ${describeOptions(listOptions(attribute), text)}`
}
