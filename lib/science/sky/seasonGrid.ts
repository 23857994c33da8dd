import { sharedAlmanac, type Almanac } from './almanac'
import { createNightSky, describeNight } from './nightSky'
import { createObserver } from './observer'
import { dateOf, datesBetween, daysOf, midnightOf } from './time'
import type { Night, Site } from './types'

/** One column of a season chart. Local hours count from midnight before the evening: 18 is 6 pm, 30 is 6 am. */
export interface SeasonNight {
  readonly night: Night
  readonly sunsetHour: number | null
  readonly sunriseHour: number | null
  readonly darkFromHour: number | null
  readonly darkToHour: number | null
  readonly moonUpHours: [number, number][]
  /** Sun's altitude, degrees, at each of the grid's hours. */
  readonly sunAltitudesDeg: number[]
}

export interface SeasonGrid {
  /** Local hours at which the Sun is given: noon (12) to noon (36). */
  readonly hours: number[]
  readonly utcOffsetHours: number
  readonly nights: SeasonNight[]
}

/** Sun and Moon of every night of a season against local clock time, `stepHours` apart. */
export function seasonGrid(
  site: Site,
  from: string,
  to: string,
  utcOffsetHours: number,
  options: { stepHours?: number; twilightLimitDeg?: number; almanac?: Almanac } = {},
): SeasonGrid {
  const { stepHours = 0.5, twilightLimitDeg = -18, almanac = sharedAlmanac } = options
  const observer = createObserver(site, almanac)
  const count = Math.round(24 / stepHours)
  const hours = Array.from({ length: count + 1 }, (_, i) => 12 + (24 * i) / count)
  const nights = datesBetween(from, to).map((date): SeasonNight => {
    const midnight = midnightOf(date) - utcOffsetHours / 24
    const hourOf = (at: Date): number => (daysOf(at) - midnight) * 24
    const maybe = (at: Date | null): number | null => (at ? hourOf(at) : null)
    const night = describeNight(createNightSky(observer, almanac, date), almanac, twilightLimitDeg)
    return {
      night,
      sunsetHour: maybe(night.sunset),
      sunriseHour: maybe(night.sunrise),
      darkFromHour: maybe(night.darkFrom),
      darkToHour: maybe(night.darkTo),
      moonUpHours: night.moonUp.map(([start, end]) => [hourOf(start), hourOf(end)]),
      sunAltitudesDeg: hours.map((hour) => {
        const days = daysOf(dateOf(midnight + hour / 24))
        return observer.altitudeDeg(observer.topocentric(almanac.sun(days), days), days)
      }),
    }
  })
  return { hours, utcOffsetHours, nights }
}
