import { formatCalendarDate } from '@/lib/format'
import { crossings } from './crossings'
import { nightStops, type NightStop } from './nightStops'

/** What a season chart is drawn from; `seasonGrid` of lib/science/sky has this shape. */
export interface SeasonInput {
  hours: readonly number[]
  utcOffsetHours: number
  nights: readonly {
    night: { date: string; moonIllumination: number; darkHours: number }
    moonUpHours: readonly (readonly [number, number])[]
    sunAltitudesDeg: readonly number[]
  }[]
}

export interface SeasonColumn {
  date: string
  darkHours: number
  stops: NightStop[]
  moon: { from: number; to: number; opacity: number }[]
}

export interface SeasonMonth {
  /** 0-based first night and count of nights. */
  first: number
  count: number
  name: string
}

export interface SeasonPicture {
  utcOffsetHours: number
  columns: SeasonColumn[]
  months: SeasonMonth[]
}

/** Local hours shown: 18:00 to 09:00. */
export const seasonHours = { from: 18, to: 33 } as const

/** The Moon is drawn only while the sky is dark enough to see it change. */
const moonShownBelowDeg = -8

/** The columns of a season chart, one a night: twilight as stops, the Moon as bars that are paler as it fills. */
export function seasonPicture({ hours, utcOffsetHours, nights }: SeasonInput): SeasonPicture {
  const columns = nights.map(({ night, moonUpHours, sunAltitudesDeg }): SeasonColumn => {
    const { down, up } = crossings(hours, sunAltitudesDeg, moonShownBelowDeg)
    const opacity = Math.round((0.05 + 0.5 * night.moonIllumination) * 100) / 100
    return {
      date: night.date,
      darkHours: night.darkHours,
      stops: nightStops(hours, sunAltitudesDeg),
      moon: moonUpHours
        .map(([from, to]) => ({ from: Math.max(from, down ?? from), to: Math.min(to, up ?? to), opacity }))
        .filter(({ from, to }) => to - from > 0.05),
    }
  })
  return { utcOffsetHours, columns, months: monthsOf(nights.map(({ night }) => night.date)) }
}

function monthsOf(dates: readonly string[]): SeasonMonth[] {
  const months: SeasonMonth[] = []
  let key = ''
  dates.forEach((date, index) => {
    if (date.slice(0, 7) !== key) {
      key = date.slice(0, 7)
      months.push({ first: index, count: 0, name: formatCalendarDate(date, false).replace(/^\d+ /, '') })
    }
    const month = months[months.length - 1]
    if (month) month.count += 1
  })
  return months
}
