import { measure, text } from './build'
import { electricAttributes } from './common'
import type { Kind } from './types'

export const lightController: Kind = {
  key: 'light-controller',
  label: 'light controller',
  plural: 'light controllers',
  electric: true,
  additive: false,
  attributes: [
    text('controlGroup', 'control group', 40, {
      role: 'check',
      guide: 'The name its maker gives the family of lamps that it speaks to.',
    }),
    measure('channels', 'channels', 'count', {
      plausible: [1, 32],
      usual: [1, 8],
      role: 'difference',
      better: 'more',
      guide: 'Count the groups of lamps that it sets apart.',
    }),
    ...electricAttributes([0, 100], [1, 20]),
  ],
}
