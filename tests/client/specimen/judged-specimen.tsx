import { drawLight } from '#shared/engine/drawings/light'
import { drawPump, drawPumpCurve } from '#shared/engine/drawings/pump'
import { drawSpectrum } from '#shared/engine/drawings/spectrum'
import { drawStand } from '#shared/engine/drawings/stand'
import type { Printer } from '#shared/units/print'
import { LightPlan } from '../../../src/components/drawings/light-plan'
import { PumpCurve } from '../../../src/components/drawings/pump-curve'
import { SpectrumBands } from '../../../src/components/drawings/spectrum-bands'
import { StandPlan } from '../../../src/components/drawings/stand-plan'
import { StandViews } from '../../../src/components/drawings/stand-views'
import { channels, cluster, nameless, pumps, setups, stands, strip } from './invented-gear'

const lights = [
  [setups.cube, cluster, 1],
  [setups.byVolume, strip, 1],
  [setups.long, cluster, 3],
  [setups.cube, nameless, 1],
] as const

const pumpsAtWork = [
  [setups.cube, pumps.controlled],
  [setups.sump, pumps.weak],
  [setups.sump, pumps.measured],
] as const

/** The drawings of pieces judged in a setup, each also where something is past its limit. */
export function JudgedSpecimen({ printer }: { readonly printer: Printer }) {
  const alone = drawPumpCurve(pumps.measured)
  return (
    <>
      <div className="grid gap-4 md:grid-cols-2">
        {lights.map(([setup, piece, quantity], at) => {
          const drawing = drawLight(setup, piece, { quantity })
          return drawing && <LightPlan key={at} drawing={drawing} printer={printer} />
        })}
      </div>
      <div className="grid gap-4 md:grid-cols-2">
        {[cluster, channels].map((piece, at) => {
          const drawing = drawSpectrum(piece)
          return drawing && <SpectrumBands key={at} drawing={drawing} printer={printer} />
        })}
      </div>
      <div className="grid gap-4 md:grid-cols-2">
        {pumpsAtWork.map(([setup, piece], at) => {
          const drawing = drawPump(setup, piece)
          return drawing && <PumpCurve key={at} drawing={drawing} printer={printer} />
        })}
        {alone && <PumpCurve drawing={alone} printer={printer} />}
      </div>
      {stands.map((piece, at) => {
        const standing = drawStand(at === 0 ? setups.byVolume : setups.cube, piece)
        return standing && <StandViews key={at} standing={standing} printer={printer} />
      })}
      <StandPlan top={{ lengthMm: 640, widthMm: 430 }} printer={printer} />
    </>
  )
}
