import { positionsBy } from '../checks/heater-space'
import { findLongestMm, slackInRectangleMm } from '../physics/geometry'
import { put } from './quantities'
import { usualClearanceMm, type RodValues } from './rod-values'
import type { Step } from './types'

/** The limits of each position that is allowed. */
export function listRodSteps(values: RodValues): readonly Step[] {
  const { lengthMm, diameterMm, minImmersionMm = lengthMm, orientation = 'any', chamber } = values
  const { clearanceMm: c = usualClearanceMm } = values
  const plan = [chamber.lengthMm - 2 * c, chamber.widthMm - 2 * c] as const
  const allowed = positionsBy[orientation] ?? []
  const runMm = findLongestMm(diameterMm, plan)
  const leanMm = runMm === null ? null : slackInRectangleMm([lengthMm, diameterMm], [runMm, chamber.waterDepthMm])
  const flatMm = findLongestMm(diameterMm + 2 * c, [chamber.lengthMm, chamber.widthMm])
  const upright: readonly Step[] = [
    {
      title: 'Standing: to spare beside it',
      formula: 'shorter side in plan − (thickness + 2 × clearance)',
      text: `${put(Math.min(chamber.lengthMm, chamber.widthMm))} mm − (${put(diameterMm)} mm + 2 × ${put(c)} mm)`,
      value: Math.min(chamber.lengthMm, chamber.widthMm) - diameterMm - 2 * c,
      unit: 'mm',
    },
    {
      title: 'Standing: to spare in the water',
      formula: 'water depth − length that must be under water',
      text: `${put(chamber.waterDepthMm)} mm − ${put(minImmersionMm)} mm`,
      value: chamber.waterDepthMm - minImmersionMm,
      unit: 'mm',
    },
  ]
  const leaning: readonly Step[] = [
    {
      title: 'Leaning: longest run in plan',
      formula: 'longest strip as thick as the rod that fits the plan at any angle, clear of the walls',
      text: `${put(diameterMm)} mm in ${put(plan[0])} mm × ${put(plan[1])} mm`,
      value: runMm,
      unit: 'mm',
      source: 'Carver 1957, American Mathematical Monthly 64',
    },
    {
      title: 'Leaning: longest rod',
      formula: 'longest strip as thick as the rod that fits run × water depth',
      text:
        runMm === null
          ? 'too thick at any length'
          : `${put(diameterMm)} mm in ${put(runMm)} mm × ${put(chamber.waterDepthMm)} mm`,
      value: leanMm === null ? null : lengthMm + leanMm,
      unit: 'mm',
    },
  ]
  const flat: readonly Step[] = [
    {
      title: 'Lying: longest rod',
      formula: 'longest strip as wide as the rod and its clearance that fits the plan at any angle, less the clearance',
      text: `${put(diameterMm + 2 * c)} mm in ${put(chamber.lengthMm)} mm × ${put(chamber.widthMm)} mm, less 2 × ${put(c)} mm`,
      value: flatMm === null ? null : flatMm - 2 * c,
      unit: 'mm',
    },
  ]
  const by = { upright, leaning, flat }
  return allowed.flatMap((position) => by[position])
}
