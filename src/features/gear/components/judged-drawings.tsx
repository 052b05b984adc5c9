import { useMemo } from 'react'
import { drawLight } from '#shared/engine/drawings/light'
import { drawPumpCurve } from '#shared/engine/drawings/pump'
import { drawSpectrum } from '#shared/engine/drawings/spectrum'
import type { Piece } from '#shared/engine/types'
import type { Printer } from '#shared/units/print'
import { LightPlan } from '../../../components/drawings/light-plan'
import { PumpCurve } from '../../../components/drawings/pump-curve'
import { SpectrumBands } from '../../../components/drawings/spectrum-bands'
import { chooseExample } from '../example-setup'

export interface JudgedDrawingsProps {
  readonly piece: Piece
  readonly printer: Printer
}

function LightDrawings({ piece, printer }: JudgedDrawingsProps) {
  const lengthMm = piece.specs.lengthMm?.value
  const { light, volumeL } = useMemo(() => {
    const { setup, volumeL } = chooseExample(typeof lengthMm === 'number' ? lengthMm : 0)
    return { light: drawLight(setup, piece), volumeL }
  }, [lengthMm, piece])
  const spectrum = drawSpectrum(piece)
  return (
    <>
      <div className="grid items-start gap-3 sm:grid-cols-2">
        {light && <LightPlan drawing={light} printer={printer} isExample />}
        {spectrum && <SpectrumBands drawing={spectrum} printer={printer} />}
      </div>
      {light && (
        <p className="mt-2 max-w-prose text-sm text-ink-soft">
          The tank is an example: {printer.volume(volumeL)} with soft and large-polyp corals, all else assumed. Check
          the light against a setup to see it over yours.
        </p>
      )}
    </>
  )
}

/** What a piece does as far as it can be told without a setup. */
export function JudgedDrawings({ piece, printer }: JudgedDrawingsProps) {
  if (piece.kind === 'light') return <LightDrawings piece={piece} printer={printer} />
  const curve = piece.kind === 'return-pump' ? drawPumpCurve(piece) : null
  return curve && <PumpCurve drawing={curve} printer={printer} />
}
