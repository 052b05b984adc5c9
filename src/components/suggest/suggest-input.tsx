import { lazy, Suspense, useCallback, useState, type ComponentProps } from 'react'
import type { SuggestScope } from './find-suggestions'

const Suggestions = lazy(() => import('./suggestions'))

export interface SuggestInputProps extends ComponentProps<'input'> {
  readonly scope: SuggestScope
}

/** A text field of a plain form. What it suggests is fetched when somebody first turns to it. */
export function SuggestInput({ scope, ...input }: SuggestInputProps) {
  const [field, setField] = useState<HTMLInputElement | null>(null)
  /** What it held when somebody turned to it. */
  const [before, setBefore] = useState<string | null>(null)
  const attach = useCallback((node: HTMLInputElement | null) => {
    setField(node)
    // Somebody may be in the field, typing, before this listens.
    if (node !== null && node === document.activeElement) setBefore(node.defaultValue)
  }, [])
  return (
    <div className="relative min-w-0 flex-[1_1_16rem]">
      <input
        {...input}
        ref={attach}
        type="text"
        autoComplete="off"
        spellCheck={false}
        onFocus={({ currentTarget }) => setBefore(currentTarget.value)}
      />
      {before !== null && field && (
        <Suspense fallback={null}>
          <Suggestions field={field} before={before} scope={scope} />
        </Suspense>
      )}
    </div>
  )
}
