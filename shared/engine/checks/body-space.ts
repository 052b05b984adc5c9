import { combineUncertainties, probabilityAtMost, standardUncertainty } from '../physics/conformance'
import { passesOpening, type Rectangle } from '../physics/geometry'
import { packRectangles } from '../physics/packing'
import type { Say } from '../rule'
import { findOccupants, type Basin } from '../setup/places'
import type { Item, Value } from '../types'
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

export interface BodyFit {
  readonly basin: Basin
  readonly fits: boolean
  readonly measuredMm: number
  readonly limitMm: number
  readonly tight: 'length' | 'width' | 'depth' | 'opening' | 'company'
  readonly probability: () => number
}

const ratio = (measured: number, limit: number) => (limit - measured) / Math.abs(limit || 1)

/** Sides in plan of what is known to stand in a chamber; what states none counts nothing. */
function footprintOf({ piece }: Item): Rectangle | undefined {
  const length = readNumber(piece.specs, 'lengthMm')
  const width = readNumber(piece.specs, 'widthMm')
  const diameter = readNumber(piece.specs, 'diameterMm')
  if (piece.kind === 'heater') return diameter === undefined ? undefined : [diameter, diameter]
  if (length !== undefined && width !== undefined) return [length, width]
  return undefined
}

/** Whether several footprints, with what is already in the basin, can stand side by side. */
export function hasCompanyRoom(
  basin: Basin,
  others: readonly Item[],
  footprint: Rectangle,
  quantity: number,
  clearanceMm: number,
): boolean {
  const company = findOccupants(others, basin.id).flatMap((item) => {
    const sides = footprintOf(item)
    return sides ? Array.from({ length: item.quantity }, () => sides) : []
  })
  if (company.length === 0 && quantity === 1) return true
  const pieces = [...company, ...Array.from({ length: quantity }, () => footprint)]
  return packRectangles(pieces, [basin.lengthMm, basin.widthMm], clearanceMm).outcome === 'fits'
}

/** A body in one basin, square to its walls and turned by 90° if need be. */
export function tryBody(body: Body, basin: Basin, others: readonly Item[]): BodyFit {
  const { clearanceMm } = body
  const bounds = (length: Value<number>, width: Value<number>) =>
    [
      { tight: 'length', measuredMm: length.value + 2 * clearanceMm, limitMm: basin.lengthMm, of: length },
      { tight: 'width', measuredMm: width.value + 2 * clearanceMm, limitMm: basin.widthMm, of: width },
      { tight: 'depth', measuredMm: body.depth.value, limitMm: basin.waterDepthMm, of: body.depth },
    ] as const
  const worst = (list: ReturnType<typeof bounds>) =>
    list.reduce<(typeof list)[number]>(
      (a, b) => (ratio(b.measuredMm, b.limitMm) < ratio(a.measuredMm, a.limitMm) ? b : a),
      list[0],
    )
  const straight = worst(bounds(body.length, body.width))
  const turned = worst(bounds(body.width, body.length))
  const tight =
    ratio(straight.measuredMm, straight.limitMm) >= ratio(turned.measuredMm, turned.limitMm) ? straight : turned
  const { openingLengthMm, openingWidthMm } = basin
  const passes =
    openingLengthMm === undefined ||
    openingWidthMm === undefined ||
    passesOpening([body.length.value, body.width.value, body.height.value], [openingLengthMm, openingWidthMm])
  const isRoomy = hasCompanyRoom(basin, others, [body.length.value, body.width.value], body.quantity, clearanceMm)
  const within = isWithinMm(tight.measuredMm, tight.limitMm)
  const u = combineUncertainties(
    standardUncertainty(tight.of.value, tight.of.source, tight.of.plusMinus, 'length'),
    standardUncertainty(tight.limitMm, basin.source, basin.plusMinus, 'length'),
  )
  return {
    basin,
    fits: within && passes && isRoomy,
    measuredMm: tight.measuredMm,
    limitMm: tight.limitMm,
    tight: !within ? tight.tight : !passes ? 'opening' : !isRoomy ? 'company' : tight.tight,
    probability: () => (passes && isRoomy ? probabilityAtMost(tight.measuredMm, tight.limitMm, u) : 0),
  }
}

/** Of several basins one that fits, with the most to spare. Undefined: there is no basin. */
export function chooseBasin(fits: readonly BodyFit[]): BodyFit | undefined {
  const rank = (fit: BodyFit) => (fit.fits ? 1e6 : 0) + ratio(fit.measuredMm, fit.limitMm)
  return fits.reduce<BodyFit | undefined>((best, fit) => (!best || rank(fit) > rank(best) ? fit : best), undefined)
}

/** Setup paths of the size that decides, or of all where the body fits. */
export function listBodySizes({ basin, fits, tight }: BodyFit): readonly string[] {
  const names = { length: 'lengthMm', width: 'widthMm', depth: 'waterDepthMm' } as const
  const keys = fits ? Object.values(names) : tight in names ? [names[tight as keyof typeof names]] : []
  const ofTank: Readonly<Record<string, string>> = {
    lengthMm: 'displayLengthMm',
    widthMm: 'displayWidthMm',
    waterDepthMm: 'waterLineMm',
  }
  return keys.map((key) => (basin.path === 'tank' ? `tank.${ofTank[key]}` : `${basin.path}.${key}`))
}

export const describeBody =
  (fit: BodyFit): Say =>
  (words) => {
    const off = words.length(Math.abs(fit.limitMm - fit.measuredMm))
    const where = `the ${fit.basin.name}`
    if (fit.fits) return `Stands in ${where} with ${off} to spare.`
    if (fit.tight === 'company') return `There is no room left in ${where} beside what is already there.`
    if (fit.tight === 'opening') return `It does not pass the opening of ${where}.`
    if (fit.tight === 'depth')
      return `${where[0]?.toUpperCase()}${where.slice(1)} is ${off} too shallow: it needs ${words.length(fit.measuredMm)} of water.`
    return `${off} too large for ${where}, with water around it.`
  }
