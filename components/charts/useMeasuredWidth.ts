'use client'

import { useEffect, useRef, useState } from 'react'

/** The width of an element as it stands on the screen; `initial` until that is known, as on the server. */
export function useMeasuredWidth<Kind extends Element>(initial: number, measured: boolean) {
  const element = useRef<Kind>(null)
  const [width, setWidth] = useState(initial)
  useEffect(() => {
    const box = element.current
    if (!box || !measured) return
    const observer = new ResizeObserver(([entry]) => {
      const wide = Math.round(entry?.contentRect.width ?? 0)
      if (wide > 0) setWidth(wide)
    })
    observer.observe(box)
    return () => observer.disconnect()
  }, [measured])
  return { element, width: measured ? width : initial }
}
