import { Facts } from '@/components/ui/Facts'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { TextLink } from '@/components/ui/TextLink'
import type { HeldRecord } from '@/lib/domain/facility/heldRecord'
import type { SiteFacts } from '@/lib/domain/facility/types'
import {
  formatCalendarDate,
  formatNumber,
  formatOffset,
  formatPercent,
  formatQuantity,
  formatSigned,
} from '@/lib/format'
import { paths } from '@/lib/paths'
import { horizonInWords } from './horizonWords'
import { nextInWords, stampInWords } from './recordWords'

const byBand = (values: Record<string, number>, decimals: number) =>
  Object.entries(values)
    .map(([band, value]) => `${band}\u00a0${formatNumber(value, decimals)}`)
    .join(', ')

/** A site as it is computed with, the record that says so, and the way to change it. */
export function SiteOverview({ site }: { site: HeldRecord<SiteFacts> }) {
  const { facts } = site.now
  const { best10, median, worst90 } = facts.seeingArcsec
  return (
    <section className="mt-10">
      <SectionHeading
        title={site.name}
        aside={
          <>
            <span>{stampInWords(site.now, site.now.validFrom)}</span>
            {site.next ? <span>{nextInWords(site.next)}</span> : null}
            {site.retiredFrom ? <span>retires on {formatCalendarDate(site.retiredFrom)}</span> : null}
            <TextLink href={paths.facilityRecord('sites', site.slug)} aria-label={`Change ${site.name}`}>
              Change
            </TextLink>
          </>
        }
      />
      <div className="mt-4 grid gap-x-16 md:grid-cols-2">
        <Facts
          facts={[
            { term: 'Latitude, north positive', value: `${formatSigned(facts.latitudeDeg, 4)}°` },
            { term: 'Longitude, east positive', value: `${formatSigned(facts.longitudeDeg, 4)}°` },
            { term: 'Height', value: formatQuantity(facts.elevationM, 0, 'm') },
            { term: 'Clock at the site', value: formatOffset(facts.utcOffsetHours) },
            { term: 'Lowest altitude', value: `${formatNumber(facts.lowestAltitudeDeg, 0)}°` },
            { term: 'Horizon', value: horizonInWords(facts.horizon) },
          ]}
        />
        <Facts
          facts={[
            {
              term: 'Image quality at zenith, best tenth, median, poorest tenth',
              value: [best10, median, worst90].map((value) => `${formatNumber(value, 1)}″`).join(', '),
            },
            {
              term: 'Nights lost to weather, January to December',
              value: facts.weather
                ? facts.weather.lostByMonth.map((share) => formatPercent(share)).join(', ')
                : 'not on record',
            },
            { term: 'Extinction, mag an airmass', value: byBand(facts.extinctionMagPerAirmass, 2) },
            { term: 'Dark sky, AB mag arcsec⁻²', value: byBand(facts.darkSkyMagArcsec2, 1) },
          ]}
        />
      </div>
    </section>
  )
}
