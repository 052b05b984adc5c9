import { combineUncertainties, probabilityAtLeast, standardUncertainty } from '../physics/conformance'
import { lacking, type Candidate, type Judgement, type Say } from '../rule'
import type { Scene } from '../scene'
import type { Plan } from '../setup/plan'
import type { Item, Specs, Value } from '../types'
import { isWithinMm, readMeasure, readNumber } from '../values'
import { weighFilled } from '../weight-budget'

/** What carries the tank: the setup's stand, or furniture of a size that was given. */
interface Support {
  readonly lengthMm: Value<number>
  readonly widthMm: Value<number>
  readonly name: 'stand' | 'furniture'
  readonly specs?: Specs
}

const overhangNoticedMm = 150

const findStand = (others: readonly Item[]) => others.find(({ piece }) => piece.kind === 'stand')

/** Whether anything is known of what carries the tank. */
export const isCarried = ({ plan, others }: Scene): boolean =>
  findStand(others) !== undefined || plan.setup.support !== undefined

/** Null: nothing known carries it. A list: what the stand does not say. */
function findSupport({ plan, others }: Scene): Support | readonly string[] | null {
  const stand = findStand(others)
  if (stand) {
    const { specs } = stand.piece
    const lengthMm = readMeasure(specs, 'topLengthMm')
    const widthMm = readMeasure(specs, 'topWidthMm')
    return lengthMm && widthMm ? { lengthMm, widthMm, name: 'stand', specs } : ['topLengthMm', 'topWidthMm']
  }
  const { support } = plan.setup
  if (support?.lengthMm === undefined || support.widthMm === undefined) return null
  const given = (value: number): Value<number> => ({ value, source: 'measured' })
  return {
    lengthMm: given(support.lengthMm),
    widthMm: given(support.widthMm),
    name: support.kind === 'stand' ? 'stand' : 'furniture',
  }
}

/** The orientation of the tank on its support with the most to spare at its tighter side, mm. */
function findSpare(tank: readonly [Value<number>, Value<number>], support: readonly [Value<number>, Value<number>]) {
  const way = (length: Value<number>, width: Value<number>) => {
    const spares = [
      { piece: length, limit: support[0], spareMm: support[0].value - length.value },
      { piece: width, limit: support[1], spareMm: support[1].value - width.value },
    ] as const
    const tight = spares[0].spareMm <= spares[1].spareMm ? spares[0] : spares[1]
    return { ...tight, widestMm: Math.max(spares[0].spareMm, spares[1].spareMm) }
  }
  const straight = way(tank[0], tank[1])
  const turned = way(tank[1], tank[0])
  return straight.spareMm >= turned.spareMm || isWithinMm(0, straight.spareMm) ? straight : turned
}

/** Whether the tank's footprint stands wholly on the setup's stand or furniture, turned by 90° if need be. */
export function judgeFootprint(scene: Scene, { piece }: Candidate): Judgement | null {
  const support = findSupport(scene)
  if (support === null) return null
  if (!('name' in support))
    return { outcome: 'nodata', missing: [], say: () => 'Nobody has recorded the size of the stand’s top.' }
  const length = readMeasure(piece.specs, 'outerLengthMm')
  const width = readMeasure(piece.specs, 'outerWidthMm')
  const missing = [...(length ? [] : ['outerLengthMm']), ...(width ? [] : ['outerWidthMm'])]
  if (!length || !width) return lacking(missing, () => 'Nobody has recorded its outside size yet.')
  const { spareMm, widestMm, piece: side, limit } = findSpare([length, width], [support.lengthMm, support.widthMm])
  const fits = isWithinMm(0, spareMm)
  const uncertainty = combineUncertainties(
    standardUncertainty(side.value, side.source, side.plusMinus, 'length'),
    standardUncertainty(limit.value, limit.source, limit.plusMinus, 'length'),
  )
  const cautions: Say[] =
    fits && widestMm > overhangNoticedMm
      ? [
          (words) =>
            `The ${support.name} is ${words.length(widestMm)} larger than the tank: see that the weight stands over its legs or sides.`,
        ]
      : []
  return {
    outcome: fits ? 'pass' : 'fail',
    measured: side.value,
    limit: limit.value,
    probability: () => probabilityAtLeast(limit.value, side.value, uncertainty),
    cautions,
    say: (words) =>
      fits
        ? `Stands on the ${support.name} with ${words.length(Math.max(0, spareMm))} to spare.`
        : `${words.length(-spareMm)} too large for the top of the ${support.name}.`,
  }
}

const densityOfFilledTankKgL = 1.4

const names = (specs: Specs, key: string): readonly string[] =>
  Array.isArray(specs[key]?.value) ? (specs[key].value as string[]) : []

/** Whether the stand is rated for the filled weight of `filled`, which is the setup with this tank in it. */
export function judgeLoad(scene: Scene, { piece }: Candidate, filled: Plan): Judgement {
  const stand = findStand(scene.others)
  const weight = weighFilled(filled)
  const heavy: Say = (words) =>
    `Filled it weighs about ${words.mass(weight.totalKg)}: a structural engineer and local building rules decide for anything large or upstairs.`
  if (!stand)
    return {
      outcome: 'pass',
      measured: weight.totalKg,
      limit: null,
      cautions: [heavy],
      say: (words) => `Filled it weighs about ${words.mass(weight.totalKg)}; what carries it must hold that.`,
    }
  const { specs } = stand.piece
  const rating = readMeasure(specs, 'loadRatingKg')
  if (rating) {
    const isHeld = rating.value >= weight.totalKg
    return {
      outcome: isHeld ? 'pass' : 'fail',
      measured: weight.totalKg,
      limit: rating.value,
      probability: () =>
        probabilityAtLeast(
          rating.value,
          weight.totalKg,
          standardUncertainty(rating.value, rating.source, rating.plusMinus, 'other'),
        ),
      cautions: [heavy],
      say: (words) =>
        isHeld
          ? `Filled it weighs ${words.mass(weight.totalKg)}; the stand is rated for ${words.mass(rating.value)}.`
          : `Filled it weighs ${words.mass(weight.totalKg)}, more than the ${words.mass(rating.value)} the stand is rated for.`,
    }
  }
  const madeForL = readNumber(specs, 'madeForVolumeL')
  const isNamed = piece.gear !== undefined && names(specs, 'madeForTanks').includes(piece.gear.slug)
  if (isNamed || (madeForL !== undefined && densityOfFilledTankKgL * madeForL >= weight.totalKg))
    return {
      outcome: 'pass',
      measured: weight.totalKg,
      limit: null,
      cautions: [heavy, () => 'The stand states no load rating; what it is made for was taken instead.'],
      say: (words) =>
        `Filled it weighs ${words.mass(weight.totalKg)}, and the stand is made for ${isNamed ? 'this tank' : `tanks of ${words.volume(madeForL ?? 0)}`}.`,
    }
  return {
    outcome: 'nodata',
    missing: [],
    measured: weight.totalKg,
    say: (words) => `The stand states no load rating: ask its maker whether it holds ${words.mass(weight.totalKg)}.`,
  }
}
