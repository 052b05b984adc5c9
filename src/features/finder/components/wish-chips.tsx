import { describeFilter } from '../../../lib/describe-filter'
import { LetGoLink } from '../../../components/ui/let-go-link'
import type { Finder } from '../hooks/use-finder'

/** What the piece itself should be: only such pieces are answered with. */
export function WishChips({ finder }: { readonly finder: Finder }) {
  const { state, printer, hrefOf } = finder
  const wishes = Object.entries(state.wishes)
  if (wishes.length === 0) return null
  return (
    <ul aria-label="Only those with" className="mt-3 flex flex-wrap items-center gap-x-3 gap-y-2 text-sm">
      <li aria-hidden="true" className="text-ink-soft">
        Only those with
      </li>
      {wishes.map(([key, text]) => {
        const { [key]: _, ...rest } = state.wishes
        return (
          <li key={key} className="max-w-full">
            <LetGoLink to={hrefOf({ wishes: rest })}>{describeFilter(state.kind, key, text, printer)}</LetGoLink>
          </li>
        )
      })}
    </ul>
  )
}
