import { useMemo } from 'react'
import { drawHeat } from '#shared/engine/drawings/heat'
import { drawLedger } from '#shared/engine/drawings/ledger'
import { drawPacking } from '#shared/engine/drawings/packing'
import { HeatLine } from '../../../components/drawings/heat-line'
import { LedgerChart } from '../../../components/drawings/ledger-chart'
import { PackingViews } from '../../../components/drawings/packing-views'
import { TankPlan } from '../../../components/drawings/tank-plan'
import { TankSection } from '../../../components/drawings/tank-section'
import { toDrawing } from '../../../components/setup/to-drawing'
import type { SetupReport } from '../hooks/use-setup-report'

export interface SetupDrawingsProps {
  readonly shown: SetupReport
  readonly onEdit: (path: string, target: Element) => void
  readonly editHref: (path: string) => string
}

/** The tank, every measure of it to be pressed, and what stands in its chambers. */
export function TankDrawings({ shown, onEdit, editHref }: SetupDrawingsProps) {
  const { setup, report, plan, given, printer, nameOf } = shown
  const packing = useMemo(() => {
    const placements = new Map(report.items.flatMap(({ id, place }) => (place ? [[id, place] as const] : [])))
    return drawPacking(setup, placements)
  }, [setup, report])
  const shared = { drawing: toDrawing(plan, given, undefined), printer, onEdit, editHref }
  return (
    <>
      <div className="grid gap-3 sm:grid-cols-2">
        <TankPlan {...shared} />
        <TankSection {...shared} />
      </div>
      {packing.chambers.length > 0 && (
        <>
          <h3 className="mt-6 font-heading text-lg font-bold">What stands where</h3>
          <div className="mt-2 grid items-start gap-3 sm:grid-cols-2 lg:grid-cols-3">
            {packing.chambers.map((chamber) => (
              <PackingViews key={chamber.id} chamber={chamber} printer={printer} nameOf={nameOf} />
            ))}
          </div>
        </>
      )}
    </>
  )
}

/** Heat over the year's extremes, and who takes which plug and how many watts. */
export function LoadDrawings({ shown }: { readonly shown: SetupReport }) {
  const { setup, printer, nameOf } = shown
  const heat = useMemo(() => drawHeat(setup), [setup])
  const ledger = useMemo(() => drawLedger(setup), [setup])
  return (
    <div className="grid items-start gap-6 lg:grid-cols-2">
      <div className="min-w-0">
        {heat && <HeatLine drawing={heat} printer={printer} />}
        {heat && (
          <p className="mt-2 text-sm text-ink-soft">
            With the room at {printer.temperature(heat.warmestC)} and no heater on, the water settles at{' '}
            {printer.temperature(heat.unheatedC)}.
            {heat.stuckOnC !== null &&
              ` Should the heaters never switch off then, it goes to ${printer.temperature(heat.stuckOnC)}: a second, independent cut-off is worth having.`}
          </p>
        )}
      </div>
      <LedgerChart ledger={ledger} printer={printer} nameOf={nameOf} />
    </div>
  )
}
