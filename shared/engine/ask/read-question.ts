import { getKind, type KindKey } from '../../kinds/index'
import type { UnitSystem } from '../../units/systems'
import { readCorals, readCountry, readFieldChoices, readFilterChoices } from './choices'
import { chooseKind } from './choose-kind'
import { readBareNumber } from './bare-numbers'
import { readOutlets } from './counts'
import { createDraft } from './draft'
import { findGear } from './gear'
import { findIntent } from './intent'
import { findLandmarks } from './landmarks'
import { findLeftovers } from './leftovers'
import { readLength } from './lengths'
import { findMeasures } from './measures'
import { readQuantity } from './quantities'
import { byToken, createReading } from './reading'
import { readSizeOf } from './sizes'
import { readTemperature } from './temperatures'
import { tokenise } from './tokens'
import { readReturnFlow } from './turnover'
import { readTradeSize } from './trade-sizes'
import { readRockPerVolume } from './volumes'
import type { CatalogueName, Question } from './types'

const withArticle = (label: string): string =>
  `${/^[aeiou]/.test(label) && !label.startsWith('RO') ? 'an' : 'a'} ${label}`
const uncountable: ReadonlySet<KindKey> = new Set(['rock', 'sand', 'salt-mix'])

/**
 * Reads a question as hobbyists type it, in any mix of units: what is asked about, what its answer must keep to, and
 * what the text tells of the setup. A number without a unit takes the system's unless only another makes sense, and the
 * meaning says so. Deterministic; never throws; time grows with the length of the text.
 */
export const readQuestion = (text: string, system: UnitSystem, catalogue: readonly CatalogueName[] = []): Question => {
  const tokens = tokenise(text)
  const draft = createDraft(text, tokens)
  const gear = findGear(tokens, catalogue)
  const isOfGear = ({ from, to }: { from: number; to: number }) =>
    gear !== undefined && from < gear.span.to && to > gear.span.from
  const landmarks = findLandmarks(tokens).filter((landmark) => !isOfGear(landmark))
  const asked = chooseKind(tokens, landmarks)
  const named = gear?.piece.kind ?? asked?.kind ?? null
  const measures = findMeasures(tokens).filter((measure) => !isOfGear(measure))
  const landmarkAt = byToken(landmarks)
  const isTaken = (at: number) => landmarkAt.get(at)?.kind !== undefined
  const { intent, cues } = findIntent(tokens, { hasKind: named !== null, hasGear: gear !== undefined, isTaken })
  const isGone = intent === 'replace'
  const kind = intent === 'missing' ? null : named
  const reading = createReading({ tokens, system, kind, isGone, measures, landmarks, draft })

  if (gear !== undefined) draft.note({ meaning: `${gear.piece.brand} ${gear.piece.model}` }, gear.span)
  for (const read of [
    readTradeSize,
    readOutlets,
    readSizeOf,
    readQuantity,
    readReturnFlow,
    readRockPerVolume,
    readLength,
    readBareNumber,
    readTemperature,
  ]) {
    for (const measure of measures) if (!draft.isUsed(measure.from)) read(reading, measure)
  }
  readFilterChoices(reading)
  readFieldChoices(reading)
  readCorals(reading)
  readCountry(reading)
  if (asked !== null && gear === undefined && kind !== null) {
    const { label } = getKind(kind)
    draft.note({ meaning: uncountable.has(kind) ? label : withArticle(label) }, asked)
  }
  draft.use(...cues)
  draft.use(...landmarks.filter(({ subject, kind: named }) => subject !== undefined || named === kind))

  return {
    intent,
    kind,
    ...(gear !== undefined && { gear: { slug: gear.piece.slug, brand: gear.piece.brand, model: gear.piece.model } }),
    filters: draft.filters,
    fields: draft.fields,
    understood: draft.understood.toSorted((a, b) => a.start - b.start),
    ignored: findLeftovers(text, tokens, draft),
  }
}
