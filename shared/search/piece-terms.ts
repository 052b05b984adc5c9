import { getKind, type KindKey } from '../kinds/index'
import type { Attribute, BareSpecs, Option } from '../kinds/types'
import { describeOption, describeTrue } from './option-words'
import { squash, toSingular, toTokens } from './normalise'
import { expandMeasure, writeMeasureTerms } from './unit-words'

export interface SearchedPiece {
  readonly kind: KindKey
  readonly brand: string
  readonly model: string
  readonly specs: BareSpecs
}

/** What a piece is found by. */
export interface SearchText {
  /** Brand and model in tokens with a space on either side, for trigrams. */
  readonly name: string
  /** The model, and brand with model, without anything between their letters. */
  readonly code: string
  readonly fullCode: string
  /** Whole words and measures, `~word` for the words of its kind's label, `kind:heater` for the kind itself. */
  readonly terms: readonly string[]
}

/** Raised when what is written below changes, so that stored texts are known to be old. */
export const searchTextVersion = 1

/** Measures by which people tell pieces apart; a wall or a cord is not what anybody types first. */
const tellingKeys: ReadonlySet<string> = new Set(
  (
    'powerW lengthMm outerLengthMm topLengthMm diameterMm nominalVolumeL ratedVolumeMaxL madeForVolumeL packKg makesL flowMaxLph ' +
    'membraneLpd maxLoadW openingMm tubeLengthMm boreMm maxLpd ratedA reservoirL'
  ).split(' '),
)

const describeOptions = (kind: KindKey, key: string, options: readonly Option[], values: readonly unknown[]) =>
  options
    .filter(({ value }) => values.some((each) => String(each) === value))
    .flatMap((option) => describeOption(kind, key, option))

const readTopFlow = (curve: unknown): number => {
  if (!Array.isArray(curve)) return Number.NaN
  return Math.max(...curve.map((point: { flowLph?: unknown }) => Number(point.flowLph)))
}

const describeValue = (kind: KindKey, attribute: Attribute, value: unknown): readonly string[] => {
  if (attribute.key === 'flowCurve') {
    const flow = readTopFlow(value)
    return Number.isFinite(flow) ? writeMeasureTerms(flow, 'L/h') : []
  }
  switch (attribute.type) {
    case 'measure':
      return tellingKeys.has(attribute.key) && typeof value === 'number' ? writeMeasureTerms(value, attribute.unit) : []
    case 'choice':
      return describeOptions(kind, attribute.key, attribute.options, [value])
    case 'set':
      return Array.isArray(value) ? describeOptions(kind, attribute.key, attribute.options, value) : []
    case 'boolean':
      return value === true ? describeTrue(attribute) : []
    default:
      return []
  }
}

const describeName = (tokens: readonly string[]): readonly string[] => {
  const glued = tokens.slice(1).map((token, index) => `${tokens[index]}${token}`)
  const numbers = tokens.flatMap((token) => /^\d+(?:\.\d+)?(?=[a-z]+$)/.exec(token) ?? [])
  return [...tokens, ...glued, ...numbers, ...tokens.flatMap(expandMeasure)]
}

/** Everything that a piece is found by, from its name, its kind and its telling specs. */
export const writeSearchText = ({ kind, brand, model, specs }: SearchedPiece): SearchText => {
  const { label, attributes } = getKind(kind)
  const nameTokens = toTokens(`${brand} ${model}`)
  const specWords = attributes.flatMap((attribute) =>
    specs[attribute.key] === undefined ? [] : describeValue(kind, attribute, specs[attribute.key]),
  )
  const words = [...describeName(nameTokens), ...specWords]
  const labelWords = toTokens(label).map((word) => `~${word}`)
  return {
    name: ` ${nameTokens.join(' ')} `,
    code: squash(model),
    fullCode: nameTokens.join(''),
    terms: [...new Set([`kind:${kind}`, ...labelWords, ...words, ...words.map(toSingular)])],
  }
}
