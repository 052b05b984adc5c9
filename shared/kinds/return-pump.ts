import { boolean, groups, measure } from './build'
import { bodyAttributes, electricAttributes, madeFor } from './common'
import type { Kind } from './types'

const curveFields = [
  measure('headM', 'head', 'm', {
    plausible: [0, 30],
    usual: [0, 8],
    role: 'check',
    guide: 'The height of water it pushes against.',
  }),
  measure('flowLph', 'flow', 'L/h', {
    plausible: [0, 100000],
    usual: [0, 20000],
    role: 'check',
    guide: 'What it delivers at that head, by bucket and stopwatch or its maker’s curve.',
  }),
]

export const returnPump: Kind = {
  key: 'return-pump',
  label: 'return pump',
  plural: 'return pumps',
  electric: true,
  additive: false,
  attributes: [
    ...bodyAttributes([15, 800], [35, 350]),
    groups('flowCurve', 'flow curve', {
      role: 'check',
      guide: 'At least two points: flow at no head, and the head at which flow ends.',
      fields: curveFields,
      required: ['headM', 'flowLph'],
      phrase: '{flowLph} at {headM}',
    }),
    measure('boreMm', 'bore', 'mm', {
      plausible: [3, 110],
      usual: [8, 50],
      role: 'check',
      guide: 'Calipers inside the outlet or its hose tail.',
    }),
    boolean('dcControl', 'speed control', {
      role: 'check',
      better: 'more',
      guide: 'Whether its flow can be set electrically.',
    }),
    measure('minDepthMm', 'least water depth', 'mm', {
      plausible: [5, 1000],
      usual: [30, 250],
      role: 'check',
      better: 'less',
      guide: 'The depth of water below which it draws air.',
    }),
    boolean('submersible', 'runs under water', { role: 'difference' }),
    madeFor,
    ...electricAttributes([0.5, 2000], [2, 250]),
  ],
}
