import { chooseMains } from '../setup/defaults'
import type { Coral } from '../types'
import { findPhrases, indexPhrases } from './phrases'
import type { Reading } from './reading'
import { fieldChoices, filterChoices, type FilterChoice } from './words/choice-words'
import { coralPhrases } from './words/coral-words'
import { countryPhrases } from './words/country-words'

/** One word may pick an option of several kinds: "dry" rock, "dry" sand. */
const choicesByPhrase = new Map<string, FilterChoice[]>()
for (const [phrase, choice] of filterChoices)
  choicesByPhrase.set(phrase, [...(choicesByPhrase.get(phrase) ?? []), choice])

const filters = indexPhrases(choicesByPhrase)
const fields = indexPhrases(fieldChoices)
const corals = indexPhrases(coralPhrases)
const countries = indexPhrases(countryPhrases)

const spare = 4
/** "swap my glass heater for titanium": what comes after is what is wanted. */
const swapTo: ReadonlySet<string> = new Set(['for', 'with', 'to'])

/** "glass" beside the heater is the heater's, anywhere else the tank's. */
const isBesidePiece = ({ landmarkAt, kind, tokens }: Reading, from: number, to: number): boolean => {
  for (let at = from; at < to + spare; at++) {
    if (tokens[at]?.type === 'stop') return false
    const landmark = landmarkAt.get(at)
    if (landmark !== undefined && at >= to) return landmark.kind === kind
    if (landmark?.kind !== undefined && landmark.kind === kind) return true
  }
  return false
}

const denials: ReadonlySet<string> = new Set(['no', 'not', 'without', 'never', 'nor', "don't", 'dont'])

/** "no hob filter": what is ruled out is not what is meant, and is left to be seen as not used. */
const isDenied = ({ tokens }: Reading, from: number): boolean => denials.has(tokens[from - 1]?.text ?? '')

const ofTankToo: ReadonlySet<string> = new Set(['glass', 'hood', 'canopy', 'bar', 'strip', 'live', 'dry', 'base'])

/** Reads words that pick an option of the piece: "titanium", "dry", "with a thermostat". */
export const readFilterChoices = (reading: Reading): void => {
  const { tokens, draft, kind, isGone, landmarkAt } = reading
  for (const { from, to, means } of findPhrases(filters, tokens)) {
    const choice = means.find((each: FilterChoice) => each.kind === kind)
    const word = tokens[from]?.text ?? ''
    const isInName = landmarkAt.get(from)?.kind === kind
    if (
      choice === undefined ||
      isDenied(reading, from) ||
      (draft.isUsed(from) && !isInName) ||
      (to - from === 1 && ofTankToo.has(word) && !isBesidePiece(reading, from, to))
    )
      continue
    const isWantedInstead = isGone && swapTo.has(tokens[from - 1]?.text ?? '')
    if (isWantedInstead) draft.filters[choice.key] = choice.value
    if (isWantedInstead || draft.setFilter(choice.key, choice.value))
      draft.note({ meaning: choice.meaning }, { from, to })
  }
}

const asTyped = (value: string | boolean | number): string =>
  value === true ? 'yes' : value === false ? 'no' : String(value)

/** Words that say something of the tank even where they also told what a measure is of: "10 mm glass". */
const alwaysRead: ReadonlySet<string> = new Set([
  'desk',
  'dresser',
  'table',
  'counter',
  'countertop',
  'kitchen',
  'sideboard',
  'cupboard',
  'shelf',
  'furniture',
  'cube',
  'sump',
  'glass',
  'acrylic',
])

/** Reads words that say something of the setup: "rimless", "acrylic", "no lid". */
export const readFieldChoices = (reading: Reading): void => {
  const { tokens, draft, landmarkAt } = reading
  for (const { from, to, means } of findPhrases(fields, tokens)) {
    const landmark = landmarkAt.get(from)
    const isOfPiece = landmark?.kind !== undefined && landmark.kind !== 'tank'
    if (isOfPiece || isDenied(reading, from) || (draft.isUsed(from) && !alwaysRead.has(tokens[from]?.text ?? '')))
      continue
    if (!draft.setField(means.path, means.value, asTyped(means.value))) continue
    draft.note({ meaning: means.meaning, path: means.path }, { from, to })
  }
}

const names: Readonly<Record<Coral | 'none', string>> = {
  soft: 'soft corals',
  lps: 'LPS corals',
  sps: 'SPS corals',
  none: 'fish only',
}

export const readCorals = ({ tokens, draft }: Reading): void => {
  const found = findPhrases(corals, tokens).filter(({ from }) => !draft.isUsed(from))
  if (found.length === 0) return
  const kept = (['soft', 'lps', 'sps'] as const).filter((coral) => found.some(({ means }) => means === coral))
  draft.setField('goals.coral', kept, kept.join(',') || 'none')
  for (const { from, to, means } of found) draft.note({ meaning: names[means], path: 'goals.coral' }, { from, to })
}

/** A country says which mains its outlets have. */
export const readCountry = ({ tokens, draft }: Reading): void => {
  const [first] = findPhrases(countries, tokens).filter(({ from }) => !draft.isUsed(from))
  if (first === undefined) return
  const mains = chooseMains(first.means)
  draft.setField('country', first.means, first.means)
  draft.setField('mains.volts', mains.volts, String(mains.volts))
  draft.setField('mains.plugType', mains.plugType, mains.plugType)
  draft.note({ meaning: `mains ${mains.volts} V, plug ${mains.plugType}`, path: 'mains.volts' }, first)
}
