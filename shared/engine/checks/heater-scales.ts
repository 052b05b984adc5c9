import type { Printer } from '../../units/print'
import { findHeaterNeed } from '../heat-budget'
import { once, type Scene } from '../scene'
import { findBasins } from '../setup/places'
import { thresholds } from '../thresholds'
import type { Scale, Zone } from '../types'
import { findStrengthLimits } from './heater-power'

/** Zones from a list of boundaries, leaving out stretches of no width. */
function toZones(from: number, steps: readonly (readonly [number, Zone['outcome']])[]): Zone[] {
  let start = from
  return steps.flatMap(([to, outcome]) => {
    const zone = { from: start, to, outcome }
    start = Math.max(start, to)
    return to > zone.from ? [zone] : []
  })
}

/** The deciding scales of a heater: its length against the roomiest place, its power against need and strength, its thickness. */
export function scaleHeaters(scene: Scene, words: Printer): Scale[] {
  const { plan } = scene
  const basins = findBasins(plan, undefined)
  const deepest = basins.reduce((best, basin) => (basin.waterDepthMm > best.waterDepthMm ? basin : best))
  const clearance = 2 * thresholds.rodClearanceMm.value
  const widest = basins.reduce((best, basin) =>
    Math.min(basin.lengthMm, basin.widthMm) > Math.min(best.lengthMm, best.widthMm) ? basin : best,
  )
  const acrossMm = Math.min(widest.lengthMm, widest.widthMm) - clearance
  // No rod can be longer than the diagonal of its box, however thin; beyond the depth only a leaning or partly dry one fits.
  const diagonalMm = Math.hypot(deepest.lengthMm - clearance, deepest.widthMm - clearance, deepest.waterDepthMm)
  const { needW, needUpperW, otherHeatersW } = once(scene, findHeaterNeed)
  const { passW, changeW } = once(scene, findStrengthLimits)
  const own = (watts: number) => Math.max(0, watts - otherHeatersW)
  const far = 1e9
  return [
    {
      key: 'lengthMm',
      check: 'heater.space',
      label: 'Length',
      unit: 'mm',
      limits: [deepest.waterDepthMm],
      limitText: `${words.length(deepest.waterDepthMm)} of water in the ${deepest.name}`,
      zones: toZones(0, [
        [deepest.waterDepthMm, 'pass'],
        [Math.max(deepest.waterDepthMm, diagonalMm), 'change'],
        [far, 'fail'],
      ]),
    },
    {
      key: 'powerW',
      check: 'heater.power',
      label: 'Power',
      unit: 'W',
      limits: needUpperW > 0 ? [own(needUpperW)] : [],
      limitText:
        needUpperW > 0
          ? `need ${words.pair([needW, needUpperW], 'W')} with the room at ${words.temperature(plan.room.coldestC)}`
          : 'no heater is needed at these temperatures',
      zones: toZones(0, [
        [own(needW / 2), 'fail'],
        [own(needUpperW), 'change'],
        [own(passW), 'pass'],
        [own(changeW), 'change'],
        [far, 'fail'],
      ]),
    },
    {
      key: 'diameterMm',
      check: 'heater.space',
      label: 'Thickness',
      unit: 'mm',
      limits: [acrossMm],
      limitText: `${words.length(acrossMm)} with water around it in the ${widest.name}`,
      zones: toZones(0, [
        [acrossMm, 'pass'],
        [far, 'fail'],
      ]),
    },
  ]
}
