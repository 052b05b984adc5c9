import { findCurveFaults, findLightFaults } from './consistency-lists'
import { findTankFaults } from './consistency-tank'
import { getAttribute } from './index'
import type { KindKey } from './index'
import type { BareSpecs, Inconsistency } from './types'

type FindFaults = (specs: BareSpecs) => readonly Inconsistency[]

/** Pairs of which the first may not be above the second. */
const orderedPairs: Partial<Record<KindKey, readonly (readonly [string, string])[]>> = {
  light: [
    ['armRimMinMm', 'armRimMaxMm'],
    ['legSpanMinMm', 'legSpanMaxMm'],
  ],
  'light-mount': [
    ['rimMinMm', 'rimMaxMm'],
    ['spanMinMm', 'spanMaxMm'],
  ],
  heater: [
    ['ratedVolumeMinL', 'ratedVolumeMaxL'],
    ['minImmersionMm', 'lengthMm'],
  ],
  'temperature-controller': [['rangeMinC', 'rangeMaxC']],
  wavemaker: [
    ['flowMinLph', 'flowMaxLph'],
    ['wallMinMm', 'wallMaxMm'],
  ],
  skimmer: [['waterDepthMinMm', 'waterDepthMaxMm']],
  rock: [['bulkDensityKgL', 'solidDensityKgL']],
  sand: [
    ['grainMinMm', 'grainMaxMm'],
    ['bulkDensityKgL', 'solidDensityKgL'],
  ],
  'booster-pump': [['inletMinKPa', 'outletKPa']],
  'salinity-meter': [['minPpt', 'maxPpt']],
  scraper: [['wallMinMm', 'wallMaxMm']],
  'power-strip': [['switchedOutlets', 'outlets']],
}

const ownFaults: Partial<Record<KindKey, FindFaults>> = {
  tank: findTankFaults,
  light: findLightFaults,
  'return-pump': findCurveFaults,
  'ro-unit': findMembraneFaults,
  scraper: findScraperFaults,
}

function findPairFaults(kind: KindKey, specs: BareSpecs): Inconsistency[] {
  return (orderedPairs[kind] ?? []).flatMap(([lowKey, highKey]) => {
    const low = specs[lowKey]
    const high = specs[highKey]
    if (typeof low !== 'number' || typeof high !== 'number' || low <= high) return []
    const label = (key: string) => getAttribute(kind, key)?.label ?? key
    return [
      {
        path: lowKey,
        detail: `${label(lowKey)} must not be above ${label(highKey)}`,
      },
    ]
  })
}

function findMembraneFaults({ stages, membraneLpd }: BareSpecs): Inconsistency[] {
  if (membraneLpd === undefined || !Array.isArray(stages) || stages.includes('membrane')) return []
  return [
    {
      path: 'membraneLpd',
      detail: 'a unit without a membrane among its stages has no membrane output',
    },
  ]
}

function findScraperFaults({ form, blades, acrylicSafe, wallMinMm, wallMaxMm }: BareSpecs): Inconsistency[] {
  const faults: Inconsistency[] = []
  if (form === 'handheld' && (wallMinMm !== undefined || wallMaxMm !== undefined)) {
    const path = wallMinMm !== undefined ? 'wallMinMm' : 'wallMaxMm'
    faults.push({
      path,
      detail: 'only a magnet scraper is made for a wall thickness',
    })
  }
  if (
    acrylicSafe === true &&
    Array.isArray(blades) &&
    blades.length > 0 &&
    blades.every((blade) => blade === 'steel')
  ) {
    faults.push({
      path: 'acrylicSafe',
      detail: 'steel alone scratches acrylic',
    })
  }
  return faults
}

/** Everything in the specs of one piece that contradicts itself; an empty list where nothing does. Total: never throws. */
export function findInconsistencies(kind: KindKey, specs: BareSpecs): readonly Inconsistency[] {
  return [...findPairFaults(kind, specs), ...(ownFaults[kind]?.(specs) ?? [])]
}
