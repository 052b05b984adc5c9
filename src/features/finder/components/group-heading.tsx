import type { Verdict } from '#shared/engine/types'
import { VerdictIcon } from '../../../components/ui/verdict-icon'
import { verdictTextClasses, verdictWords } from '../../../lib/verdicts'

export function GroupHeading({ verdict, count }: { readonly verdict: Verdict; readonly count: number | undefined }) {
  return (
    <h3 className={`flex items-center gap-2 font-heading text-lg font-bold ${verdictTextClasses[verdict]}`}>
      <VerdictIcon verdict={verdict} size={18} isDecorative />
      {verdictWords[verdict]}
      {count !== undefined && <span className="font-mono text-base font-normal text-ink-soft">{count}</span>}
    </h3>
  )
}
