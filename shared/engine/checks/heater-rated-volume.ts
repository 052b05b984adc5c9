import { beSure } from '../doubt'
import { probabilityAtLeast, probabilityAtMost } from '../physics/conformance'
import { glanceBy, lacking, type Candidate, type Judgement, type Rule } from '../rule'
import type { Scene } from '../scene'
import { practiceBasis, thresholds } from '../thresholds'
import type { Specs } from '../types'
import { readNumber } from '../values'
import { doubtRated, grossUses, hasRatedVolume, isVolumeStated, noAreas } from './shape'

const readRating = (specs: Specs) => ({
  min: readNumber(specs, 'ratedVolumeMinL'),
  max: readNumber(specs, 'ratedVolumeMaxL'),
})

type Rating = ReturnType<typeof readRating>

/** The volumes that pass: its maker's rating and a little to either side, since a watt heats alike in any tube. */
function widenRating({ min, max }: Rating): Rating {
  const slack = thresholds.ratedVolumeSlack.value
  return {
    min: min === undefined ? undefined : min * (1 - slack),
    max: max === undefined ? undefined : max * (1 + slack),
  }
}

const isBelow = (ratedL: number, { min }: Rating) => min !== undefined && ratedL < min
const isAbove = (ratedL: number, { max }: Rating) => max !== undefined && ratedL > max
const isOutside = (ratedL: number, rating: Rating) => isBelow(ratedL, rating) || isAbove(ratedL, rating)

const glanceAtRatedVolume = glanceBy(readRating, ({ plan }, rating) => {
  if ((rating.min === undefined && rating.max === undefined) || !hasRatedVolume(plan)) return undefined
  return isOutside(plan.tank.ratedL, widenRating(rating)) ? 'change' : 'pass'
})

function judgeRatedVolume({ plan }: Scene, { piece }: Candidate): Judgement {
  const rating = readRating(piece.specs)
  const { min, max } = rating
  if (min === undefined && max === undefined)
    return lacking(['ratedVolumeMaxL'], () => 'Nobody has recorded the volumes its maker rates it for.')
  const { ratedL } = plan.tank
  if (!hasRatedVolume(plan)) return noAreas(plan)
  // Outcome, limit, margin and probability all go by the widened rating: what passes has something to spare.
  const passes = widenRating(rating)
  const isFar = isOutside(ratedL, passes)
  const isBarelyOutside = !isFar && isOutside(ratedL, rating)
  return {
    outcome: isFar ? 'change' : 'pass',
    measured: ratedL,
    limit:
      passes.min !== undefined && passes.max !== undefined
        ? [passes.min, passes.max]
        : (passes.max ?? passes.min ?? null),
    margin: measureMargin(ratedL, passes),
    ...beSure(
      (u) =>
        Math.min(
          probabilityAtLeast(ratedL, passes.min ?? 0, u),
          passes.max === undefined ? 1 : probabilityAtMost(ratedL, passes.max, u),
        ),
      () => doubtRated(plan),
    ),
    cautions: isBarelyOutside
      ? [
          (words) =>
            `Its maker’s rating ${isBelow(ratedL, rating) ? 'starts just above' : 'stops just short of'} this tank’s ${words.volume(ratedL)}.`,
        ]
      : [],
    rests: () => (isVolumeStated(plan) ? [] : grossUses),
    say: (words) => {
      const range =
        min !== undefined && max !== undefined
          ? words.pair([min, max], 'L')
          : max !== undefined
            ? `up to ${words.volume(max)}`
            : `from ${words.volume(min ?? 0)}`
      if (isFar) return `Its maker rates it for a ${isBelow(ratedL, rating) ? 'larger' : 'smaller'} tank: ${range}.`
      if (isBarelyOutside) return `Its maker rates it for ${range}, and this tank is only a little off that.`
      return `Its maker rates it for ${range}.`
    },
  }
}

function measureMargin(value: number, { min, max }: Rating): number | null {
  if (min !== undefined && max !== undefined) return max > min ? Math.min(value - min, max - value) / (max - min) : null
  if (max !== undefined) return max === 0 ? null : (max - value) / max
  return min ? (value - min) / min : null
}

export const ratedVolume: Rule = {
  id: 'heater.rated-volume',
  label: 'Rated volume',
  worst: 'change',
  unit: 'L',
  basis: practiceBasis,
  rule: `The tank’s nominal volume passes within its maker’s rating and ${100 * thresholds.ratedVolumeSlack.value} % to either side of it, outside of the rating itself with a caution; further is a change. Makers’ ratings differ between tube types though a watt heats alike in any.`,
  reads: ['ratedVolumeMinL', 'ratedVolumeMaxL'],
  uses: grossUses,
  failLabel: 'rated for another size of tank',
  glance: glanceAtRatedVolume,
  judge: judgeRatedVolume,
}
