import type { Verdict } from '#shared/engine/types'
import { VerdictIcon } from '../../../components/ui/verdict-icon'
import { verdictTextClasses, verdictWords } from '../../../lib/verdicts'

const meanings: readonly (readonly [Verdict, string])[] = [
  ['fits', 'Every check passes and nothing else in the setup has to change.'],
  ['changes', 'It works once something else changes; each such knock-on is named.'],
  ['no', 'At least one check fails for certain, on its own numbers or whatever is assumed.'],
  ['unknown', 'A number that the verdict turns on is missing. It is named and asked for, never guessed.'],
]

export function VerdictTable() {
  return (
    <dl className="mt-3">
      {meanings.map(([verdict, meaning]) => (
        <div key={verdict} className="grid gap-x-8 border-t border-rule py-2 sm:grid-cols-[12rem_minmax(0,1fr)]">
          <dt className={`flex items-center gap-2 font-semibold ${verdictTextClasses[verdict]}`}>
            <VerdictIcon verdict={verdict} size={18} isDecorative />
            {verdictWords[verdict]}
          </dt>
          <dd className="max-w-prose">{meaning}</dd>
        </div>
      ))}
    </dl>
  )
}
