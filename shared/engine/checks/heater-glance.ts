import type { Candidate } from '../rule'
import { once, type Scene } from '../scene'
import { findBasins, findOccupants } from '../setup/places'
import { thresholds } from '../thresholds'
import { readNumber, readText } from '../values'
import { listBounds } from './rod-space'
import { hasAreas } from './shape'

export const findUsualBasins = ({ plan }: Scene) => findBasins(plan, undefined)

interface Reach {
  /** Free basins without an opening to pass: water depth, height and narrower side of each, mm. */
  readonly open: readonly { readonly waterMm: number; readonly heightMm: number; readonly acrossMm: number }[]
  /** The most that could be stood, laid and leaned anywhere, mm; null where a size was assumed and might be more. */
  readonly most: { readonly uprightMm: number; readonly flatMm: number; readonly leaningMm: number } | null
}

const clearanceMm = 2 * thresholds.rodClearanceMm.value

function findReach(scene: Scene): Reach {
  const basins = once(scene, findUsualBasins)
  const mayHaveSump = scene.plan.assumed.has('tank.filtration') && scene.plan.tank.chambers.length === 0
  const mayGrow = (path: string) => scene.plan.assumed.has(path) && !path.endsWith('.heightMm')
  const most = (measure: (basin: (typeof basins)[number]) => number) => Math.max(...basins.map(measure))
  return {
    open: basins
      .filter(
        ({ id, openingLengthMm, openingWidthMm }) =>
          openingLengthMm === undefined && openingWidthMm === undefined && findOccupants(scene.others, id).length === 0,
      )
      .map(({ lengthMm, widthMm, waterDepthMm, heightMm }) => ({
        waterMm: waterDepthMm,
        heightMm,
        acrossMm: Math.min(lengthMm, widthMm),
      })),
    most:
      mayHaveSump || basins.some((basin) => listBounds(basin).some(mayGrow))
        ? null
        : {
            uprightMm: most(({ waterDepthMm }) => waterDepthMm),
            flatMm: most(({ lengthMm, widthMm }) => Math.hypot(lengthMm - clearanceMm, widthMm - clearanceMm)),
            leaningMm: most(({ lengthMm, widthMm, waterDepthMm }) => Math.hypot(lengthMm, widthMm, waterDepthMm)),
          },
  }
}

/** Well past the 0.05 mm that comparisons of lengths allow. */
const plainlyMm = 0.1

/** Plainly standing free, or plainly too long for any place its maker allows; undefined: look closer. */
export function glanceAtSpace(scene: Scene, { piece, quantity, place }: Candidate): 'pass' | 'fail' | undefined {
  const { specs } = piece
  const length = readNumber(specs, 'lengthMm')
  const diameter = readNumber(specs, 'diameterMm')
  if (length === undefined || diameter === undefined || place || quantity > 1) return undefined
  if (readText(specs, 'form') === 'inline' || !hasAreas(scene.plan)) return undefined
  const { open, most } = once(scene, findReach)
  const orientation = readText(specs, 'orientation')
  const immersed = readNumber(specs, 'minImmersionMm') ?? length
  if (orientation !== 'horizontal') {
    for (const { waterMm, heightMm, acrossMm } of open)
      if (immersed <= waterMm && length <= heightMm && diameter + clearanceMm <= acrossMm) return 'pass'
  }
  if (most === null) return undefined
  const isPast = (lengthMm: number, limitMm: number) => lengthMm > limitMm + plainlyMm
  const upright = isPast(immersed, most.uprightMm)
  if (orientation === 'vertical') return upright ? 'fail' : undefined
  if (orientation === 'horizontal') return isPast(length, most.flatMm) ? 'fail' : undefined
  return upright && isPast(length, most.leaningMm) ? 'fail' : undefined
}
