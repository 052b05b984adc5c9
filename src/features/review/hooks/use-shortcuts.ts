import { useEffect, useEffectEvent } from 'react'

export interface Shortcut {
  readonly key: string
  /** What it does: "next proposal". */
  readonly label: string
  readonly run: () => void
}

const typingTypes = new Set(['text', 'search', 'email', 'password', 'url', 'number', 'date'])

/** Whether a letter belongs to what is being typed, rather than to the page. */
function isTyping(target: EventTarget | null): boolean {
  if (!(target instanceof HTMLElement)) return false
  if (target.isContentEditable || target instanceof HTMLTextAreaElement || target instanceof HTMLSelectElement)
    return true
  return target instanceof HTMLInputElement && typingTypes.has(target.type)
}

/** Single keys of a page, off while somebody types or a dialog stands over it, and where they were turned off. */
export function useShortcuts(shortcuts: readonly Shortcut[], isOn: boolean): void {
  const press = useEffectEvent((event: KeyboardEvent) => {
    if (event.ctrlKey || event.metaKey || event.altKey || event.defaultPrevented) return
    if (isTyping(event.target) || document.querySelector('dialog[open]')) return
    const shortcut = shortcuts.find(({ key }) => key === event.key)
    if (!shortcut) return
    event.preventDefault()
    shortcut.run()
  })
  useEffect(() => {
    if (!isOn) return
    document.addEventListener('keydown', press)
    return () => document.removeEventListener('keydown', press)
  }, [isOn])
}
