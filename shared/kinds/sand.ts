import { boolean, choice, measure } from './build'
import { madeFor, packAttribute } from './common'
import type { Kind } from './types'

export const sand: Kind = {
  key: 'sand',
  label: 'sand',
  plural: 'sand',
  electric: false,
  additive: false,
  attributes: [
    choice(
      'mineral',
      'mineral',
      {
        aragonite: 'aragonite',
        calcite: 'calcite',
        silica: 'silica',
        volcanic: 'volcanic',
      },
      {
        role: 'check',
        guide: 'Vinegar fizzes on aragonite and calcite, not on silica.',
      },
    ),
    measure('grainMinMm', 'smallest grain', 'mm', {
      plausible: [0.01, 60],
      usual: [0.1, 3],
      role: 'check',
      guide: 'The finer sieve of the range on the bag.',
    }),
    measure('grainMaxMm', 'largest grain', 'mm', {
      plausible: [0.02, 80],
      usual: [0.4, 8],
      role: 'check',
      guide: 'The coarser sieve of the range on the bag.',
    }),
    choice('state', 'state', { dry: 'dry', live: 'live' }, { role: 'check' }),
    packAttribute([2, 25], 'The net mass printed on the bag.'),
    measure('bulkDensityKgL', 'bulk density', 'kg/L', {
      plausible: [0.5, 3],
      usual: [1.1, 1.8],
      role: 'check',
      guide: 'Mass of one litre, poured and tapped level.',
    }),
    measure('solidDensityKgL', 'density of the grains', 'kg/L', {
      plausible: [1.5, 5],
      usual: [2.5, 3],
      role: 'check',
      guide: 'Dry mass over the water that the grains displace.',
    }),
    boolean('magneticGrains', 'magnetic grains', {
      role: 'check',
      better: 'less',
      guide: 'Whether a magnet in a bag picks grains up.',
    }),
    madeFor,
  ],
}
