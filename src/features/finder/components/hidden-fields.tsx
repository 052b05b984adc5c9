import type { FinderState } from '../link/finder-state'

export interface HiddenFieldsProps {
  readonly state: FinderState
  /** Leaves out what the form asks for itself. */
  readonly without?: readonly ('kind' | 'asked' | 'setup')[]
}

/** What a plain form must carry along so that nothing of the setup is lost. */
export function HiddenFields({ state, without = [] }: HiddenFieldsProps) {
  return (
    <>
      {!without.includes('kind') && <input type="hidden" name="kind" value={state.kind} />}
      {!without.includes('asked') && state.asked && <input type="hidden" name="asked" value={state.asked} />}
      {!without.includes('setup') &&
        Object.entries(state.raw).map(([path, text]) => <input key={path} type="hidden" name={path} value={text} />)}
    </>
  )
}
