import { beSure, doubt, doubtBasin } from '../doubt'
import { probabilityAtMost } from '../physics/conformance'
import type { Rectangle } from '../physics/geometry'
import { layRodFlat, leanRod } from '../physics/rod'
import type { Say } from '../rule'
import type { Basin } from '../setup/places'
import type { Item, Placement, Value } from '../types'
import { thresholds } from '../thresholds'
import { isWithinMm } from '../values'
import { hasCompanyRoom } from './body-space'

/** A rod as the space check sees it. Lengths in mm. */
export interface Rod {
  readonly length: Value<number>
  readonly diameter: Value<number>
  /** Length from the lower end that must be under water; the whole rod where its maker states none. */
  readonly immersed: Value<number>
  readonly quantity: number
  /** Water to leave around it, seen from above; not given: what the checks ask for. */
  readonly clearanceMm?: number
}

/** The tightest of the limits that one position in one basin sets. */
export interface Stand {
  readonly placement: Placement
  readonly basin: Basin
  readonly fits: boolean
  readonly measuredMm: number
  readonly limitMm: number
  readonly probability: () => number
  readonly settle: () => string | undefined
  /** What is tight: water, height, plan, run, opening or company. */
  readonly tight: 'water' | 'height' | 'plan' | 'run' | 'opening' | 'company'
}

type Bound = Pick<Stand, 'measuredMm' | 'limitMm' | 'tight'> & { readonly of: Value<number> }

const clearanceOf = ({ clearanceMm = thresholds.rodClearanceMm.value }: Rod): number => clearanceMm
const ratio = ({ measuredMm, limitMm }: { measuredMm: number; limitMm: number }) =>
  (limitMm - measuredMm) / Math.abs(limitMm || 1)

/** Whether the rods, with the given footprint each, can stand beside what is already in the basin. */
const hasCompany = (basin: Basin, others: readonly Item[], footprint: Rectangle, rod: Rod): boolean =>
  hasCompanyRoom(basin, others, footprint, rod.quantity, clearanceOf(rod))

function settle(basin: Basin, placement: Placement, bounds: readonly Bound[], isRoomy: boolean): Stand {
  const tight = bounds.reduce((worst, bound) => (ratio(bound) < ratio(worst) ? bound : worst))
  const surenessOf = ({ measuredMm: mm, limitMm: most, of, tight: side }: Bound) =>
    beSure(
      (u) => probabilityAtMost(mm, most, u),
      () => [
        doubt(of, 'length', `check its ${side === 'plan' || side === 'opening' ? 'thickness' : 'length'}`),
        doubtBasin(basin, most),
      ],
    )
  const finite = bounds.filter(({ limitMm: most }) => Number.isFinite(most)).map(surenessOf)
  const fits = bounds.every((bound) => isWithinMm(bound.measuredMm, bound.limitMm))
  const { measuredMm, limitMm } = tight
  return {
    placement,
    basin,
    measuredMm,
    limitMm,
    fits: fits && isRoomy,
    tight: fits && !isRoomy ? 'company' : tight.tight,
    probability: () => (isRoomy ? Math.min(1, ...finite.map(({ probability }) => probability())) : 0),
    settle: () => finite.toSorted((a, b) => a.probability() - b.probability())[0]?.settle(),
  }
}

function boundUpright(rod: Rod, basin: Basin): Bound[] {
  const { length, immersed } = rod
  return [
    boundPlan(rod, basin),
    { measuredMm: immersed.value, limitMm: basin.waterDepthMm, tight: 'water', of: immersed },
    { measuredMm: length.value, limitMm: basin.heightMm, tight: 'height', of: length },
  ]
}

const boundPlan = (rod: Rod, basin: Basin): Bound => ({
  measuredMm: rod.diameter.value + 2 * clearanceOf(rod),
  limitMm: Math.min(basin.lengthMm, basin.widthMm),
  tight: 'plan',
  of: rod.diameter,
})

/** A rod goes in end first, so each side of an opening that is known has to let its thickness pass. */
function boundOpening(diameter: Value<number>, { openingLengthMm, openingWidthMm }: Basin): Bound[] {
  const limitMm = Math.min(openingLengthMm ?? Infinity, openingWidthMm ?? Infinity)
  if (limitMm === Infinity) return []
  return [{ measuredMm: diameter.value, limitMm, tight: 'opening', of: diameter }]
}

/** A rod leaning or lying: wholly under water, clear of the walls in plan. */
function boundAslant(rod: Rod, basin: Basin, slackMm: number | null): Bound[] {
  const { length, diameter } = rod
  const under: Bound = { measuredMm: diameter.value, limitMm: basin.waterDepthMm, tight: 'water', of: diameter }
  if (slackMm === null) return [boundPlan(rod, basin), under]
  return [{ measuredMm: length.value, limitMm: length.value + slackMm, tight: 'run', of: length }, under]
}

