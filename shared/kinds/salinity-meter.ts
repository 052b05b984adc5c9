import { boolean, choice, measure, set } from './build'
import type { Kind } from './types'

export const salinityMeter: Kind = {
  key: 'salinity-meter',
  label: 'salinity meter',
  plural: 'salinity meters',
  electric: false,
  additive: false,
  attributes: [
    choice(
      'method',
      'method',
      {
        refractometer: 'refractometer',
        hydrometer: 'hydrometer',
        conductivity: 'conductivity meter',
      },
      { role: 'check' },
    ),
    set(
      'scales',
      'scales',
      {
        'seawater-ppt': 'seawater, ppt',
        'seawater-sg': 'seawater, specific gravity',
        nacl: 'table salt (NaCl)',
        brix: 'sugar (Brix)',
        other: 'other',
      },
      {
        role: 'check',
        guide: 'What the scale is made for, from its maker’s sheet rather than the letters on it.',
      },
    ),
    measure('minPpt', 'lowest reading', 'ppt', {
      plausible: [0, 100],
      usual: [0, 30],
      role: 'check',
      guide: 'The lowest mark of the salinity scale.',
    }),
    measure('maxPpt', 'highest reading', 'ppt', {
      plausible: [1, 400],
      usual: [40, 100],
      role: 'check',
      guide: 'The highest mark of the salinity scale.',
    }),
    measure('resolutionPpt', 'step', 'ppt', {
      plausible: [0.001, 20],
      usual: [0.1, 1],
      role: 'check',
      better: 'less',
      guide: 'The salinity between two neighbouring marks or digits.',
    }),
    boolean('temperatureCompensated', 'temperature compensated', {
      role: 'difference',
      better: 'more',
    }),
    measure('calibrationPpt', 'calibration fluid', 'ppt', {
      plausible: [0, 100],
      usual: [0, 53],
      role: 'difference',
      guide: 'The salinity of the fluid that comes with it, 0 for pure water.',
    }),
  ],
}
