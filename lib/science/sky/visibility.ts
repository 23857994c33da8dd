import { ScienceError } from '../ScienceError'
import { altitudeOfAirmassDeg } from './airmass'
import { sharedAlmanac, type Almanac } from './almanac'
import { apparentVector, checkTarget } from './apparentPlace'
import { culmination, timesAbove } from './hourAngle'
import { intersect, totalDays, without, type Interval } from './intervals'
import { awayFromMoon, moonTooBright } from './moonLimits'
import { createNightSky, describeNight } from './nightSky'
import { createObserver } from './observer'
import { horizonsAbove, type PointingLimits } from './pointing'
import { dateOf, datesBetween } from './time'
import { timesAboveHorizon } from './timesAboveHorizon'
import type { MoonLimits, Night, Site, SkyTarget } from './types'

export interface VisibilityInput extends PointingLimits {
  readonly site: Site
  readonly targets: readonly SkyTarget[]
  /** First and last evening date at the site, both included. */
  readonly from: string
  readonly to: string
  /** Largest airmass (Young 1994), 1 to 31. */
  readonly maxAirmass: number
  /** Altitude of the Sun under which it counts as dark, degrees, -18 when not given. */
  readonly twilightLimitDeg?: number
  readonly moon?: MoonLimits
  /** Where Sun and Moon are kept; the process-wide one when not given. */
  readonly almanac?: Almanac
}

export interface TargetVisibility {
  readonly id: string
  readonly totalHours: number
  /** Usable hours of each night, in the order of `nights`. */
  readonly byNight: number[]
  readonly windows: [Date, Date][][]
  /** Upper culmination of each night, between its noons. */
  readonly culminations: Date[]
}

export interface Visibility {
  readonly nights: Night[]
  readonly targets: TargetVisibility[]
}

function check(input: VisibilityInput): void {
  input.targets.forEach(checkTarget)
  const { maxIllumination, minSeparationDeg } = input.moon ?? {}
  if (maxIllumination !== undefined && !(maxIllumination >= 0 && maxIllumination <= 1)) {
    throw new ScienceError('outside-range', 'The Moon’s illuminated fraction lies between 0 and 1.')
  }
  if (minSeparationDeg !== undefined && !(minSeparationDeg >= 0 && minSeparationDeg <= 180)) {
    throw new ScienceError('outside-range', 'A distance from the Moon lies between 0° and 180°.')
  }
  const limit = input.twilightLimitDeg ?? -18
  if (!(limit >= -90 && limit <= 0)) {
    throw new ScienceError('outside-range', 'A twilight limit lies between −90° and 0°.')
  }
}

/**
 * When targets can be observed: dark, above the airmass limit, within what the telescope reaches and within the Moon
 * limits, night by night. Sun and Moon are computed once a night; a target's hour-angle window comes in closed form,
 * so a target costs about a microsecond a night, and two more under a horizon that reaches above the airmass limit.
 * Window edges within 60 s.
 */
export function visibility(input: VisibilityInput): Visibility {
  check(input)
  const almanac = input.almanac ?? sharedAlmanac
  const observer = createObserver(input.site, almanac)
  const limitDeg = input.twilightLimitDeg ?? -18
  const lowest = Math.max(altitudeOfAirmassDeg(input.maxAirmass), input.lowestAltitudeDeg ?? -90)
  const highest = input.highestAltitudeDeg ?? 90
  const horizons = horizonsAbove(lowest, observer.latitude, input.horizons)
  const minSeparationDeg = input.moon?.minSeparationDeg ?? 0
  const skies = datesBetween(input.from, input.to).map((date) => createNightSky(observer, almanac, date))
  const usable = skies.map((sky) =>
    without(sky.darkness(limitDeg), input.moon ? moonTooBright(almanac, sky, input.moon) : []),
  )

  const targets = input.targets.map((target): TargetVisibility => {
    const byNight: number[] = []
    const windows: [Date, Date][][] = []
    const culminations: Date[] = []
    for (const [i, sky] of skies.entries()) {
      const vector = apparentVector(almanac, target, sky.middle)
      let open: Interval[] = intersect(timesAbove(observer, vector, lowest, sky.noons), usable[i] ?? [])
      for (const curve of horizons) {
        if (open.length > 0) open = intersect(open, timesAboveHorizon(observer, vector, curve, sky.noons))
      }
      if (highest < 90) open = without(open, timesAbove(observer, vector, highest, sky.noons))
      if (minSeparationDeg > 0 && open.length > 0) {
        open = awayFromMoon(observer, almanac, sky, vector, open, minSeparationDeg)
      }
      byNight.push(totalDays(open) * 24)
      windows.push(open.map(([from, to]) => [dateOf(from), dateOf(to)]))
      culminations.push(dateOf(culmination(observer, vector, sky.noons[0])))
    }
    const totalHours = byNight.reduce((sum, hours) => sum + hours, 0)
    return { id: target.id, totalHours, byNight, windows, culminations }
  })
  return { nights: skies.map((sky) => describeNight(sky, almanac, limitDeg)), targets }
}
