import { bulkDensityKgL as packGrains, sandBedKg } from '../physics/sand'
import { countPacks } from '../physics/salt'
import { boxVolumeL } from '../physics/weight'
import { defaults } from '../setup/defaults'
import { fromKind, fromSetupField, required } from './fields'
import { listGrainSteps, warnOfGrains, type Grains } from './grain-steps'
import { assume } from './plan-inputs'
import { put } from './quantities'
import type { Worksheet } from './types'

export interface SandValues extends Grains {
  readonly lengthMm: number
  readonly widthMm: number
  readonly depthMm: number
  readonly bulkDensityKgL?: number
  readonly packKg: number
}

const dryDensity = defaults.sandBulkDensityKgL

export const sandBed: Worksheet = {
  name: 'sand-bed',
  title: 'Sand for a bed',
  intro: 'How much dry sand a bed takes, and how many bags that is.',
  fields: [
    required(fromSetupField('lengthMm', 'tank.displayLengthMm', { label: 'length of the bed', plausible: [10, 6000] })),
    required(fromSetupField('widthMm', 'tank.displayWidthMm', { label: 'width of the bed', plausible: [10, 3000] })),
    required(fromSetupField('depthMm', 'goals.sandDepthMm', { label: 'depth of the bed' })),
    fromKind('bulkDensityKgL', 'sand', 'bulkDensityKgL'),
    required(fromKind('packKg', 'sand', 'packKg', { label: 'mass of a bag' })),
    fromKind('grainMinMm', 'sand', 'grainMinMm'),
    fromKind('grainMaxMm', 'sand', 'grainMaxMm'),
  ],
  results: [
    { key: 'massKg', label: 'Dry sand', unit: 'kg' },
    { key: 'packs', label: 'Bags to buy', unit: 'count' },
    { key: 'litres', label: 'Volume of the bed', unit: 'L' },
  ],
  basis: {
    type: 'physics',
    source: 'Area × depth × bulk density; grains of 2.8 kg/L with 45 % pores where none is stated',
  },
  example: { lengthMm: 1176, widthMm: 576, depthMm: 40, packKg: 9, grainMinMm: 0.5, grainMaxMm: 1.7 },
  work(values: SandValues, _setup, words) {
    const { lengthMm, widthMm, depthMm, bulkDensityKgL = dryDensity, packKg } = values
    if ((values.grainMinMm ?? 0) > (values.grainMaxMm ?? Infinity))
      return {
        ok: false,
        problems: [{ path: 'grainMaxMm', detail: 'The largest grain is smaller than the smallest.' }],
      }
    const litres = boxVolumeL(lengthMm, widthMm, depthMm)
    const massKg = sandBedKg(lengthMm, widthMm, depthMm, bulkDensityKgL)
    const packs = countPacks(massKg / packKg)
    const isAssumed = values.bulkDensityKgL === undefined
    return {
      ok: true,
      result: { litres, massKg, packs },
      steps: [
        {
          title: 'Volume of the bed',
          formula: 'length × width × depth',
          text: `${put(lengthMm / 1000)} m × ${put(widthMm / 1000)} m × ${put(depthMm / 1000)} m × 1000 L/m³`,
          value: litres,
          unit: 'L',
        },
        ...(isAssumed
          ? [
              {
                title: 'Bulk density',
                formula: 'density of the grains × (1 − share of pores)',
                text: `${put(defaults.sandSolidDensityKgL)} kg/L × (1 − 0.45)`,
                value: packGrains(defaults.sandSolidDensityKgL, 0.45),
                unit: 'kg/L' as const,
                source: 'Aragonite 2.93 and calcite 2.71 kg/L; 40–50 % pores in settled sand',
              },
            ]
          : []),
        {
          title: 'Dry sand',
          formula: 'volume × bulk density',
          text: `${put(litres)} L × ${put(bulkDensityKgL)} kg/L`,
          value: massKg,
          unit: 'kg',
        },
        {
          title: 'Bags',
          formula: 'sand ÷ mass of a bag, rounded up',
          text: `${put(massKg)} kg ÷ ${put(packKg)} kg`,
          value: packs,
          unit: 'count',
        },
        ...listGrainSteps(values),
      ],
      cautions: [
        ...warnOfGrains(values),
        'Never take sand from a beach: it may be protected, and it carries what lives and what was spilt there.',
        ...(depthMm === 0 ? ['A bare bottom is less stable: less surface for what keeps the water clean.'] : []),
      ],
      assumptions: isAssumed
        ? [assume('bulkDensityKgL', dryDensity, 'Bulk density', words.measure(dryDensity, 'kg/L'))]
        : [],
    }
  },
}
