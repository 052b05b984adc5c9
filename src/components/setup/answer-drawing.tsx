import { useMemo } from 'react'
import { drawLight } from '#shared/engine/drawings/light'
import { drawPump } from '#shared/engine/drawings/pump'
import { drawSpectrum } from '#shared/engine/drawings/spectrum'
import { drawStand } from '#shared/engine/drawings/stand'
import type { Plan } from '#shared/engine/setup/plan'
import type { Answer, Piece } from '#shared/engine/types'
import type { Printer } from '#shared/units/print'
import { ChamberDetail } from '../drawings/chamber-detail'
import { LightPlan } from '../drawings/light-plan'
import { PumpCurve } from '../drawings/pump-curve'
import { drawRecordedTank } from '../drawings/recorded-tank'
import { SpectrumBands } from '../drawings/spectrum-bands'
import { StandViews } from '../drawings/stand-views'
import { TankPlan } from '../drawings/tank-plan'
import { TankSection } from '../drawings/tank-section'
import { toDrawing, toRod } from './to-drawing'

export interface AnswerDrawingProps {
  readonly answer: Answer
  readonly plan: Plan
  /** Setup paths that the person gave. */
  readonly given: ReadonlySet<string>
  readonly printer: Printer
}

const toPiece = ({ kind, specs }: Answer): Piece => ({ kind, specs })
const countPieces = ({ pieces }: Answer) => pieces[0]?.quantity ?? 1

function HeaterDrawing({ answer, plan, given, printer }: AnswerDrawingProps) {
  const rod = toRod(answer, plan)
  const { chambers } = toDrawing(plan, given, rod)
  const at = chambers.findIndex(({ id }) => id === rod?.chamber)
  const chamber = chambers[at]
  return rod && chamber ? <ChamberDetail chamber={chamber} at={at} given={given} printer={printer} rod={rod} /> : null
}

function LightDrawing({ answer, plan, printer }: AnswerDrawingProps) {
  const { setup } = plan
  const light = useMemo(() => drawLight(setup, toPiece(answer), { quantity: countPieces(answer) }), [setup, answer])
  const spectrum = drawSpectrum(toPiece(answer))
  return (
    <div className="grid items-start gap-3 sm:grid-cols-2">
      {light && <LightPlan drawing={light} printer={printer} />}
      {spectrum && <SpectrumBands drawing={spectrum} printer={printer} />}
    </div>
  )
}

function PumpDrawing({ answer, plan, printer }: AnswerDrawingProps) {
  const drawing = drawPump(plan.setup, toPiece(answer), { quantity: countPieces(answer) })
  return drawing && <PumpCurve drawing={drawing} printer={printer} />
}

function StandDrawing({ answer, plan, printer }: AnswerDrawingProps) {
  const standing = drawStand(plan.setup, toPiece(answer))
  return standing && <StandViews standing={standing} printer={printer} />
}

function TankDrawing({ answer, printer }: AnswerDrawingProps) {
  const drawing = drawRecordedTank(answer.specs)
  return (
    drawing && (
      <div className="grid gap-3 sm:grid-cols-2">
        <TankPlan drawing={drawing} printer={printer} />
        <TankSection drawing={drawing} printer={printer} />
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
