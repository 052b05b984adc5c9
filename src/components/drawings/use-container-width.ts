import { useLayoutEffect, useRef, useState, type RefObject } from 'react'

/** The width of an element in whole pixels: the default on the server and until it is measured. */
export function useContainerWidth<T extends Element>(defaultPx: number): readonly [RefObject<T | null>, number] {
  const ref = useRef<T>(null)
  const [widthPx, setWidthPx] = useState(defaultPx)
  useLayoutEffect(() => {
    const element = ref.current
    if (!element) return
    const observer = new ResizeObserver(([entry]) => {
      const measured = Math.floor(entry?.contentRect.width ?? 0)
      if (measured > 0) setWidthPx(measured)
    })
    observer.observe(element)
    return () => observer.disconnect()
  }, [])
  return [ref, widthPx]
}
