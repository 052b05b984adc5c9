import type { FlagWords } from '../model/find-flag-words'

export interface FlagListProps {
  readonly flags: readonly FlagWords[]
}

/** What looks unlikely about a value, and what its author says to that. It decides nothing by itself. */
export function FlagList({ flags }: FlagListProps) {
  if (flags.length === 0) return null
  return (
    <ul className="mt-3 space-y-2">
      {flags.map(({ flag, detail, suggestions }) => (
        <li key={`${flag.path} ${flag.rule}`} className="border-l-[5px] border-changes bg-paper px-3 py-2 text-sm">
          <strong className="font-semibold">Unlikely:</strong> {detail}
          {suggestions.length > 0 && <span className="block">Likelier: {suggestions.join(' or ')}.</span>}
          <span className="block">
            {flag.reason === null ? (
              'Its author did not say why it is right.'
            ) : (
              <>
                Its author says: <q>{flag.reason}</q>
              </>
            )}
          </span>
        </li>
      ))}
    </ul>
  )
}
