import { ChartFrame } from '@/components/charts/ChartFrame'
import { seasonPicture } from '@/components/charts/geometry/season'
import { SeasonChart } from '@/components/charts/SeasonChart'
import { seasonMoons } from '@/components/charts/seasonMoons'
import { SectionHeading } from '@/components/ui/SectionHeading'
import type { SiteRecord } from '@/lib/domain/facility/types'
import { formatHours, formatNumber, formatOffset } from '@/lib/format'
import { TRUE_MINUS } from '@/lib/format/glyphs'
import type { Season } from '@/lib/domain/calls/types'

interface CallSeasonProps {
  site: SiteRecord
  season: Season
  from: string
  fileName: string
}

const degrees = (value: number, positive: string, negative: string) =>
  `${formatNumber(Math.abs(value), 1)}° ${value < 0 ? negative : positive}`

/** Every night of a season: twilight and Moon, drawn from the real sky at the site. */
export function CallSeason({ site, season, from, fileName }: CallSeasonProps) {
  const { grid, phases, darkHours } = season
  const picture = seasonPicture(grid)
  const nights = grid.nights
  const place = `${degrees(site.latitudeDeg, 'N', 'S')}, ${degrees(site.longitudeDeg, 'E', 'W')}, ${formatNumber(site.elevationM, 0)} m`
  return (
    <section>
      <SectionHeading
        title={`The ${nights.length} nights on offer`}
        aside={`Computed for ${place}. Left: hour at the site (${formatOffset(site.utcOffsetHours)}). Right: UTC.`}
      />
      <ChartFrame
        fileName={fileName}
        note={`Pale columns: hours with the Moon up, paler as it fills. ${formatHours(darkHours)} of astronomical night in all.`}
        numbers={{
          caption: 'Dark hours and Moon of each night',
          columns: [
            { head: 'Evening' },
            { head: 'Dark', unit: 'h', decimals: 2 },
            { head: 'Moon lit', unit: '%', decimals: 0 },
          ],
          rows: nights.map(({ night }) => [night.date, night.darkHours, night.moonIllumination * 100]),
        }}
      >
        <SeasonChart
          label={`${nights.length} nights at ${site.name}: ${formatHours(darkHours)} of astronomical night`.replace(
            '-',
            TRUE_MINUS,
          )}
          picture={picture}
          moons={seasonMoons(phases, from, nights.length, site.utcOffsetHours)}
        />
      </ChartFrame>
    </section>
  )
}
