import { measure } from './build'
import { electricAttributes } from './common'
import type { Kind } from './types'

export const boosterPump: Kind = {
  key: 'booster-pump',
  label: 'booster pump',
  plural: 'booster pumps',
  electric: true,
  additive: false,
  attributes: [
    measure('inletMinKPa', 'least inlet pressure', 'kPa', {
      plausible: [0, 1000],
      usual: [0, 250],
      role: 'check',
      better: 'less',
      guide: 'The lowest pressure at its inlet that its maker allows.',
    }),
    measure('outletKPa', 'outlet pressure', 'kPa', {
      plausible: [50, 2000],
      usual: [400, 900],
      role: 'check',
      guide: 'The pressure it holds after itself at its rated flow.',
    }),
    measure('maxLpd', 'greatest flow', 'L/d', {
      plausible: [20, 50000],
      usual: [300, 6000],
      role: 'check',
      better: 'more',
      guide: 'The water it passes in a day, product and waste together.',
    }),
    ...electricAttributes([1, 1000], [10, 100]),
  ],
}
