import { measure } from './build'
import { bodyAttributes, electricAttributes, madeFor } from './common'
import type { Kind } from './types'

export const skimmer: Kind = {
  key: 'skimmer',
  label: 'protein skimmer',
  plural: 'protein skimmers',
  electric: true,
  additive: false,
  attributes: [
    ...bodyAttributes([20, 2000], [50, 800]),
    measure('waterDepthMinMm', 'least water depth', 'mm', {
      plausible: [10, 1500],
      usual: [80, 300],
      role: 'check',
      guide: 'The shallowest water its maker allows it to stand in.',
    }),
    measure('waterDepthMaxMm', 'greatest water depth', 'mm', {
      plausible: [20, 2000],
      usual: [100, 450],
      role: 'check',
      guide: 'The deepest water its maker allows it to stand in.',
    }),
    measure('ratedVolumeL', 'rated volume', 'L', {
      plausible: [5, 20000],
      usual: [40, 2000],
      role: 'check',
      better: 'more',
      guide: 'The largest tank its maker states, at a light stock of animals if it states several.',
    }),
    madeFor,
    ...electricAttributes([0.5, 500], [2, 80]),
  ],
}
