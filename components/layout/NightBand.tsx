import Link from 'next/link'
import { nightBandGeometry } from '@/components/charts/geometry/nightBand'
import { Countdown } from '@/components/ui/Countdown'
import { formatDay, formatUtc } from '@/lib/format'
import { eveningDateAt, nightAt, sunAltitudeDeg, type Site } from '@/lib/science/sky'
import { BandClock } from './BandClock'
import { BandPicture } from './BandPicture'
import { nightInWords } from './nightInWords'

export interface NextDeadline {
  /** `Call 14 closes in`. */
  words: string
  at: Date
  /** True where only the day matters: `27 May`. */
  dayOnly?: boolean
}

export interface NightBandProps {
  site: Site
  /** The server's now. */
  now: Date
  utcOffsetHours: number
  next: NextDeadline | null
  /** Where the band leads: the season at the site. */
  href: string
}

/** Tonight at the observatory, across the top of every page: deadline, night, clocks. */
export function NightBand({ site, now, utcOffsetHours, next, href }: NightBandProps) {
  const night = nightAt(site, eveningDateAt(site, now))
  const geometry = nightBandGeometry(night, utcOffsetHours, (at) => sunAltitudeDeg(site, at))
  const serverNowMs = now.getTime()
  return (
    <div className="night-band" data-no-print>
      <div className="night-band-next">
        {next ? (
          <>
            {next.words}{' '}
            <strong className="font-semibold text-lamp">
              <span className="max-lg:hidden">
                <Countdown
                  untilMs={next.at.getTime()}
                  serverNowMs={serverNowMs}
                  parts={next.dayOnly ? 1 : 3}
                />
              </span>
              <span className="lg:hidden">
                <Countdown
                  untilMs={next.at.getTime()}
                  serverNowMs={serverNowMs}
                  parts={next.dayOnly ? 1 : 2}
                />
              </span>
            </strong>
            <span className="text-muted max-lg:hidden">
              {' '}
              · {next.dayOnly ? formatDay(next.at) : formatUtc(next.at)}
            </span>
          </>
        ) : null}
      </div>
      <Link href={href} aria-label={nightInWords(night)} className="night-band-sky">
        <BandPicture id="night-band" geometry={geometry} serverNowMs={serverNowMs} />
      </Link>
      <div className="night-band-clock">
        <BandClock serverNowMs={serverNowMs} utcOffsetHours={utcOffsetHours} />
      </div>
    </div>
  )
}
