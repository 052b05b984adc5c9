import { useMemo } from 'react'
import { resolve } from '#shared/engine/setup/resolve'
import type { Gear } from '#shared/schemas/gear'
import type { Printer } from '#shared/units/print'
import { TankPlan } from '../../../components/drawings/tank-plan'
import { TankSection } from '../../../components/drawings/tank-section'
import type { TankDrawing } from '../../../components/drawings/tank-drawing'
import { findSizes } from '../find-sizes'
import { PieceDrawing } from './piece-drawing'

/** A tank as it is recorded; what is missing is filled in and drawn dashed. Null where its size is not known. */
function toTankDrawing({ specs }: Gear): TankDrawing | null {
  const known = ['outerLengthMm', 'outerWidthMm', 'outerHeightMm'].every((key) => typeof specs[key] === 'number')
  if (!known) return null
  const valued = Object.fromEntries(
    Object.entries(specs).map(([key, value]) => [key, { value, source: 'maker' as const }]),
  )
  const { tank, assumed } = resolve({ units: 'metric', tank: { specs: valued }, items: [] })
  const drawn = ['outerLengthMm', 'outerWidthMm', 'outerHeightMm', 'waterLineMm', 'wallMm', 'bottomMm']
  const chambers = tank.chambers.flatMap((_, at) =>
    ['lengthMm', 'widthMm', 'waterDepthMm'].map((key) => `tank.chambers.${at}.${key}`),
  )
  const given = [...drawn.map((key) => `tank.${key}`), ...chambers].filter((path) => !assumed.has(path))
  return { ...tank, given: new Set(given) }
}

/** The piece to scale, where enough of its sizes is recorded. */
export function GearDrawing({ gear, printer }: { readonly gear: Gear; readonly printer: Printer }) {
  const tank = useMemo(() => (gear.kind === 'tank' ? toTankDrawing(gear) : null), [gear])
  if (tank)
    return (
      <div className="grid gap-3 sm:grid-cols-2">
        <TankPlan drawing={tank} printer={printer} />
        <TankSection drawing={tank} printer={printer} />
      </div>
    )
  const sizes = findSizes(gear.specs)
  return sizes ? <PieceDrawing name={`${gear.brand} ${gear.model}`} sizes={sizes} printer={printer} /> : null
}
