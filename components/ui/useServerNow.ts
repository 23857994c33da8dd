'use client'

import { useEffect, useState } from 'react'

/**
 * How far the reader's clock is behind the server's, in milliseconds. A page may come from a cache, so a later
 * estimate only counts when it is ahead: a stale page can never set the clock back.
 */
let offsetMs = Number.NEGATIVE_INFINITY

/**
 * The server's time, stepping in the browser. The first render shows exactly what the server rendered.
 * `stepMs` is how often it steps: a second for a clock, more for a countdown in minutes.
 */
export function useServerNow(serverNowMs: number, stepMs = 1000): number {
  const [now, setNow] = useState(serverNowMs)

  useEffect(() => {
    offsetMs = Math.max(offsetMs, serverNowMs - Date.now())
    const read = () => setNow(Date.now() + offsetMs)
    read()
    const timer = setInterval(read, stepMs)
    return () => clearInterval(timer)
  }, [serverNowMs, stepMs])

  return now
}
