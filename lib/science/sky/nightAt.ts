import { sharedAlmanac, type Almanac } from './almanac'
import { createNightSky, describeNight } from './nightSky'
import { createObserver } from './observer'
import { calendarDate, dateAfter, dateOf, daysOf } from './time'
import type { Night, Site } from './types'

/**
 * The night of an evening date at a site. `twilightLimitDeg` is the Sun's altitude under which it counts as
 * dark. Sunset and twilights within 30 s; no allowance for the dip of a high horizon.
 */
export function nightAt(
  site: Site,
  eveningDate: string,
  twilightLimitDeg = -18,
  almanac: Almanac = sharedAlmanac,
): Night {
  const observer = createObserver(site, almanac)
  return describeNight(createNightSky(observer, almanac, eveningDate), almanac, twilightLimitDeg)
}

/** Evening date of the night that `at` falls in or, by day, of the night that comes next. */
export function eveningDateAt(site: Site, at: Date): string {
  const longitude = ((site.longitudeDeg + 540) % 360) - 180
  const localMean = daysOf(at) + longitude / 360
  const date = calendarDate(dateOf(localMean - 0.5))
  const { sunrise } = nightAt(site, date)
  return sunrise && at >= sunrise ? dateAfter(date, 1) : date
}
