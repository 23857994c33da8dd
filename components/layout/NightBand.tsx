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

/** Characters of words and date that leave room for days, hours and minutes. */
const longestWithMinutes = 36

/** Tonight at the observatory, across the top of every page: deadline, night, clocks. */
export function NightBand({ site, now, utcOffsetHours, next, href }: NightBandProps) {
  const night = nightAt(site, eveningDateAt(site, now))
  const geometry = nightBandGeometry(night, utcOffsetHours, (at) => sunAltitudeDeg(site, at))
  const serverNowMs = now.getTime()
  const date = next ? (next.dayOnly ? formatDay(next.at) : formatUtc(next.at)) : ''
  // The text has 320 px: where the date is long, the minutes left give way to it.
  const parts = next?.dayOnly ? 1 : (next?.words.length ?? 0) + date.length > longestWithMinutes ? 2 : 3
  return (
    <section aria-label="Tonight and the next date" className="night-band" data-no-print>
      <div className="night-band-next">
        {next ? (
          <>
            {next.words}{' '}
            <strong className="font-semibold text-lamp">
              <span className="max-lg:hidden">
                <Countdown untilMs={next.at.getTime()} serverNowMs={serverNowMs} parts={parts} />
              </span>
              <span className="lg:hidden">
                <Countdown untilMs={next.at.getTime()} serverNowMs={serverNowMs} parts={Math.min(2, parts)} />
              </span>
            </strong>{' '}
            <span className="text-muted max-lg:hidden">· {date}</span>
          </>
        ) : null}
      </div>
      <Link href={href} aria-label={nightInWords(night)} className="night-band-sky">
        <BandPicture id="night-band" geometry={geometry} serverNowMs={serverNowMs} />
      </Link>
      <div className="night-band-clock">
        <BandClock serverNowMs={serverNowMs} utcOffsetHours={utcOffsetHours} />
      </div>
    </section>
  )
}
