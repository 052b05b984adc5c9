import type { SetupRequest } from '#shared/schemas/setup'

const outside = ['outerLengthMm', 'outerWidthMm', 'outerHeightMm']
const enough = ['volumeL', 'nominalVolumeL', 'gear']

/** Whether enough is said of the tank for anything to be judged: its outside size, a volume, or which one it is. */
export function hasTankSize({ tank }: SetupRequest): boolean {
  const said = tank as Readonly<Record<string, unknown>>
  return outside.every((key) => said[key] !== undefined) || enough.some((key) => said[key] !== undefined)
}
