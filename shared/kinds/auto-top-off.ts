import { measure } from './build'
import { electricAttributes } from './common'
import type { Kind } from './types'

export const autoTopOff: Kind = {
  key: 'auto-top-off',
  label: 'auto top-off',
  plural: 'auto top-offs',
  electric: true,
  additive: false,
  attributes: [
    measure('lengthMm', 'sensor length', 'mm', {
      plausible: [5, 400],
      usual: [20, 120],
      role: 'check',
      guide: 'The sensor with its holder, seen from above, along its longer side.',
    }),
    measure('widthMm', 'sensor width', 'mm', {
      plausible: [5, 300],
      usual: [15, 80],
      role: 'check',
      guide: 'The sensor with its holder, seen from above, across its shorter side.',
    }),
    measure('pumpHeadM', 'pump head', 'm', {
      plausible: [0.1, 20],
      usual: [0.8, 4],
      role: 'check',
      better: 'more',
      guide: 'The height at which its pump stops delivering.',
    }),
    measure('reservoirL', 'reservoir', 'L', {
      plausible: [0.2, 1000],
      usual: [3, 60],
      role: 'check',
      better: 'more',
      guide: 'What its own reservoir holds up to the fill mark.',
    }),
    ...electricAttributes([0.5, 200], [2, 25]),
  ],
}
