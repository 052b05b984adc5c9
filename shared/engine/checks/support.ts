import { beSure, doubt } from '../doubt'
import { probabilityAtLeast } from '../physics/conformance'
import type { Judgement, Say } from '../rule'
import type { Plan } from '../setup/plan'
import { thresholds } from '../thresholds'
import type { Basis, Specs, Value } from '../types'
import { isWithinMm, readMeasure, readNumber, readSet } from '../values'
import { weighFilled } from '../weight-budget'

export const massBasis: Basis = {
  type: 'physics',
  source:
    'Shell by density (EN 572-1 glass, ISO 10456 acrylic), sea water by EOS-80 (UNESCO Technical Papers in Marine Science 44)',
}

type Sides = readonly [Value<number>, Value<number>]

export interface Footprints {
  /** At the tighter side, mm; negative: so much too small. */
  readonly spareMm: number
  /** At the wider side, mm. */
  readonly widestMm: number
  readonly tankSide: Value<number>
  readonly topSide: Value<number>
  /** Along the top's length and across it, mm; negative: so much too small. */
  readonly sparesMm: readonly [number, number]
  /** The tank's length lies across the top. */
  readonly isTurned: boolean
}

/** A tank on a top, in the orientation with the most to spare at its tighter side; as it stands where that fits. */
export function compareFootprints(tank: Sides, top: Sides): Footprints {
  const way = (length: Value<number>, width: Value<number>, isTurned: boolean): Footprints => {
    const spares = [top[0].value - length.value, top[1].value - width.value] as const
    const isLengthTight = spares[0] <= spares[1]
    return {
      spareMm: Math.min(...spares),
      widestMm: Math.max(...spares),
      tankSide: isLengthTight ? length : width,
      topSide: isLengthTight ? top[0] : top[1],
      sparesMm: spares,
      isTurned,
    }
  }
  const straight = way(tank[0], tank[1], false)
  const turned = way(tank[1], tank[0], true)
  return isWithinMm(0, straight.spareMm) || straight.spareMm >= turned.spareMm ? straight : turned
}

/** Whether the footprint stands wholly on the top of what is named. */
export function describeFootprint({ spareMm, widestMm, tankSide, topSide }: Footprints, name: string): Judgement {
  const fits = isWithinMm(0, spareMm)
  const cautions: Say[] =
    fits && widestMm > thresholds.standOverhangMm.value
      ? [
          (words) =>
            `The top of the ${name} is ${words.length(widestMm)} larger than the tank: see that the weight stands over its legs or sides.`,
        ]
      : []
  return {
    outcome: fits ? 'pass' : 'fail',
    measured: tankSide.value,
    limit: topSide.value,
    ...beSure(
      (u) => probabilityAtLeast(topSide.value, tankSide.value, u),
      () => [doubt(tankSide, 'length', 'measure the tank'), doubt(topSide, 'length', `measure the top of the ${name}`)],
    ),
    cautions,
    say: (words) =>
      fits
        ? `The tank stands on the ${name} with ${words.length(Math.max(0, spareMm))} to spare.`
        : `The tank is ${words.length(-spareMm)} too large for the top of the ${name}.`,
  }
}

/** What every answer about weight carries. */
export const warnWeight =
  (totalKg: number): Say =>
  (words) =>
    `Filled, the tank weighs about ${words.mass(totalKg)}: a structural engineer and local building rules decide for anything large or upstairs.`

/** Whether its maker names the setup's tank among those that the stand is made for. */
export const isMadeForTank = (stand: Specs, { tank }: Plan): boolean =>
  tank.gear !== undefined && (readSet<string>(stand, 'madeForTanks') ?? []).includes(tank.gear.slug)

function readMadeFor(stand: Specs, filled: Plan): 'tank' | 'volume' | null {
  if (isMadeForTank(stand, filled)) return 'tank'
  const madeForL = readNumber(stand, 'madeForVolumeL')
  const heldKg = madeForL === undefined ? 0 : madeForL * thresholds.standKgPerRatedL.value
  return heldKg >= weighFilled(filled).totalKg ? 'volume' : null
}

/** Whether a stand is rated for the filled weight of the setup's tank; `missing` names what the judged piece lacks if it is not. */
export function rateStand(stand: Specs, filled: Plan, missing: readonly string[]): Judgement {
  const { totalKg } = weighFilled(filled)
  const rating = readMeasure(stand, 'loadRatingKg')
  const base = { measured: totalKg, cautions: [warnWeight(totalKg)] }
  if (rating) {
    const isHeld = rating.value >= totalKg
    return {
      ...base,
      outcome: isHeld ? 'pass' : 'fail',
      limit: rating.value,
      ...beSure(
        (u) => probabilityAtLeast(rating.value, totalKg, u),
        () => [doubt(rating, 'other', 'ask its maker for the load it is rated for')],
      ),
      say: (words) => {
        const [weight, rated] = words.apart(totalKg, rating.value, 'kg')
        return isHeld
          ? `Filled, the tank weighs ${weight}; the stand is rated for ${rated}.`
          : `Filled, the tank weighs ${weight}, and the stand is rated for only ${rated}.`
      },
    }
  }
  const madeFor = readMadeFor(stand, filled)
  if (madeFor)
    return {
      ...base,
      outcome: 'pass',
      cautions: [...base.cautions, () => 'The stand states no load rating; what it is made for was taken instead.'],
      say: (words) =>
        `Filled, the tank weighs ${words.mass(totalKg)}, and the stand is made for ${madeFor === 'tank' ? 'this tank' : `tanks of ${words.volume(readNumber(stand, 'madeForVolumeL') ?? 0)}`}.`,
    }
  return {
    ...base,
    outcome: 'nodata',
    missing,
    say: (words) => `The stand states no load rating: ask its maker whether it holds ${words.mass(totalKg)}.`,
  }
}
