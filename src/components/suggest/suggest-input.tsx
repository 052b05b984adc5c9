import { lazy, Suspense, useState, type ComponentProps } from 'react'
import type { SuggestScope } from './find-suggestions'

const Suggestions = lazy(() => import('./suggestions'))

export interface SuggestInputProps extends ComponentProps<'input'> {
  readonly scope: SuggestScope
}

/** A text field of a plain form. What it suggests is fetched when somebody first turns to it. */
export function SuggestInput({ scope, ...input }: SuggestInputProps) {
  const [field, setField] = useState<HTMLInputElement | null>(null)
  const [isAwake, setIsAwake] = useState(false)
  return (
    <div className="relative min-w-0 flex-[1_1_16rem]">
      <input
        {...input}
        ref={setField}
        type="text"
        autoComplete="off"
        spellCheck={false}
        onFocus={() => setIsAwake(true)}
      />
      {isAwake && field && (
        <Suspense fallback={null}>
          <Suggestions field={field} scope={scope} />
        </Suspense>
      )}
    </div>
  )
}
