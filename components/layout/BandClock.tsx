'use client'

import { useServerNow } from '@/components/ui/useServerNow'
import { formatAtSite, formatUtcClock, formatUtcMinute } from '@/lib/format'

export interface BandClockProps {
  serverNowMs: number
  utcOffsetHours: number
}

/** UTC to the second and the site's clock; on narrow screens to the minute. */
export function BandClock({ serverNowMs, utcOffsetHours }: BandClockProps) {
  const now = new Date(useServerNow(serverNowMs))
  return (
    <>
      <span className="max-lg:hidden">
        <span className="font-semibold">{formatUtcClock(now)}</span>
        <span className="text-muted"> · {formatAtSite(now, utcOffsetHours)}</span>
      </span>
      <span className="lg:hidden">
        <span className="font-semibold">{formatUtcMinute(now)} UTC</span>
        <span className="text-muted"> {formatUtcMinute(now, utcOffsetHours)}</span>
      </span>
    </>
  )
}
