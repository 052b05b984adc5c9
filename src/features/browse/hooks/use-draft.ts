import { useState } from 'react'
import { NavigationType, useLocation, useNavigationType } from 'react-router-dom'

export interface TypingState {
  readonly isTyping: true
}

/** Whether this address came of what is being typed: then the fields are ahead of it and must not be set back. */
function useIsTyping(): boolean {
  const { state } = useLocation() as { readonly state: Partial<TypingState> | null }
  // Reached again by Back, the same address is not being typed any more.
  return useNavigationType() === NavigationType.Replace && state?.isTyping === true
}

/** What a field holds: follows the address, except while it leads. */
export function useDraft<T>(value: T): readonly [T, (draft: T) => void] {
  const isTyping = useIsTyping()
  const [draft, setDraft] = useState(value)
  const [seen, setSeen] = useState(value)
  if (!Object.is(value, seen)) {
    setSeen(value)
    if (!isTyping) setDraft(value)
  }
  return [draft, setDraft]
}
