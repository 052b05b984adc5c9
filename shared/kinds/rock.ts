import { choice, measure } from './build'
import { madeFor, packAttribute } from './common'
import type { Kind } from './types'

export const rock: Kind = {
  key: 'rock',
  label: 'rock',
  plural: 'rock',
  electric: false,
  additive: true,
  attributes: [
    choice('state', 'state', { dry: 'dry', live: 'live', artificial: 'artificial' }, { role: 'check' }),
    choice(
      'form',
      'form',
      {
        base: 'base',
        ledge: 'ledge',
        arch: 'arch',
        branch: 'branch',
        rubble: 'rubble',
      },
      { role: 'check' },
    ),
    packAttribute([2, 25], 'The net mass printed on the box; drained of water if live.'),
    measure('bulkDensityKgL', 'bulk density', 'kg/L', {
      plausible: [0.2, 3],
      usual: [0.6, 1.8],
      role: 'check',
      guide: 'Mass of a full bucket of it, pieces as they fall, over the bucket’s volume.',
    }),
    measure('solidDensityKgL', 'density in water', 'kg/L', {
      plausible: [0.8, 3.2],
      usual: [1.5, 2.9],
      role: 'check',
      guide: 'Dry mass over the water it displaces once its pores have filled.',
    }),
    madeFor,
  ],
}
