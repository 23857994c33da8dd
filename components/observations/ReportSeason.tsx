import { ChartFrame } from '@/components/charts/ChartFrame'
import { seasonPicture } from '@/components/charts/geometry/season'
import { SeasonChart } from '@/components/charts/SeasonChart'
import { seasonMoons } from '@/components/charts/seasonMoons'
import type { SeasonNote } from '@/components/charts/seasonTypes'
import { SectionHeading } from '@/components/ui/SectionHeading'
import type { SeasonView } from '@/lib/domain/observations/rules'
import { pointingOf } from '@/lib/domain/facility/rules'
import type { SiteRecord, TelescopePointing } from '@/lib/domain/facility/types'
import { formatCalendarDate, formatHours, formatOffset } from '@/lib/format'
import { limitWords } from '@/lib/science/feasibility'

export interface ReportSeasonProps {
  title: string
  name: string
  site: SiteRecord
  view: SeasonView
  maxAirmass: number
  /** Whose horizon and blind spot count besides the site's. */
  telescope?: TelescopePointing | undefined
  /** Why it is never up, where it is not. */
  never?: string | null
  fileName: string
}

/** Words on the chart: the best night, in the middle of its window. */
function notesOf(view: SeasonView): SeasonNote[] {
  if (!view.best) return []
  const { night, hours } = view.best
  const [from, to] = view.windows[night]?.[0] ?? [24, 30]
  const date = view.grid.nights[night]?.night.date ?? ''
  const count = view.grid.nights.length
  return [
    {
      night,
      hour: (from + to) / 2,
      words: `best night, ${formatCalendarDate(date, false)}: ${formatHours(hours)}`,
      tone: 'night',
      align: night > count * 0.7 ? 'right' : night < count * 0.3 ? 'left' : 'centre',
    },
  ]
}

/** When a target is up: every night of the season, its twilight, its Moon and the target's window. */
export function ReportSeason(props: ReportSeasonProps) {
  const { title, name, site, view, maxAirmass, telescope, never, fileName } = props
  const { grid, phases } = view
  const first = grid.nights[0]?.night.date ?? ''
  const up = view.byNight.filter((hours) => hours > 0).length
  const limits = limitWords(pointingOf(site, telescope))
  const counted = `${name} is up in the dark above airmass ${maxAirmass}${limits && `${limits},`} for ${formatHours(view.totalHours)} on ${up} of ${grid.nights.length} nights.`
  const label = never ?? counted
  return (
    <section>
      <SectionHeading
        title={title}
        aside={`Left: hour at the site (${formatOffset(site.utcOffsetHours)}). Right: UTC.`}
      />
      <ChartFrame
        fileName={fileName}
        note={label}
        numbers={{
          caption: `Hours of ${name} night by night`,
          columns: [
            { head: 'Evening' },
            { head: 'Up in the dark', unit: 'h', decimals: 2 },
            { head: 'Dark', unit: 'h', decimals: 2 },
            { head: 'Moon lit', unit: '%', decimals: 0 },
          ],
          rows: grid.nights.map(({ night }, index) => [
            night.date,
            view.byNight[index] ?? 0,
            night.darkHours,
            night.moonIllumination * 100,
          ]),
        }}
      >
        <SeasonChart
          label={label}
          picture={seasonPicture(grid)}
          moons={seasonMoons(phases, first, grid.nights.length, site.utcOffsetHours)}
          target={{ windows: view.windows, transits: view.transits }}
          notes={notesOf(view)}
          monthValues={view.byMonth.map(({ hours }) => formatHours(hours))}
        />
      </ChartFrame>
    </section>
  )
}
