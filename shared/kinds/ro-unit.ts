import { boolean, measure, set } from './build'
import type { Kind } from './types'

export const roUnit: Kind = {
  key: 'ro-unit',
  label: 'RO/DI unit',
  plural: 'RO/DI units',
  electric: false,
  additive: false,
  attributes: [
    set(
      'stages',
      'stages',
      {
        sediment: 'sediment',
        carbon: 'carbon',
        membrane: 'membrane',
        deionisation: 'deionisation',
      },
      { role: 'check', guide: 'What is in each housing, in order of flow.' },
    ),
    measure('membraneLpd', 'membrane output', 'L/d', {
      plausible: [20, 10000],
      usual: [90, 1500],
      role: 'check',
      better: 'more',
      guide: 'The output printed on the membrane, at its own test pressure.',
    }),
    measure('testPressureKPa', 'test pressure', 'kPa', {
      plausible: [50, 3000],
      usual: [340, 550],
      role: 'check',
      guide: 'The pressure at which that output was rated.',
    }),
    measure('testTempC', 'test temperature', 'C', {
      plausible: [0, 50],
      usual: [20, 25],
      role: 'check',
      guide: 'The water temperature at which that output was rated.',
    }),
    measure('testTdsPpm', 'test dissolved solids', 'ppm', {
      plausible: [0, 10000],
      usual: [200, 2000],
      role: 'check',
      guide: 'The dissolved solids at which that output was rated.',
    }),
    measure('minFeedKPa', 'least feed pressure', 'kPa', {
      plausible: [20, 2000],
      usual: [200, 420],
      role: 'check',
      better: 'less',
      guide: 'The lowest tap pressure its maker allows.',
    }),
    measure('wasteRatio', 'waste per product', 'ratio', {
      plausible: [0, 20],
      usual: [1, 5],
      role: 'check',
      better: 'less',
      guide: 'Litres down the drain for each litre made, both caught for a minute.',
    }),
    boolean('boosterIncluded', 'booster pump included', {
      role: 'check',
      better: 'more',
    }),
    measure('rejectionFraction', 'rejection', 'fraction', {
      plausible: [0, 1],
      usual: [0.9, 0.995],
      role: 'difference',
      better: 'more',
      guide: 'One less the dissolved solids after the membrane over those before it.',
    }),
    boolean('tdsMeterIncluded', 'TDS meter included', {
      role: 'difference',
      better: 'more',
    }),
  ],
}
