import { measure } from './build'
import { madeFor, packAttribute } from './common'
import type { Kind } from './types'

export const saltMix: Kind = {
  key: 'salt-mix',
  label: 'salt mix',
  plural: 'salt mixes',
  electric: false,
  additive: false,
  attributes: [
    packAttribute([1, 25], 'The net mass printed on the bag or bucket.'),
    measure('makesL', 'makes', 'L', {
      plausible: [1, 20000],
      usual: [25, 800],
      role: 'check',
      better: 'more',
      guide: 'Litres of water at 35 ppt that the whole pack makes.',
    }),
    measure('alkalinityDkh', 'alkalinity', 'dKH', {
      plausible: [1, 30],
      usual: [6.5, 13],
      role: 'difference',
      guide: 'Tested in freshly mixed water at 35 ppt.',
    }),
    measure('calciumPpm', 'calcium', 'ppm', {
      plausible: [100, 1000],
      usual: [380, 500],
      role: 'difference',
      guide: 'Tested in freshly mixed water at 35 ppt.',
    }),
    measure('magnesiumPpm', 'magnesium', 'ppm', {
      plausible: [200, 3000],
      usual: [1150, 1550],
      role: 'difference',
      guide: 'Tested in freshly mixed water at 35 ppt.',
    }),
    madeFor,
  ],
}
