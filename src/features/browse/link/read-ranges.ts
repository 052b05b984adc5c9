import { listFilterable } from '#shared/schemas/gear-filters'
import type { KindKey } from '#shared/kinds/index'
import type { MeasureAttribute } from '#shared/kinds/types'
import { readMeasure } from '#shared/units/read'
import type { UnitSystem } from '#shared/units/systems'
import { parseRange, writeRange } from '../../../lib/ranges'

export type End = 'from' | 'to'

/** A filter that cannot be used: what was typed, and why. */
export interface FilterProblem {
  /** The attribute, or another key of the address. */
  readonly key: string
  readonly end?: End
  readonly text: string
  readonly detail: string
}

export const endKey = (key: string, end: End): string => `${key}.${end}`

interface ReadEnds {
  readonly text: string | undefined
  readonly problems: readonly FilterProblem[]
}

function readEnds(
  attribute: MeasureAttribute,
  params: ReadonlyMap<string, string>,
  system: UnitSystem,
): ReadEnds | null {
  const { key, unit } = attribute
  const ends = (['from', 'to'] as const).filter((end) => params.has(endKey(key, end)))
  if (ends.length === 0) return null
  const whole = params.get(key)
  if (whole === 'unknown') return { text: whole, problems: [] }
  const range = { from: null, to: null, ...parseRange(whole) }
  const problems: FilterProblem[] = []
  for (const end of ends) {
    const text = params.get(endKey(key, end)) ?? ''
    if (text.trim() === '') {
      range[end] = null
      continue
    }
    const reading = readMeasure(text, unit, system)
    if (reading.ok) range[end] = reading.value
    else problems.push({ key, end, text, detail: reading.reason })
  }
  const isOpen = range.from === null && range.to === null
  return { text: isOpen ? undefined : writeRange(range), problems }
}

export interface RangesRead {
  /** The same entries with the ends of ranges put together, in the canonical unit. */
  readonly entries: ReadonlyMap<string, string>
  readonly problems: readonly FilterProblem[]
}

/** A form sends both ends of a range as typed; an address holds them as one canonical text. */
export function readRanges(kind: KindKey | null, params: ReadonlyMap<string, string>, system: UnitSystem): RangesRead {
  const entries = new Map(params)
  const problems: FilterProblem[] = []
  if (kind === null) return { entries, problems }
  for (const attribute of listFilterable(kind)) {
    if (attribute.type !== 'measure') continue
    const read = readEnds(attribute, params, system)
    if (read === null) continue
    entries.delete(endKey(attribute.key, 'from'))
    entries.delete(endKey(attribute.key, 'to'))
    if (read.text === undefined) entries.delete(attribute.key)
    else entries.set(attribute.key, read.text)
    problems.push(...read.problems)
  }
  return { entries, problems }
}
