import type { FinderState } from '../link/finder-state'
import { listWishEntries, madeForKey } from '../link/wishes'

export interface HiddenFieldsProps {
  readonly state: FinderState
  /** Leaves out what the form asks for itself. */
  readonly without?: readonly ('kind' | 'asked' | 'wishes' | 'setup')[]
}

/** What a plain form must carry along so that nothing of the setup is lost. */
export function HiddenFields({ state, without = [] }: HiddenFieldsProps) {
  return (
    <>
      {!without.includes('kind') && <input type="hidden" name="kind" value={state.kind} />}
      {!without.includes('asked') && state.asked && <input type="hidden" name="asked" value={state.asked} />}
      {!without.includes('wishes') &&
        [...listWishEntries(state.wishes), [madeForKey, state.kind] as const].map(([key, text]) => (
          <input key={key} type="hidden" name={key} value={text} />
        ))}
      {!without.includes('setup') &&
        Object.entries(state.raw).map(([path, text]) => <input key={path} type="hidden" name={path} value={text} />)}
    </>
  )
}
