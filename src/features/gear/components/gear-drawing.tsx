import { lazy, Suspense, useMemo } from 'react'
import type { Piece, Specs } from '#shared/engine/types'
import { isKindKey } from '#shared/kinds/index'
import type { Gear } from '#shared/schemas/gear'
import type { Printer } from '#shared/units/print'
import { drawRecordedTank } from '../../../components/drawings/recorded-tank'
import { StandPlan } from '../../../components/drawings/stand-plan'
import { TankPlan } from '../../../components/drawings/tank-plan'
import { TankSection } from '../../../components/drawings/tank-section'
import { findSizes } from '../find-sizes'
import { PieceDrawing } from './piece-drawing'

// The model behind them is not for every piece's page.
const JudgedDrawings = lazy(() => import('./judged-drawings').then((module) => ({ default: module.JudgedDrawings })))

const toSpecs = (bare: Gear['specs']): Specs =>
  Object.fromEntries(Object.entries(bare).map(([key, value]) => [key, { value, source: 'maker' as const }]))

function TankDrawings({ specs, printer }: { readonly specs: Specs; readonly printer: Printer }) {
  const drawing = useMemo(() => drawRecordedTank(specs), [specs])
  if (!drawing) return null
  return (
    <div className="grid gap-3 sm:grid-cols-2">
      <TankPlan drawing={drawing} printer={printer} />
      <TankSection drawing={drawing} printer={printer} />
    </div>
  )
}

/** Of a stand whose height nobody recorded. */
function StandTop({ specs, printer }: { readonly specs: Specs; readonly printer: Printer }) {
  const lengthMm = specs.topLengthMm?.value
  const widthMm = specs.topWidthMm?.value
  if (typeof lengthMm !== 'number' || typeof widthMm !== 'number') return null
  return <StandPlan top={{ lengthMm, widthMm }} printer={printer} />
}

/** The piece to scale and at work, where enough of its numbers is recorded. */
export function GearDrawing({ gear, printer }: { readonly gear: Gear; readonly printer: Printer }) {
  const piece = useMemo<Piece | null>(
    () => (isKindKey(gear.kind) ? { kind: gear.kind, specs: toSpecs(gear.specs) } : null),
    [gear],
  )
  if (piece?.kind === 'tank') return <TankDrawings specs={piece.specs} printer={printer} />
  const sizes = findSizes(gear.specs)
  if (piece?.kind === 'stand' && !sizes) return <StandTop specs={piece.specs} printer={printer} />
  return (
    <div className="space-y-3">
      {sizes && <PieceDrawing name={`${gear.brand} ${gear.model}`} sizes={sizes} printer={printer} />}
      {piece && (piece.kind === 'light' || piece.kind === 'return-pump') && (
        <Suspense fallback={<div aria-hidden="true" className="h-80 border border-rule bg-sheet" />}>
          <JudgedDrawings piece={piece} printer={printer} />
        </Suspense>
      )}
    </div>
  )
}
