import { sayUncounted } from '../counting'
import { beSure, doubt, doubtBasin } from '../doubt'
import { probabilityAtMost } from '../physics/conformance'
import { passesOpening, type Rectangle } from '../physics/geometry'
import { packRectangles, type Packing } from '../physics/packing'
import { findOccupants, type Basin } from '../setup/places'
import type { Item, Value } from '../types'
import type { Say } from '../rule'
import { isWithinMm, readNumber } from '../values'

/** A body as it stands in a basin: sides in plan, height, and the water it needs over its floor. Lengths in mm. */
export interface Body {
  readonly length: Value<number>
  readonly width: Value<number>
  readonly height: Value<number>
  readonly depth: Value<number>
  readonly clearanceMm: number
  readonly quantity: number
}

type Company = Packing['outcome']

export interface BodyFit {
  readonly basin: Basin
  readonly fits: boolean
  readonly measuredMm: number
  readonly limitMm: number
  readonly tight: 'length' | 'width' | 'depth' | 'opening' | 'company'
  /** So many stand together that no arrangement was found, and none was ruled out. */
  readonly isUnsure: boolean
  readonly probability: () => number
  readonly settle: () => string | undefined
  readonly cautions: readonly Say[]
}

interface Bound {
  readonly tight: 'length' | 'width' | 'depth'
  readonly measuredMm: number
  readonly limitMm: number
  readonly of: Value<number>
}

/** A side of an opening that nobody measured keeps nothing out. */
const openMm = 1e6

const ratio = ({ measuredMm, limitMm }: Pick<Bound, 'measuredMm' | 'limitMm'>) =>
  (limitMm - measuredMm) / Math.abs(limitMm || 1)
const isKept = ({ measuredMm, limitMm }: Bound) => isWithinMm(measuredMm, limitMm)

/** Kinds that take room where they stand. */
export const bodied: ReadonlySet<string> = new Set(['heater', 'return-pump', 'wavemaker', 'skimmer', 'auto-top-off'])

/** Sides in plan of what stands in a chamber; undefined where it states none. */
export function footprintOf({ piece }: Item): Rectangle | undefined {
  const length = readNumber(piece.specs, 'lengthMm')
  const width = readNumber(piece.specs, 'widthMm')
  const diameter = readNumber(piece.specs, 'diameterMm')
  if (piece.kind === 'heater') return diameter === undefined ? undefined : [diameter, diameter]
  const across = width ?? diameter
  return length !== undefined && across !== undefined ? [length, across] : undefined
}

/** Whether several footprints, with what is already in the basin, can stand side by side. */
function findCompany(
  basin: Basin,
  others: readonly Item[],
  footprint: Rectangle,
  quantity: number,
  clearanceMm: number,
): Company {
  const company = findOccupants(others, basin.id).flatMap((item) => {
    const sides = bodied.has(item.piece.kind) ? footprintOf(item) : undefined
    return sides ? Array.from({ length: item.quantity }, () => sides) : []
  })
  if (company.length === 0 && quantity === 1) return 'fits'
  const pieces = [...company, ...Array.from({ length: quantity }, () => footprint)]
  return packRectangles(pieces, [basin.lengthMm, basin.widthMm], clearanceMm).outcome
}

export const hasCompanyRoom = (...asked: Parameters<typeof findCompany>): boolean => findCompany(...asked) === 'fits'

const warnUncounted = (basin: Basin, others: readonly Item[]): readonly Say[] => {
  const unsized = findOccupants(others, basin.id).filter((item) => bodied.has(item.piece.kind) && !footprintOf(item))
  return unsized.length > 0 ? [sayUncounted(unsized.length, 'size')] : []
}

/** The bound that is broken most, else the one with the least to spare. */
const findTightest = (bounds: readonly [Bound, ...Bound[]]): Bound =>
  bounds.reduce((worst, bound) =>
    isKept(bound) === isKept(worst) ? (ratio(bound) < ratio(worst) ? bound : worst) : isKept(bound) ? worst : bound,
  )

