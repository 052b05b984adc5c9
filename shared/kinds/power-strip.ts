import { boolean, measure } from './build'
import { plugAttributes } from './common'
import type { Kind } from './types'

export const powerStrip: Kind = {
  key: 'power-strip',
  label: 'power strip',
  plural: 'power strips',
  electric: true,
  additive: false,
  attributes: [
    measure('outlets', 'outlets', 'count', {
      plausible: [1, 40],
      usual: [3, 12],
      role: 'check',
      better: 'more',
      guide: 'Count every outlet, switched or not.',
    }),
    measure('switchedOutlets', 'switched outlets', 'count', {
      plausible: [0, 40],
      usual: [0, 12],
      role: 'check',
      better: 'more',
      guide: 'Count the outlets that can each be switched by themselves.',
    }),
    measure('ratedA', 'rated current', 'A', {
      plausible: [1, 63],
      usual: [8, 16],
      role: 'check',
      better: 'more',
      guide: 'Read the rating plate.',
    }),
    measure('ratedV', 'rated voltage', 'V', {
      plausible: [90, 415],
      usual: [100, 250],
      role: 'check',
      guide: 'Read the rating plate.',
    }),
    boolean('surgeProtected', 'surge protection', {
      role: 'difference',
      better: 'more',
    }),
    ...plugAttributes,
  ],
}
