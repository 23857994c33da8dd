import { bandColour } from '@/components/charts/geometry/bandColour'
import type { NightBandGeometry } from '@/components/charts/geometry/nightBand'
import { BandMark } from './BandMark'
import { BandNow } from './BandNow'

export interface BandPictureProps {
  id: string
  geometry: NightBandGeometry
  /** Now, where the lamp moves with it. */
  serverNowMs?: number
  /** A moment that stands still, in place of now. */
  markMs?: number
  height?: number
}

const percent = (share: number) => `${(share * 100).toFixed(2)}%`

/** The night as a strip: twilight, the Moon while it is up, the hours, the lamp at now. As wide as what holds it. */
export function BandPicture({ id, geometry, serverNowMs, markMs, height = 28 }: BandPictureProps) {
  const { fromMs, toMs, stops, moonBars, moonThickness, ticks } = geometry
  const thickness = (moonThickness * height) / 28
  return (
    <svg width="100%" height={height} className="block" aria-hidden="true" focusable="false">
      <defs>
        <linearGradient id={id}>
          {stops.map((stop) => (
            <stop key={stop.share} offset={percent(stop.share)} stopColor={bandColour(stop.sunAltitudeDeg)} />
          ))}
        </linearGradient>
      </defs>
      <rect width="100%" height={height} fill={`url(#${id})`} />
      {moonBars.map(({ from, to }) => (
        <rect
          key={from}
          x={percent(from)}
          y={(6 * height) / 28 - thickness / 2}
          width={percent(to - from)}
          height={thickness}
          rx="1"
          fill="var(--moon)"
        />
      ))}
      {serverNowMs === undefined ? null : (
        <BandNow fromMs={fromMs} toMs={toMs} serverNowMs={serverNowMs} height={height} ticks={ticks} />
      )}
      {markMs === undefined ? null : <BandMark share={(markMs - fromMs) / (toMs - fromMs)} height={height} />}
    </svg>
  )
}
