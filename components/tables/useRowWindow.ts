'use client'

import { useEffect, useRef, useState } from 'react'

export interface RowWindow {
  /** The rows to render: from the first, up to but not including the last. */
  from: number
  to: number
  /** Room that the rows left out take above and below, px. */
  above: number
  below: number
}

/** Rows rendered beyond the frame's edge, so that scrolling never shows a gap. */
const SPARE = 12
/** Below this many rows all of them stand on the page. */
const LONG = 120

/**
 * Which rows of a long table to render, by how far its frame is scrolled. Null for a table short enough to stand
 * whole. Rows must be of one height.
 */
export function useRowWindow(count: number, rowHeight: number | undefined) {
  const frame = useRef<HTMLDivElement>(null)
  const long = rowHeight !== undefined && count > LONG
  const [place, setPlace] = useState({ top: 0, height: 640 })

  useEffect(() => {
    const box = frame.current
    if (!box || !long) return
    const look = () => setPlace({ top: box.scrollTop, height: box.clientHeight })
    look()
    box.addEventListener('scroll', look, { passive: true })
    return () => box.removeEventListener('scroll', look)
  }, [long])

  if (!long) return { frame, view: null }
  // In steps of a few rows: most scroll events then change nothing.
  const first = Math.floor(place.top / rowHeight / 4) * 4
  const from = Math.max(0, Math.min(first, count) - SPARE)
  const to = Math.min(count, first + Math.ceil(place.height / rowHeight) + SPARE)
  const view: RowWindow = { from, to, above: from * rowHeight, below: (count - to) * rowHeight }
  return { frame, view }
}
