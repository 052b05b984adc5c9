import type { Judgement, Say } from '../rule'
import type { Plan } from '../setup/plan'
import type { Place } from '../types'
import { describeBody, listBodySizes, type BodyFit } from './body-space'
import { hasAreas, noAreas } from './shape'

/** What there is to say of a piece for which there is no water: no such chamber, no sump, or it is not to stand in any. */
export function lackWater(place: Place | undefined): Judgement {
  if (place && 'chamber' in place)
    return { outcome: 'fail', rests: () => [], say: () => `The tank has no chamber “${place.chamber}”.` }
  if (place?.in === 'cabinet')
    return {
      outcome: 'fail',
      rests: () => ['tank.filtration'],
      say: () => 'There is no sump in the cabinet to put it in.',
    }
  return { outcome: 'nodata', missing: [], say: () => 'What is outside the tank’s water cannot be checked here.' }
}

const outside = ['tank.outerLengthMm', 'tank.outerWidthMm', 'tank.outerHeightMm', 'tank.wallMm']

/**
 * Setup paths that could bring another size of the water that a body does not fit in, or other water: a chamber's depth
 * follows from the tank's line, a sump's and the display's sizes from its outside, where nobody said them.
 */
export function listBodyTurns({ assumed, tank }: Plan, { path, id }: BodyFit['basin']): readonly string[] {
  if (path.startsWith('tank.chambers.')) {
    const isDepthAssumed = tank.chambers.some((_, index) => assumed.has(`tank.chambers.${index}.waterDepthMm`))
    const own = ['lengthMm', 'widthMm', 'waterDepthMm'].map((key) => `tank.chambers.*.${key}`)
    return isDepthAssumed ? [...own, 'tank.waterLineMm', ...outside] : own
  }
  const own =
    id === 'sump'
      ? ['lengthMm', 'widthMm', 'waterDepthMm'].map((key) => `${path}.${key}`)
      : ['tank.displayLengthMm', 'tank.displayWidthMm', 'tank.waterLineMm']
  return [...own, ...outside, 'tank.filtration']
}

/** A body's fit as a judgement; `subject` as in `describeBody`. */
export function judgeBody(fit: BodyFit, plan: Plan, subject?: string): Judgement {
  if (fit.basin.path === 'tank' && !hasAreas(plan)) return noAreas(plan)
  if (fit.isUnsure) return { outcome: 'nodata', missing: [], cautions: fit.cautions, say: describeBody(fit, subject) }
  const isBySize = fit.tight !== 'company' && fit.tight !== 'opening'
  const inDisplay: readonly Say[] =
    fit.basin.id === 'display' && fit.fits ? [() => 'No chamber or sump for it: it stands in the display.'] : []
  return {
    outcome: fit.fits ? 'pass' : 'fail',
    ...(isBySize && { measured: fit.measuredMm, limit: fit.limitMm, probability: fit.probability, settle: fit.settle }),
    ...(fit.fits && { placement: { chamber: fit.basin.id, position: 'upright' as const, angleDeg: 90 } }),
    rests: () => (fit.fits ? listBodySizes(fit) : listBodyTurns(plan, fit.basin)),
    cautions: [...inDisplay, ...fit.cautions],
    say: describeBody(fit, subject),
  }
}

/** Setup paths of all basins' sizes in plan and depth. */
export const bodyUses: readonly string[] = [
  'tank.chambers.*.lengthMm',
  'tank.chambers.*.widthMm',
  'tank.chambers.*.waterDepthMm',
  'tank.sump.lengthMm',
  'tank.sump.widthMm',
  'tank.sump.waterDepthMm',
  'tank.displayLengthMm',
  'tank.displayWidthMm',
  'tank.waterLineMm',
  'tank.filtration',
  'tank.shape',
]
