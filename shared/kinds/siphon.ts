import { measure } from './build'
import type { Kind } from './types'

export const siphon: Kind = {
  key: 'siphon',
  label: 'siphon',
  plural: 'siphons',
  electric: false,
  additive: false,
  attributes: [
    measure('tubeLengthMm', 'tube length', 'mm', {
      plausible: [50, 2500],
      usual: [150, 1000],
      role: 'check',
      guide: 'The stiff tube that goes into the sand, end to end.',
    }),
    measure('hoseLengthMm', 'hose length', 'mm', {
      plausible: [100, 20000],
      usual: [1000, 3000],
      role: 'check',
      better: 'more',
      guide: 'The soft hose, pulled straight.',
    }),
    measure('tubeDiameterMm', 'tube diameter', 'mm', {
      plausible: [5, 150],
      usual: [15, 60],
      role: 'difference',
      guide: 'Calipers across the open end of the tube, outside.',
    }),
  ],
}
