import { nightBandGeometry } from '@/components/charts/geometry/nightBand'
import { BandPicture } from '@/components/layout/BandPicture'
import { formatUtcClock, formatUtcMinute } from '@/lib/format'
import { eveningDateAt, nightAt, sunAltitudeDeg, type Site } from '@/lib/science/sky'

interface NightOfReceiptProps {
  site: Site & { utcOffsetHours: number }
  receivedAt: Date
}

/** The night a proposal was received in, from sunset to sunrise, with the second it arrived; by day the coming night. */
export function NightOfReceipt({ site, receivedAt }: NightOfReceiptProps) {
  const night = nightAt(site, eveningDateAt(site, receivedAt))
  const geometry = nightBandGeometry(night, site.utcOffsetHours, (at) => sunAltitudeDeg(site, at))
  const share = (receivedAt.getTime() - geometry.fromMs) / (geometry.toMs - geometry.fromMs)
  const isNight = share >= 0 && share <= 1
  const received = `received ${formatUtcClock(receivedAt)}`
  return (
    <figure className="m-0" aria-label={isNight ? `The night it was received in: ${received}` : received}>
      <BandPicture id="night-of-receipt" geometry={geometry} markMs={receivedAt.getTime()} height={72} />
      <figcaption className="relative mt-2 flex justify-between gap-4 text-caption text-muted">
        <span>{night.sunset ? `sunset ${formatUtcMinute(night.sunset)} UTC` : ''}</span>
        <span
          className={
            isNight ? 'font-semibold text-lamp sm:absolute sm:-translate-x-1/2' : 'font-semibold text-lamp'
          }
          style={isNight ? { left: `${Math.min(0.86, Math.max(0.2, share)) * 100}%` } : undefined}
        >
          {received}
        </span>
        <span>{night.sunrise ? `sunrise ${formatUtcMinute(night.sunrise)} UTC` : ''}</span>
      </figcaption>
    </figure>
  )
}
