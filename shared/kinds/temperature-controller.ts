import { boolean, measure } from './build'
import { electricAttributes } from './common'
import type { Kind } from './types'

export const temperatureController: Kind = {
  key: 'temperature-controller',
  label: 'temperature controller',
  plural: 'temperature controllers',
  electric: true,
  additive: false,
  attributes: [
    measure('maxLoadW', 'greatest load', 'W', {
      plausible: [10, 10000],
      usual: [200, 3600],
      role: 'check',
      better: 'more',
      guide: 'The heating power its maker lets it switch, all outlets together.',
    }),
    measure('outlets', 'outlets', 'count', {
      plausible: [1, 16],
      usual: [1, 4],
      role: 'check',
      better: 'more',
      guide: 'Count the outlets that it switches for heating.',
    }),
    measure('rangeMinC', 'lowest setting', 'C', {
      plausible: [-60, 60],
      usual: [-50, 20],
      role: 'check',
      guide: 'The lowest temperature it can be set to.',
    }),
    measure('rangeMaxC', 'highest setting', 'C', {
      plausible: [10, 250],
      usual: [30, 120],
      role: 'check',
      guide: 'The highest temperature it can be set to.',
    }),
    boolean('highAlarm', 'alarm when too warm', {
      role: 'difference',
      better: 'more',
    }),
    ...electricAttributes([0, 100], [1, 10]),
  ],
}
