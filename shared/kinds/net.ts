import { measure } from './build'
import type { Kind } from './types'

export const net: Kind = {
  key: 'net',
  label: 'net',
  plural: 'nets',
  electric: false,
  additive: true,
  attributes: [
    measure('openingMm', 'opening', 'mm', {
      plausible: [20, 1000],
      usual: [50, 300],
      role: 'check',
      guide: 'Across the longer side of the frame, wire to wire, outside.',
    }),
    measure('meshMm', 'mesh', 'mm', {
      plausible: [0.02, 20],
      usual: [0.1, 3],
      role: 'difference',
      guide: 'One side of a hole of the mesh.',
    }),
    measure('handleMm', 'handle length', 'mm', {
      plausible: [20, 3000],
      usual: [150, 600],
      role: 'difference',
      guide: 'From the frame to the end of the handle.',
    }),
  ],
}