/** One position in one basin with its tightest limit. See "Rod in a chamber" on the method page. */
function tryPosition(rod: Rod, basin: Basin, others: readonly Item[], position: Placement['position']): Stand {
  const d = rod.diameter.value
  const clearance = clearanceOf(rod)
  const opening = boundOpening(rod.diameter, basin)
  if (position === 'upright') {
    const isRoomy = hasCompany(basin, others, [d, d], rod)
    const placement = { chamber: basin.id, position, angleDeg: 90 }
    return settle(basin, placement, [...opening, ...boundUpright(rod, basin)], isRoomy)
  }
  const size = { lengthMm: rod.length.value, diameterMm: d }
  const clear = { lengthMm: basin.lengthMm - 2 * clearance, widthMm: basin.widthMm - 2 * clearance }
  const fit =
    position === 'leaning'
      ? leanRod(size, { ...clear, heightMm: basin.waterDepthMm })
      : layRodFlat({ lengthMm: size.lengthMm + 2 * clearance, diameterMm: d + 2 * clearance }, [
          basin.lengthMm,
          basin.widthMm,
        ])
  const angleDeg = fit.angleDeg ?? 0
  const runMm = size.lengthMm * Math.cos((angleDeg * Math.PI) / 180) + d
  const footprint: Rectangle = [Math.min(runMm, Math.max(clear.lengthMm, clear.widthMm)), d]
  const isRoomy = hasCompany(basin, others, footprint, rod)
  const bounds = [...opening, ...boundAslant(rod, basin, fit.slackMm)]
  // A rod that need not be raised at all lies.
  const shown = fit.angleDeg === 0 ? 'flat' : position
  return settle(basin, { chamber: basin.id, position: shown, angleDeg }, bounds, isRoomy)
}

const nearest = (stands: readonly Stand[]): Stand | undefined =>
  stands.reduce<Stand | undefined>((best, stand) => (!best || ratio(stand) > ratio(best) ? stand : best), undefined)

/** In one basin the first allowed position in which the rod fits; where none does, all of them. */
function tryPositions(rod: Rod, basin: Basin, others: readonly Item[], positions: readonly Placement['position'][]) {
  const misses: Stand[] = []
  for (const position of positions) {
    const stand = tryPosition(rod, basin, others, position)
    if (stand.fits) return [stand]
    misses.push(stand)
  }
  return misses
}

/**
 * Where the rod goes: of several basins the one with the most to spare. Where it fits nowhere, the nearest miss first and
 * then the others. Empty: there is no basin.
 */
export function chooseStand(
  rod: Rod,
  basins: readonly Basin[],
  others: readonly Item[],
  positions: readonly Placement['position'][],
): readonly Stand[] {
  const tried = basins.flatMap((basin) => tryPositions(rod, basin, others, positions))
  const fitting = nearest(tried.filter(({ fits }) => fits))
  if (fitting) return [fitting]
  const miss = nearest(tried)
  return miss ? [miss, ...tried.filter((stand) => stand !== miss)] : []
}

const sizesOf: Readonly<Record<Stand['tight'] | 'any', readonly string[]>> = {
  water: ['waterDepthMm'],
  // Of a tank known by its volume the height follows from its deepest water.
  height: ['heightMm', 'waterDepthMm'],
  plan: ['lengthMm', 'widthMm'],
  run: ['lengthMm', 'widthMm', 'waterDepthMm'],
  opening: [],
  company: ['lengthMm', 'widthMm'],
  any: ['waterDepthMm', 'heightMm', 'lengthMm', 'widthMm'],
}

const ofTank: Readonly<Record<string, readonly string[]>> = {
  waterDepthMm: ['waterLineMm', 'outerHeightMm'],
  heightMm: ['outerHeightMm', 'bottomMm'],
  lengthMm: ['displayLengthMm', 'outerLengthMm'],
  widthMm: ['displayWidthMm', 'outerWidthMm'],
}

/** Setup paths of a basin's sizes, or of those that bear on one limit. */
export const listBounds = (basin: Basin, tight: Stand['tight'] | 'any' = 'any'): readonly string[] =>
  sizesOf[tight].flatMap((key) =>
    (basin.path === 'tank' ? (ofTank[key] ?? []) : [key]).map((size) => `${basin.path}.${size}`),
  )

/** Setup paths of the sizes that a position rests on: all where it fits, else those that keep it from fitting. */
export const listSizes = ({ basin, fits, tight }: Stand): readonly string[] => listBounds(basin, fits ? 'any' : tight)

const verbs = { upright: 'Stands', leaning: 'Leans', flat: 'Lies' } as const

/** What the tightest limit means, in words. */
export const describeStand =
  (stand: Stand): Say =>
  (words) => {
    const { basin, measuredMm, limitMm, placement, tight } = stand
    const off = words.length(Math.abs(limitMm - measuredMm))
    const where = `the ${basin.name}`
    if (stand.fits) {
      const how = placement.position === 'leaning' ? ` at ${Math.round(placement.angleDeg)}°` : ''
      const beside =
        tight === 'plan' ? 'to spare beside it' : tight === 'opening' ? 'to spare in the opening' : 'to spare'
      return `${verbs[placement.position]} in ${where}${how} with ${off} ${beside}.`
    }
    if (tight === 'company') return `We find no room for it in ${where} beside what else is there.`
    if (tight === 'plan')
      return `${off} too thick for ${where}: it needs ${words.length(measuredMm)} across with water around it, and there are ${words.length(limitMm)}.`
    if (tight === 'opening') return `${off} too thick for the opening of ${where}.`
    if (tight === 'height') return `${off} too long to stand in ${where}, which is ${words.length(limitMm)} high.`
    if (tight === 'water' && placement.position === 'upright')
      return `${off} too long for the ${words.length(limitMm)} of water in ${where}.`
    const verb = placement.position === 'leaning' ? 'lean' : 'lie'
    return `${off} too long to ${verb} in ${where}, which takes ${words.length(limitMm)} at that thickness.`
  }
