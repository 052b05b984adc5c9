import type { Verdict } from '#shared/engine/types'
import { verdictTextClasses, verdictWords } from '../../lib/verdicts'
import { VerdictIcon } from './verdict-icon'

export interface VerdictBadgeProps {
  readonly verdict: Verdict
  /** Instead of the verdict's own words, for one check: "4 mm to spare". */
  readonly label?: string
}

export function VerdictBadge({ verdict, label }: VerdictBadgeProps) {
  return (
    <span className={`inline-flex items-center gap-1.5 text-sm font-semibold ${verdictTextClasses[verdict]}`}>
      <VerdictIcon verdict={verdict} size={16} isDecorative={!label} />
      {label ?? verdictWords[verdict]}
    </span>
  )
}
