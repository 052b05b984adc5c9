import { useRef, type RefObject } from 'react'
import type { Shortcut } from './use-shortcuts'

/** Walks focus through the proposals of the queue; Enter opens, as it does on any link. */
export function useQueueKeys(): { readonly list: RefObject<HTMLDivElement | null>; readonly shortcuts: Shortcut[] } {
  const list = useRef<HTMLDivElement>(null)
  const step = (by: 1 | -1) => {
    const links = [...(list.current?.querySelectorAll<HTMLElement>('[data-queue-item]') ?? [])]
    const at = links.findIndex((link) => link === document.activeElement)
    const next = at < 0 ? (by > 0 ? 0 : links.length - 1) : Math.min(Math.max(at + by, 0), links.length - 1)
    links[next]?.focus()
    links[next]?.scrollIntoView?.({ block: 'nearest' })
  }
  const isInList = () => list.current?.contains(document.activeElement) === true
  // Arrows scroll the page, as everywhere, until somebody is among the proposals.
  const arrow = (by: 1 | -1) => (isInList() ? step(by) : window.scrollBy({ top: by * 60 }))
  return {
    list,
    shortcuts: [
      { key: 'j', label: 'next', run: () => step(1) },
      { key: 'k', label: 'previous', run: () => step(-1) },
      { key: 'ArrowDown', label: 'next', run: () => arrow(1) },
      { key: 'ArrowUp', label: 'previous', run: () => arrow(-1) },
    ],
  }
}
