import { useMemo } from 'react'
import { drawLight } from '#shared/engine/drawings/light'
import { drawPump } from '#shared/engine/drawings/pump'
import { drawSpectrum } from '#shared/engine/drawings/spectrum'
import { drawStand } from '#shared/engine/drawings/stand'
import type { Answer, Piece } from '#shared/engine/types'
import { ChamberDetail } from '../../../components/drawings/chamber-detail'
import { LightPlan } from '../../../components/drawings/light-plan'
import { PumpCurve } from '../../../components/drawings/pump-curve'
import { drawRecordedTank } from '../../../components/drawings/recorded-tank'
import { SpectrumBands } from '../../../components/drawings/spectrum-bands'
import { StandViews } from '../../../components/drawings/stand-views'
import { TankPlan } from '../../../components/drawings/tank-plan'
import { TankSection } from '../../../components/drawings/tank-section'
import type { Finder } from '../hooks/use-finder'
import { toDrawing, toRod } from '../model/to-drawing'

export interface AnswerDrawingProps {
  readonly answer: Answer
  readonly finder: Finder
}

const toPiece = ({ kind, specs }: Answer): Piece => ({ kind, specs })
const countPieces = ({ pieces }: Answer) => pieces[0]?.quantity ?? 1

function HeaterDrawing({ answer, finder }: AnswerDrawingProps) {
  const { plan, given, printer } = finder
  const rod = toRod(answer, plan)
  const { chambers } = toDrawing(plan, given, rod)
  const at = chambers.findIndex(({ id }) => id === rod?.chamber)
  const chamber = chambers[at]
  return rod && chamber ? <ChamberDetail chamber={chamber} at={at} given={given} printer={printer} rod={rod} /> : null
}

function LightDrawing({ answer, finder }: AnswerDrawingProps) {
  const { setup } = finder.plan
  const light = useMemo(() => drawLight(setup, toPiece(answer), { quantity: countPieces(answer) }), [setup, answer])
  const spectrum = drawSpectrum(toPiece(answer))
  return (
    <div className="grid items-start gap-3 sm:grid-cols-2">
      {light && <LightPlan drawing={light} printer={finder.printer} />}
      {spectrum && <SpectrumBands drawing={spectrum} printer={finder.printer} />}
    </div>
  )
}

function PumpDrawing({ answer, finder }: AnswerDrawingProps) {
  const drawing = drawPump(finder.plan.setup, toPiece(answer), { quantity: countPieces(answer) })
  return drawing && <PumpCurve drawing={drawing} printer={finder.printer} />
}

function StandDrawing({ answer, finder }: AnswerDrawingProps) {
  const standing = drawStand(finder.plan.setup, toPiece(answer))
  return standing && <StandViews standing={standing} printer={finder.printer} />
}

function TankDrawing({ answer, finder }: AnswerDrawingProps) {
  const drawing = drawRecordedTank(answer.specs)
  return (
    drawing && (
      <div className="grid gap-3 sm:grid-cols-2">
        <TankPlan drawing={drawing} printer={finder.printer} />
        <TankSection drawing={drawing} printer={finder.printer} />
      </div>
    )
  )
}

/** What the piece would do in this setup, drawn from the very numbers that its checks judge. */
export function AnswerDrawing(props: AnswerDrawingProps) {
  switch (props.answer.kind) {
    case 'heater':
      return <HeaterDrawing {...props} />
    case 'light':
      return <LightDrawing {...props} />
    case 'return-pump':
      return <PumpDrawing {...props} />
    case 'stand':
      return <StandDrawing {...props} />
    case 'tank':
      return <TankDrawing {...props} />
    default:
      return null
  }
}
