import type { Landmark } from './landmarks'
import type { Measure } from './measures'
import type { Reading } from './reading'

const window = 30
const costs = { token: 1, comma: 3, sentence: 8, measure: 4, usedBySize: 3, afterwards: 0.5, afterComma: 3 } as const
const sentenceEnds: ReadonlySet<string> = new Set(['.', '?', '!', ';', '\n'])

export interface Near {
  readonly landmark: Landmark
  readonly cost: number
}

/** Walks from a measure to the left or right, adding up what stands between; a landmark costs what was passed. */
const walk = (
  { tokens, landmarkAt, measureAt, draft }: Reading,
  measure: Measure,
  step: -1 | 1,
  accepts: (landmark: Landmark) => boolean,
): Near | undefined => {
  let cost: number = step === 1 ? costs.afterwards : 0
  let at = step === 1 ? measure.to : measure.from - 1
  for (let walked = 0; walked < window; walked++) {
    const token = tokens[at]
    if (token === undefined) return undefined
    const landmark = landmarkAt.get(at)
    if (landmark !== undefined && accepts(landmark)) {
      return { landmark, cost: cost + (draft.isUsed(at) ? costs.usedBySize : 0) }
    }
    const crossed = measureAt.get(at)
    if (crossed !== undefined) cost += costs.measure
    else if (sentenceEnds.has(token.text)) cost += costs.sentence
    else if (token.type === 'stop') cost += costs.comma + (step === 1 ? costs.afterComma : 0)
    else cost += costs.token
    const skipTo = crossed ?? landmark
    at = skipTo === undefined ? at + step : step === 1 ? skipTo.to : skipTo.from - 1
  }
  return undefined
}

/** The closest landmark that could be what the measure is of. Before wins over after where both are as close. */
export const findNearest = (
  reading: Reading,
  measure: Measure,
  accepts: (landmark: Landmark) => boolean,
): Near | undefined => {
  const before = walk(reading, measure, -1, accepts)
  const after = walk(reading, measure, 1, accepts)
  if (before === undefined || after === undefined) return before ?? after
  return after.cost < before.cost ? after : before
}