function boundWay(body: Body, basin: Basin, length: Value<number>, width: Value<number>): Bound {
  const around = 2 * body.clearanceMm
  return findTightest([
    { tight: 'length', measuredMm: length.value + around, limitMm: basin.lengthMm, of: length },
    { tight: 'width', measuredMm: width.value + around, limitMm: basin.widthMm, of: width },
    { tight: 'depth', measuredMm: body.depth.value, limitMm: basin.waterDepthMm, of: body.depth },
  ])
}

function passes({ length, width, height }: Body, { openingLengthMm, openingWidthMm }: Basin): boolean {
  const opening: Rectangle = [openingLengthMm ?? openMm, openingWidthMm ?? openMm]
  return passesOpening([length.value, width.value, height.value], opening)
}

/** A body in one basin, square to its walls and turned by 90° if need be. */
export function tryBody(body: Body, basin: Basin, others: readonly Item[]): BodyFit {
  const straight = boundWay(body, basin, body.length, body.width)
  const turned = boundWay(body, basin, body.width, body.length)
  const isTurnedBetter = isKept(straight) === isKept(turned) ? ratio(turned) > ratio(straight) : isKept(turned)
  const tight = isTurnedBetter ? turned : straight
  const isThrough = passes(body, basin)
  const company = findCompany(basin, others, [body.length.value, body.width.value], body.quantity, body.clearanceMm)
  const isAlone = isKept(tight) && isThrough
  return {
    basin,
    fits: isAlone && company === 'fits',
    measuredMm: tight.measuredMm,
    limitMm: tight.limitMm,
    tight: !isKept(tight) ? tight.tight : !isThrough ? 'opening' : company !== 'fits' ? 'company' : tight.tight,
    isUnsure: isAlone && company === 'unknown',
    ...beSure(
      (u) => probabilityAtMost(tight.measuredMm, tight.limitMm, u),
      () => [doubt(tight.of, 'length', 'check its size'), doubtBasin(basin, tight.limitMm)],
    ),
    cautions: warnUncounted(basin, others),
  }
}

/** Of several basins one that fits, with the most to spare. Undefined: there is no basin. */
export function chooseBasin(fits: readonly BodyFit[]): BodyFit | undefined {
  const rank = (fit: BodyFit) => (fit.fits ? 2e6 : fit.isUnsure ? 1e6 : 0) + ratio(fit)
  return fits.reduce<BodyFit | undefined>((best, fit) => (!best || rank(fit) > rank(best) ? fit : best), undefined)
}

const sizesOf: Readonly<Record<BodyFit['tight'], readonly string[]>> = {
  length: ['lengthMm'],
  width: ['widthMm'],
  depth: ['waterDepthMm'],
  opening: [],
  company: ['lengthMm', 'widthMm'],
}

const ofTank: Readonly<Record<string, string>> = {
  lengthMm: 'displayLengthMm',
  widthMm: 'displayWidthMm',
  waterDepthMm: 'waterLineMm',
}

/** Setup paths of the size that decides, or of all where the body fits. */
export function listBodySizes({ basin, fits, tight }: BodyFit): readonly string[] {
  const keys = fits ? ['lengthMm', 'widthMm', 'waterDepthMm'] : sizesOf[tight]
  return keys.map((key) => (basin.path === 'tank' ? `tank.${ofTank[key]}` : `${basin.path}.${key}`))
}

/** Where it stands and with what to spare, or what keeps it out. `subject`: "It", "Its sensor". */
export const describeBody =
  (fit: BodyFit, subject = 'It'): Say =>
  (words) => {
    const off = words.length(Math.abs(fit.limitMm - fit.measuredMm))
    const where = `the ${fit.basin.name}`
    if (fit.fits) return `${subject} fits in ${where} with ${off} of ${fit.tight} to spare.`
    if (fit.isUnsure) return `Too much stands in ${where} to tell whether there is room beside it.`
    if (fit.tight === 'company') return `There is no room for it in ${where} beside what else is there.`
    if (fit.tight === 'opening') return `${subject} does not pass the opening of ${where}.`
    if (fit.tight === 'depth')
      return `The water in ${where} is ${off} too shallow: it needs ${words.length(fit.measuredMm)}.`
    return `${subject} is ${off} too large for ${where}, the water around it counted.`
  }
