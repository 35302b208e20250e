import { useLayoutEffect, useRef, useState } from 'react'

/** Width in pixels of the element that carries the reference; drawings are made for it, not scaled to it. */
export function useWidth<E extends Element>(first: number) {
  const element = useRef<E>(null)
  const [width, setWidth] = useState(first)
  useLayoutEffect(() => {
    if (!element.current) return undefined
    const observer = new ResizeObserver(([entry]) => {
      if (entry) setWidth(Math.max(240, Math.floor(entry.contentRect.width)))
    })
    observer.observe(element.current)
    return () => observer.disconnect()
  }, [])
  return [element, width] as const
}
