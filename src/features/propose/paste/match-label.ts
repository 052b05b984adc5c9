import { identityAttributes } from '#shared/kinds/common'
import { getKind, type KindKey } from '#shared/kinds/index'
import type { Attribute, FieldAttribute } from '#shared/kinds/types'

/** How makers' sheets call what the spec sheet calls otherwise: words of a label, and the words that they stand for. */
const synonyms: Readonly<Record<string, string>> = {
  dia: 'diameter',
  thickness: 'thickness diameter',
  wattage: 'power',
  watts: 'power',
  watt: 'power',
  consumption: 'power',
  weight: 'mass',
  depth: 'width depth',
  capacity: 'volume',
  tank: 'tank volume',
  aquarium: 'volume',
  gph: 'flow',
  lph: 'flow',
  cable: 'cord',
  lead: 'cord',
  voltage: 'mains voltage',
  input: 'mains voltage',
  minimum: 'smallest least',
  min: 'smallest least',
  maximum: 'largest maximum most',
  max: 'largest maximum most',
  manufacturer: 'brand',
  maker: 'brand',
  make: 'brand',
  name: 'model',
  product: 'model',
  ean: 'barcode number gtin',
  upc: 'barcode number gtin',
  gtin: 'barcode number gtin',
  glass: 'wall thickness',
  outlet: 'bore outlet',
  sockets: 'outlets',
  par: 'par',
  exterior: 'outside',
  external: 'outside',
  overall: 'outside',
}

const silent = new Set([
  'the',
  'of',
  'a',
  'an',
  'in',
  'for',
  'and',
  'or',
  'its',
  'rated',
  'total',
  'size',
  'rate',
  'type',
])

/** "Length (mm)" and "Max. flow": words alone, without brackets. */
const readWords = (label: string): string[] =>
  label
    .toLowerCase()
    .replace(/\([^)]*\)|\[[^\]]*\]/g, ' ')
    .split(/[^\p{L}\p{N}]+/u)
    .filter((word) => word !== '')

const toTerms = (label: string): ReadonlySet<string> =>
  new Set(
    readWords(label)
      .flatMap((word) => (synonyms[word] ?? word).split(' '))
      .filter((word) => !silent.has(word)),
  )

/** Shared words over all words of the two: 1 where they say the same. */
function compareTerms(a: ReadonlySet<string>, b: ReadonlySet<string>): number {
  const shared = [...a].filter((word) => b.has(word)).length
  return shared === 0 ? 0 : shared / (a.size + b.size - shared)
}

const isField = (attribute: Attribute): attribute is FieldAttribute => attribute.type !== 'group'

export interface LabelMatch {
  readonly attribute: FieldAttribute
  readonly score: number
}

const leastScore = 0.3

/** Fields that a label may mean, the likeliest first. */
export function matchLabel(label: string, kind: KindKey): readonly LabelMatch[] {
  const typed = toTerms(label)
  if (typed.size === 0) return []
  const plain = readWords(label).join(' ')
  return [...getKind(kind).attributes, ...identityAttributes.filter(({ key }) => key !== 'notes')]
    .filter(isField)
    .map((attribute) => {
      const isSame = readWords(attribute.label).join(' ') === plain || attribute.key.toLowerCase() === plain
      return { attribute, score: isSame ? 2 : compareTerms(typed, toTerms(attribute.label)) }
    })
    .filter(({ score }) => score >= leastScore)
    .toSorted((a, b) => b.score - a.score)
}
