import { useCallback, useEffect, useState, useSyncExternalStore } from 'react'

/** What is typed in a field that somebody else renders. */
export function useFieldText(field: HTMLInputElement): string {
  const subscribe = useCallback(
    (listener: () => void) => {
      field.addEventListener('input', listener)
      return () => field.removeEventListener('input', listener)
    },
    [field],
  )
  const read = useCallback(() => field.value, [field])
  return useSyncExternalStore(subscribe, read, read)
}

/** The text once it has rested for a moment. */
export function useRested(text: string, restMs: number): string {
  const [rested, setRested] = useState(text)
  useEffect(() => {
    const timer = setTimeout(() => setRested(text), restMs)
    return () => clearTimeout(timer)
  }, [text, restMs])
  return rested
}
