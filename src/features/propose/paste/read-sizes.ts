import { getAttribute, type KindKey } from '#shared/kinds/index'
import { readSize } from '#shared/units/read-size'
import type { UnitSystem } from '#shared/units/systems'

export interface SizePart {
  readonly key: string
  readonly text: string
}

const keysInOrder: readonly (readonly string[])[] = [
  ['outerLengthMm', 'outerWidthMm', 'outerHeightMm'],
  ['topLengthMm', 'topWidthMm', 'heightMm'],
  ['lengthMm', 'widthMm', 'heightMm'],
]
const rodKeys = ['lengthMm', 'diameterMm']

const separator = /\s*(?:×|\*|x|\bby\b)\s*/i

/** Which of the three each letter of "W x D x H" names; the longer plan side is the length all the same. */
function findHeight(label: string): number {
  const letters = /\b([lwdh])\s*[x×*]\s*([lwdh])\s*[x×*]\s*([lwdh])\b/i.exec(label)
  const at = letters?.slice(1).findIndex((letter) => letter.toLowerCase() === 'h') ?? -1
  return at === -1 ? 2 : at
}

interface Part {
  readonly text: string
  readonly mm: number
}

const findKeys = (kind: KindKey, count: number): readonly string[] | undefined =>
  count === 2
    ? rodKeys.every((key) => getAttribute(kind, key))
      ? rodKeys
      : undefined
    : keysInOrder.find((keys) => keys.every((key) => getAttribute(kind, key)))

/** "24 x 18 x 12 in" as the sides of the piece, each with the unit that it was meant in; nothing where it is no size. */
export function readSizes(label: string, text: string, kind: KindKey, system: UnitSystem): readonly SizePart[] {
  const bare = text.replace(/\s*\((?=[^)]*\d)[^)]*\)\s*$/, '').replace(/([\d"'.\s])[lwdh]\b/gi, '$1')
  const reading = readSize(bare, system)
  if (!reading.ok) return []
  const keys = findKeys(kind, reading.valuesMm.length)
  if (!keys) return []
  const typed = bare.trim().split(separator)
  const unit = /[^\d.,/\s½¼¾]+\.?$/.exec(typed.at(-1) ?? '')?.[0] ?? ''
  const parts = typed.map((part, at): Part => {
    const isBare = /[\d½¼¾]$/.test(part)
    return { text: isBare && unit !== '' ? `${part} ${unit}` : part, mm: reading.valuesMm[at] ?? 0 }
  })
  const height = keys.length === 3 ? parts.splice(findHeight(`${label} ${text}`), 1) : []
  const ordered = [...parts.toSorted((a, b) => b.mm - a.mm), ...height]
  return ordered.flatMap((part, at) => (keys[at] === undefined ? [] : [{ key: keys[at], text: part.text }]))
}
