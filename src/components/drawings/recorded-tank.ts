import { resolve } from '#shared/engine/setup/resolve'
import type { Specs } from '#shared/engine/types'
import type { TankDrawing } from './tank-drawing'

const outside = ['outerLengthMm', 'outerWidthMm', 'outerHeightMm'] as const

/** A tank as it is recorded; what is missing is filled in and drawn dashed. Null where its outside size is not known. */
export function drawRecordedTank(specs: Specs): TankDrawing | null {
  if (!outside.every((key) => typeof specs[key]?.value === 'number')) return null
  const { tank, assumed } = resolve({ units: 'metric', tank: { specs }, items: [] })
  const chambers = tank.chambers.flatMap((_, at) =>
    ['lengthMm', 'widthMm', 'waterDepthMm'].map((key) => `tank.chambers.${at}.${key}`),
  )
  const drawn = [...outside, 'waterLineMm', 'wallMm', 'bottomMm'].map((key) => `tank.${key}`)
  return { ...tank, given: new Set([...drawn, ...chambers].filter((path) => !assumed.has(path))) }
}
