import { getAttribute, type KindKey } from '#shared/kinds/index'
import type { FieldAttribute } from '#shared/kinds/types'
import type { UnitSystem } from '#shared/units/systems'
import { matchLabel } from './match-label'
import { readSizes } from './read-sizes'
import { readPastedValue } from './read-value'
import { splitLines, type PastedLine } from './split-lines'

export interface Mapping {
  /** Key of an attribute, or of what names the piece (`brand`, `model`, `gtin`, `status`). */
  readonly key: string
  /** As the form takes it. */
  readonly text: string
  /** The line that it was read from. */
  readonly line: string
}

export interface PasteReading {
  readonly mapped: readonly Mapping[]
  /** Lines of which nothing was understood. */
  readonly unread: readonly string[]
}

const unitInLabel = /[([]\s*([^)\]\d]{1,12})\s*[)\]]\s*$/

/** "Length (mm)", 269: the unit stands with the label. */
function withUnit({ label, text }: PastedLine): string {
  const unit = unitInLabel.exec(label)?.[1]
  return unit !== undefined && /[\d½¼¾]$/.test(text.trim()) ? `${text} ${unit}` : text
}

const rangePattern = /^(\D*?)([\d.,]+)\s*([^\d\s–-]*)\s*(?:-|–|to)\s*([\d.,]+)\s*(\S.*)?$/i

/** "25–100 L" where the kind records both ends of such a range. */
function readRange(text: string, { key }: FieldAttribute, kind: KindKey): readonly Omit<Mapping, 'line'>[] {
  if (!/Min|Max/.test(key)) return []
  const [low, high] = [key.replace('Max', 'Min'), key.replace('Min', 'Max')]
  if (!getAttribute(kind, low) || !getAttribute(kind, high)) return []
  const [, , from, fromUnit, to, unit = ''] = rangePattern.exec(text) ?? []
  if (from === undefined || to === undefined) return []
  return [
    { key: low, text: `${from} ${fromUnit || unit}`.trim() },
    { key: high, text: `${to} ${unit}`.trim() },
  ]
}

function readLine(line: PastedLine, kind: KindKey, system: UnitSystem): readonly Omit<Mapping, 'line'>[] {
  const text = withUnit(line)
  const sizes = readSizes(line.label, text, kind, system)
  if (sizes.length > 0) return sizes
  for (const { attribute } of matchLabel(line.label, kind)) {
    const both = readRange(text, attribute, kind)
    const isReadable = both.every(({ key, text: end }) => {
      const one = getAttribute(kind, key)
      return one !== undefined && one.type !== 'group' && readPastedValue(end, one, system) !== undefined
    })
    if (both.length > 0 && isReadable) return both
    const read = readPastedValue(text, attribute, system)
    if (read !== undefined) return [{ key: attribute.key, text: read }]
  }
  return []
}

/** A table of specs, however it is written, as values of a kind's fields. The first to name a field has it. */
export function readPasted(pasted: string, kind: KindKey, system: UnitSystem): PasteReading {
  const mapped = new Map<string, Mapping>()
  const unread: string[] = []
  for (const line of splitLines(pasted)) {
    const found = readLine(line, kind, system).filter(({ key }) => !mapped.has(key))
    if (found.length === 0) unread.push(line.whole)
    for (const { key, text } of found) mapped.set(key, { key, text, line: line.whole })
  }
  return { mapped: [...mapped.values()], unread }
}
