import type { StandDrawing } from '#shared/engine/drawings/stand'
import type { Printer } from '#shared/units/print'
import { summariseStand } from './describe-stand'
import { StandFront } from './stand-front'
import { StandPlan } from './stand-plan'

export interface StandViewsProps {
  readonly standing: StandDrawing
  readonly printer: Printer
}

/** The tank on its stand from above and from the front, to one scale. */
export function StandViews({ standing, printer }: StandViewsProps) {
  return (
    <div>
      <div className="grid gap-3 sm:grid-cols-2">
        <StandPlan top={standing.top} standing={standing} printer={printer} />
        <StandFront standing={standing} printer={printer} />
      </div>
      <p className="mt-2 text-sm text-ink-soft">{summariseStand(standing, printer)}</p>
    </div>
  )
}
