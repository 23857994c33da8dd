import { ChartFrame } from '@/components/charts/ChartFrame'
import { seasonPicture } from '@/components/charts/geometry/season'
import { SeasonChart } from '@/components/charts/SeasonChart'
import { seasonMoons } from '@/components/charts/seasonMoons'
import { formatCalendarDate, formatOffset } from '@/lib/format'
import { moonPhases, seasonGrid, type Site } from '@/lib/science/sky'

export interface SeasonExplainedProps {
  site: Site
  /** Evening dates, YYYY-MM-DD. */
  from: string
  to: string
  utcOffsetHours: number
}

/** The coming weeks at the site as a season chart, with what its columns mean. */
export function SeasonExplained({ site, from, to, utcOffsetHours }: SeasonExplainedProps) {
  const grid = seasonGrid(site, from, to, utcOffsetHours)
  const phases = moonPhases(new Date(`${from}T00:00:00Z`), new Date(`${to}T23:59:59Z`))
  const span = `${formatCalendarDate(from, from.slice(0, 4) !== to.slice(0, 4))} to ${formatCalendarDate(to)}`
  return (
    <ChartFrame
      note={`${span}. Left: hour at the site (${formatOffset(utcOffsetHours)}). Right: UTC.`}
      fileName="nights"
      numbers={{
        caption: `Nights from ${span}`,
        columns: [
          { head: 'Evening' },
          { head: 'Dark', unit: 'h', decimals: 1 },
          { head: 'Moon lit', unit: '%', decimals: 0 },
        ],
        rows: grid.nights.map(({ night }) => [night.date, night.darkHours, night.moonIllumination * 100]),
      }}
    >
      <SeasonChart
        label={`Nights from ${span}: twilight and Moon, one column a night.`}
        picture={seasonPicture(grid)}
        moons={seasonMoons(phases, from, grid.nights.length, utcOffsetHours)}
      />
      <p className="mt-4 max-w-prose text-table text-muted">
        One column a night, hours upwards from the evening to the morning. Pale bars are the Moon while it is
        up, paler as it fills. Where a target is shown, everything outside its window lies under a veil: what
        stays dark is what you can use.
      </p>
    </ChartFrame>
  )
}
