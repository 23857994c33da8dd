'use client'

import { formatCountdown } from '@/lib/format'
import { useServerNow } from './useServerNow'

export interface CountdownProps {
  /** The deadline and the server's now, in milliseconds since 1970. */
  untilMs: number
  serverNowMs: number
  /** How many units, largest first: three on wide screens, two where room is scarce. */
  parts?: number
  /** What stands there once it has passed. */
  passed?: string
}

/** Time left by the server's clock; steps, never glides. */
export function Countdown({ untilMs, serverNowMs, parts = 3, passed = 'past' }: CountdownProps) {
  const now = useServerNow(serverNowMs)
  return <>{untilMs > now ? formatCountdown(untilMs - now, parts) : passed}</>
}
