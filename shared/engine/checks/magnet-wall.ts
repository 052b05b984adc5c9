import { beSure, doubt } from '../doubt'
import { probabilityWithin } from '../physics/conformance'
import { lacking, type Judgement } from '../rule'
import type { Value } from '../types'
import { isWithinMm } from '../values'

type Side = Value<number> | undefined

function measureWall(wall: Value<number>, min: Side, max: Side): Partial<Judgement> {
  if (!min || !max) return { measured: wall.value }
  return {
    measured: wall.value,
    limit: [min.value, max.value],
    // Panes come in sizes: a length's usual ± 3 mm would make every wall a close call.
    ...beSure(
      (u) => probabilityWithin(wall.value, min.value, max.value, u),
      () => [doubt(wall, 'other', 'measure the wall'), doubt(max, 'other', 'check the walls its magnet is made for')],
    ),
  }
}

/**
 * The tank's wall between the thinnest and the thickest that a magnet is made for. A thinner one down to `nearShare` of the
 * thinnest is a change. One known side can rule the magnet out, and never in.
 */
export function judgeMagnetWall(wall: Value<number>, min: Side, max: Side, nearShare = 1): Judgement {
  const base = measureWall(wall, min, max)
  if (max && !isWithinMm(wall.value, max.value))
    return {
      ...base,
      outcome: 'fail',
      say: (words) =>
        `Its magnet holds through ${words.length(max.value)} at most, and the wall is ${words.length(wall.value)}.`,
    }
  if (min && !isWithinMm(min.value * nearShare, wall.value))
    return {
      ...base,
      outcome: 'fail',
      say: (words) =>
        `Its magnet is made for walls from ${words.length(min.value)}, and this one is ${words.length(wall.value)}: far too strong.`,
    }
  if (!min || !max)
    return lacking([...(min ? [] : ['wallMinMm']), ...(max ? [] : ['wallMaxMm'])], () =>
      max
        ? 'Nobody has recorded the thinnest wall that its magnet is made for.'
        : 'Nobody has recorded the walls that its magnet holds through.',
    )
  const isIn = isWithinMm(min.value, wall.value)
  return {
    ...base,
    outcome: isIn ? 'pass' : 'change',
    say: (words) =>
      isIn
        ? `Its magnet holds through the ${words.length(wall.value)} wall.`
        : `Its magnet is made for walls from ${words.length(min.value)}, and this one is ${words.length(wall.value)}: stronger than needed, so mind the seams.`,
  }
}
