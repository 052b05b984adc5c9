import { measure } from './build'
import { electricAttributes, madeFor, rodAttributes } from './common'
import type { Kind } from './types'

export const wavemaker: Kind = {
  key: 'wavemaker',
  label: 'wavemaker',
  plural: 'wavemakers',
  electric: true,
  additive: true,
  attributes: [
    measure('flowMinLph', 'least flow', 'L/h', {
      plausible: [0, 100000],
      usual: [200, 10000],
      role: 'check',
      guide: 'Flow at its lowest setting; the same as the greatest where it has one speed.',
    }),
    measure('flowMaxLph', 'greatest flow', 'L/h', {
      plausible: [50, 200000],
      usual: [800, 30000],
      role: 'check',
      guide: 'Flow at its highest setting.',
    }),
    measure('wallMinMm', 'thinnest wall', 'mm', {
      plausible: [0, 60],
      usual: [0, 8],
      role: 'check',
      guide: 'The thinnest wall its maker allows for the magnet.',
    }),
    measure('wallMaxMm', 'thickest wall', 'mm', {
      plausible: [2, 100],
      usual: [8, 30],
      role: 'check',
      guide: 'The thickest wall through which the magnet holds.',
    }),
    measure('outletMm', 'outlet diameter', 'mm', {
      plausible: [5, 300],
      usual: [20, 120],
      role: 'difference',
      guide: 'Calipers across the opening that the water leaves by.',
    }),
    ...rodAttributes(
      { plausible: [15, 500], usual: [40, 200] },
      { plausible: [15, 400], usual: [35, 150] },
      'From its magnet, where it meets the glass, to the front of its guard.',
    ),
    madeFor,
    ...electricAttributes([0.5, 500], [2, 80]),
  ],
}
