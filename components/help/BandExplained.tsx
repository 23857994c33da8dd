import { BandPicture } from '@/components/layout/BandPicture'
import { nightBandGeometry } from '@/components/charts/geometry/nightBand'
import { nightInWords } from '@/components/layout/nightInWords'
import { formatUtcMinute } from '@/lib/format'
import { eveningDateAt, nightAt, sunAltitudeDeg, type Site } from '@/lib/science/sky'

export interface BandExplainedProps {
  site: Site
  now: Date
  utcOffsetHours: number
}

/** Tonight's band, larger, with its parts named. */
export function BandExplained({ site, now, utcOffsetHours }: BandExplainedProps) {
  const night = nightAt(site, eveningDateAt(site, now))
  const geometry = nightBandGeometry(night, utcOffsetHours, (at) => sunAltitudeDeg(site, at))
  return (
    <div>
      <BandPicture id="band-explained" geometry={geometry} serverNowMs={now.getTime()} height={72} />
      <div className="mt-1 flex justify-between text-tick text-muted">
        <span>{night.sunset ? `sunset ${formatUtcMinute(night.sunset)} UTC` : ''}</span>
        <span>{night.sunrise ? `sunrise ${formatUtcMinute(night.sunrise)} UTC` : ''}</span>
      </div>
      <p className="mt-3 max-w-prose text-table">{nightInWords(night)}</p>
      <p className="mt-2 max-w-prose text-table text-muted">
        The strip on top of every page is this night, drawn to scale: the sky from sunset to sunrise, the
        colour of twilight from the height of the Sun. The pale bar is the Moon while it is up, thicker as it
        fills. Ticks are hours of UTC. The lit line is now; by day there is none.
      </p>
    </div>
  )
}
