import { useMemo } from 'react'
import { drawHeatDay } from '#shared/engine/drawings/heat-day'
import { drawLight } from '#shared/engine/drawings/light'
import { drawPumpOnPipe } from '#shared/engine/drawings/pump'
import { drawSandScale } from '#shared/engine/drawings/sand-scale'
import { resolve } from '#shared/engine/setup/resolve'
import { createHeatScene, type HeatValues } from '#shared/engine/worksheets/heat-balance'
import { withCoral } from '#shared/engine/worksheets/light-map'
import { toLight, type LightValues } from '#shared/engine/worksheets/light-values'
import { readPumpValues, type PumpValues } from '#shared/engine/worksheets/pump-point'
import { standRod } from '#shared/engine/worksheets/rod-in-chamber'
import { usualClearanceMm, type RodValues } from '#shared/engine/worksheets/rod-values'
import type { SandValues } from '#shared/engine/worksheets/sand-bed'
import type { Setup } from '#shared/engine/types'
import type { Printer } from '#shared/units/print'
import { ChamberDetail } from '../../../components/drawings/chamber-detail'
import { HeatDay } from '../../../components/drawings/heat-day'
import { LightPlan } from '../../../components/drawings/light-plan'
import { PumpCurve } from '../../../components/drawings/pump-curve'
import { SandScale } from '../../../components/drawings/sand-scale'
import { toEngineSetup } from '../../../components/setup/to-engine-setup'
import type { Sheet } from '../hooks/use-sheet'

interface DrawingProps<Values> {
  readonly values: Values
  readonly setup: Setup
  readonly printer: Printer
}

function HeatDrawing({ values, setup, printer }: DrawingProps<HeatValues>) {
  const drawing = useMemo(() => drawHeatDay(createHeatScene(resolve(setup), values), values.heaterW), [setup, values])
  return <HeatDay drawing={drawing} printer={printer} />
}

function LightDrawing({ values, setup, printer }: DrawingProps<LightValues>) {
  const drawing = useMemo(() => {
    const { quantity, mountHeightMm, depthMm } = values
    return drawLight(withCoral(setup, values), toLight(values), {
      ...(quantity !== undefined && { quantity }),
      ...(mountHeightMm !== undefined && { heightMm: mountHeightMm }),
      ...(depthMm !== undefined && { depthMm }),
    })
  }, [setup, values])
  return drawing && <LightPlan drawing={drawing} printer={printer} />
}

function PumpDrawing({ values, printer }: DrawingProps<PumpValues>) {
  const drawing = useMemo(() => {
    const { curve, pipe } = readPumpValues(values)
    return curve && drawPumpOnPipe(curve, { staticHeadM: values.staticHeadM, pipe })
  }, [values])
  return drawing && <PumpCurve drawing={drawing} printer={printer} />
}

const givenSizes = new Set(['lengthMm', 'widthMm', 'waterDepthMm'].map((key) => `tank.chambers.0.${key}`))

function RodDrawing({ values, printer }: DrawingProps<RodValues>) {
  const stand = standRod(values)
  if (!stand) return null
  const { lengthMm, diameterMm, chamber, clearanceMm = usualClearanceMm } = values
  const { placement, fits } = stand
  return (
    <ChamberDetail
      chamber={{ ...chamber, id: placement.chamber, name: 'Chamber' }}
      at={0}
      given={givenSizes}
      printer={printer}
      clearanceMm={clearanceMm}
      rod={{
        ...placement,
        // One that fits nowhere is shown standing out of the water.
        ...(!fits && { position: 'upright' as const, angleDeg: 90 }),
        lengthMm,
        diameterMm,
        verdict: fits ? 'fits' : 'no',
      }}
    />
  )
}

function SandDrawing({ values }: DrawingProps<SandValues>) {
  return <SandScale drawing={drawSandScale(values.grainMinMm, values.grainMaxMm)} />
}

/** What a worksheet computes, drawn; nothing while its inputs do not work out. */
export function SheetDrawing({ sheet: { sheet, solved, printer } }: { readonly sheet: Sheet }) {
  const { values, setup: request } = solved.read
  const setup = useMemo(() => toEngineSetup(request), [request])
  if (!solved.working) return null
  // They worked out, so they are what the worksheet says it takes.
  const props = { values: values as never, setup, printer }
  switch (sheet.name) {
    case 'heat-balance':
      return <HeatDrawing {...props} />
    case 'light-map':
      return <LightDrawing {...props} />
    case 'pump-point':
      return <PumpDrawing {...props} />
    case 'rod-in-chamber':
      return <RodDrawing {...props} />
    case 'sand-bed':
      return <SandDrawing {...props} />
    default:
      return null
  }
}
