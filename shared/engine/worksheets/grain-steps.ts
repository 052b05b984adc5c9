import { carbonateIn, classifyGrain, middleGrainMm, movingSpeedMS } from '../physics/sand'
import { thresholds } from '../thresholds'
import { put } from './quantities'
import type { Step } from './types'

export interface Grains {
  readonly grainMinMm?: number
  readonly grainMaxMm?: number
}

/** Water over the bed for which the moving speed is given, mm: it changes with its seventh root alone. */
const depthOverBedMm = 400

/** Middle of the grain sizes; undefined where one of them is not known. */
export const findMiddleMm = ({ grainMinMm, grainMaxMm }: Grains): number | undefined =>
  grainMinMm === undefined || grainMaxMm === undefined ? undefined : middleGrainMm(grainMinMm, grainMaxMm)

export function listGrainSteps({ grainMinMm, grainMaxMm }: Grains): readonly Step[] {
  if (grainMinMm === undefined || grainMaxMm === undefined) return []
  const middleMm = middleGrainMm(grainMinMm, grainMaxMm)
  return [
    {
      title: `Middle of its grain sizes: ${classifyGrain(middleMm)}`,
      formula: '√(smallest × largest)',
      text: `√(${put(grainMinMm)} mm × ${put(grainMaxMm)} mm)`,
      value: middleMm,
      unit: 'mm',
      source: 'Wentworth 1922',
    },
    {
      title: 'Such grains begin to move where the water runs at',
      formula: '7 (h ÷ d)^(1/7) √(g (s − 1) d θcr)',
      text: `h = ${put(depthOverBedMm / 1000)} m of water, d = ${put(middleMm)} mm, carbonate at 35 ppt and 25 °C`,
      value: movingSpeedMS(middleMm, depthOverBedMm, carbonateIn(35, 25)),
      unit: 'm/s',
      source: 'Soulsby 1997, Dynamics of Marine Sands, for quartz: flaky or porous carbonate moves earlier',
    },
  ]
}

export function warnOfGrains(grains: Grains): readonly string[] {
  const middleMm = findMiddleMm(grains)
  if (middleMm === undefined) return []
  if (middleMm < thresholds.grainLowMm.value) return ['Fine: it blows about in strong flow.']
  return middleMm > thresholds.grainHighMm.value ? ['Coarse: waste gets caught between the grains.'] : []
}
