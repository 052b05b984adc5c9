import { choice, measure } from './build'
import { mountTypes } from './light'
import type { Kind } from './types'

export const lightMount: Kind = {
  key: 'light-mount',
  label: 'light mount',
  plural: 'light mounts',
  electric: false,
  additive: false,
  attributes: [
    choice('type', 'type', mountTypes, { role: 'check' }),
    measure('maxLoadKg', 'greatest load', 'kg', {
      plausible: [0.05, 100],
      usual: [0.8, 15],
      role: 'check',
      better: 'more',
      guide: 'The heaviest lamp its maker allows.',
    }),
    measure('rimMinMm', 'thinnest rim', 'mm', {
      plausible: [0, 80],
      usual: [4, 10],
      role: 'check',
      guide: 'The smallest gap of the clamp.',
    }),
    measure('rimMaxMm', 'thickest rim', 'mm', {
      plausible: [2, 120],
      usual: [10, 30],
      role: 'check',
      guide: 'The largest gap of the clamp.',
    }),
    measure('spanMinMm', 'shortest span', 'mm', {
      plausible: [50, 3000],
      usual: [200, 1500],
      role: 'check',
      guide: 'Between the feet, pushed in.',
    }),
    measure('spanMaxMm', 'longest span', 'mm', {
      plausible: [50, 3500],
      usual: [250, 1800],
      role: 'check',
      guide: 'Between the feet, pulled out.',
    }),
    measure('reachMm', 'reach', 'mm', {
      plausible: [20, 1500],
      usual: [120, 450],
      role: 'difference',
      guide: 'From the clamp to the middle of the lamp.',
    }),
  ],
}
