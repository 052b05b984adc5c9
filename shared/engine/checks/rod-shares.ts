import type { Item, Placement } from '../types'
import type { Basin } from '../setup/places'
import type { Say } from '../rule'
import { chooseStand, describeStand, type Rod, type Stand } from './rod-space'

/** So many of several equal rods in one basin. */
export interface Share {
  readonly stand: Stand
  readonly count: number
}

/** Several rods for which one basin is too small, shared out over all; undefined where there is no room for each. */
export function shareOut(
  rod: Rod,
  basins: readonly Basin[],
  others: readonly Item[],
  positions: readonly Placement['position'][],
): readonly Share[] | undefined {
  const shares: Share[] = []
  let left = rod.quantity
  for (const basin of basins) {
    for (let count = left; count > 0; count -= 1) {
      const [stand] = chooseStand({ ...rod, quantity: count }, [basin], others, positions)
      if (!stand?.fits) continue
      shares.push({ stand, count })
      left -= count
      break
    }
  }
  return left === 0 ? shares : undefined
}

/** "Stands in the left chamber with 40 mm to spare; 1 there, 1 in the right chamber." */
export const describeShares =
  ([first, ...rest]: readonly Share[]): Say =>
  (words) => {
    if (!first) return ''
    const elsewhere = rest.map(({ stand, count }) => `${count} in the ${stand.basin.name}`).join(', ')
    return `${describeStand(first.stand)(words).replace(/\.$/, '')}; ${first.count} there, ${elsewhere}.`
  }
