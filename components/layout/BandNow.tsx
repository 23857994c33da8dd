'use client'

import { useServerNow } from '@/components/ui/useServerNow'
import type { BandTick } from '@/components/charts/geometry/nightBand'

export interface BandNowProps {
  fromMs: number
  toMs: number
  serverNowMs: number
  height: number
  ticks: readonly BandTick[]
}

/** On the narrowest band 26 px are this share of the night: nearer than that, an hour's name would touch the lamp. */
const nearNow = 0.045

/** Hours and the lamp at now, inside the band's svg; by day there is no lamp. */
export function BandNow({ fromMs, toMs, serverNowMs, height, ticks }: BandNowProps) {
  const now = useServerNow(serverNowMs)
  const share = (now - fromMs) / (toMs - fromMs)
  const isNight = share >= 0 && share <= 1
  const x = `${(share * 100).toFixed(3)}%`
  return (
    <>
      {ticks.map((tick) => (
        <g key={tick.share}>
          <rect
            x={`${tick.share * 100}%`}
            y={height - 5}
            width="1"
            height="5"
            fill="var(--night-text)"
            opacity="0.7"
          />
          {tick.name && !(isNight && Math.abs(tick.share - share) < nearNow) ? (
            <text x={`${tick.share * 100}%`} dx="4" y={height - 5} fontSize="11" fill="var(--night-text)">
              {tick.name}
            </text>
          ) : null}
        </g>
      ))}
      {isNight ? (
        <g data-testid="band-now">
          <line x1={x} x2={x} y1="0" y2={height} stroke="var(--now)" strokeWidth="2" />
          <circle cx={x} cy={height / 2} r="3.5" fill="var(--now)" />
        </g>
      ) : null}
    </>
  )
}
