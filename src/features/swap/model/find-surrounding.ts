import type { Plan } from '#shared/engine/setup/plan'
import type { Placement } from '#shared/engine/types'
import type { KindKey } from '#shared/kinds/index'
import type { Surrounding } from '../../../components/drawings/swap-layout'

const inChamber: ReadonlySet<KindKey> = new Set<KindKey>(['heater', 'return-pump', 'skimmer', 'auto-top-off'])

/** What the candidates have to do with: the water that they stand in, or the tank that they light or carry. */
export function findSurrounding(kind: KindKey, { tank }: Plan, place: Placement | undefined): Surrounding | null {
  if (kind === 'light' || kind === 'stand') return { name: 'outside length of the tank', lengthMm: tank.outerLengthMm }
  if (!inChamber.has(kind)) return null
  const chamber = tank.chambers.find(({ id }) => id === place?.chamber) ?? tank.chambers[0]
  if (!chamber || place?.chamber === 'display')
    return {
      name: 'display',
      lengthMm: tank.displayLengthMm,
      heightMm: tank.waterLineMm,
      widthMm: tank.displayWidthMm,
    }
  const { name, lengthMm, waterDepthMm, widthMm } = chamber
  return { name, lengthMm, heightMm: waterDepthMm, widthMm }
}
