import { measure, set } from './build'
import { madeFor } from './common'
import type { Kind } from './types'

export const testKit: Kind = {
  key: 'test-kit',
  label: 'test kit',
  plural: 'test kits',
  electric: false,
  additive: true,
  attributes: [
    set(
      'parameters',
      'parameters',
      {
        ammonia: 'ammonia',
        nitrite: 'nitrite',
        nitrate: 'nitrate',
        ph: 'pH',
        alkalinity: 'alkalinity',
        calcium: 'calcium',
        magnesium: 'magnesium',
        phosphate: 'phosphate',
      },
      { role: 'check', guide: 'What it can measure in salt water.' },
    ),
    measure('testsEach', 'tests of each', 'count', {
      plausible: [1, 2000],
      usual: [20, 200],
      role: 'difference',
      better: 'more',
      guide: 'Tests of the parameter that runs out first.',
    }),
    madeFor,
  ],
}
