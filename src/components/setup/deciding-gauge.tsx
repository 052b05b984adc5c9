import type { Check } from '#shared/engine/types'
import type { Printer } from '#shared/units/print'
import { Gauge } from '../drawings/gauge'
import { findScaleUnit } from '../drawings/scale-unit'
import { sayCloseCall } from './say-close-call'

/** The check that decides for a piece, named, on its small gauge; in words where it has no numbers. */
export function DecidingGauge({ check, printer }: { readonly check: Check; readonly printer: Printer }) {
  const { label, measured, limit, unit, margin, outcome } = check
  const note = sayCloseCall(check)
  if (typeof measured !== 'number' || limit === null)
    return (
      <p className="text-sm text-ink-soft">
        Decides: <span className="text-ink">{label.toLowerCase()}</span>
      </p>
    )
  return (
    <div>
      <Gauge
        size="small"
        label={label}
        unit={findScaleUnit(unit)}
        printer={printer}
        value={measured}
        limit={limit}
        margin={margin}
        outcome={outcome}
        note={note}
      />
      <p className="text-xs text-ink-soft">decides: {label.toLowerCase()}</p>
      {note !== undefined && <p className="text-xs font-semibold text-changes">{note}</p>}
    </div>
  )
}
