import type { Almanac } from './almanac'
import { intersect, intervalsAbove, without, type Interval } from './intervals'
import { moonIllumination } from './moonIllumination'
import type { NightSky } from './nightSky'
import type { Observer } from './observer'
import type { MoonLimits } from './types'
import { angleDeg, type Vector3 } from './vector'

/** Half-hourly times across an interval, its ends included. */
function timesIn([from, to]: Interval): number[] {
  const count = Math.max(1, Math.ceil((to - from) * 48))
  return Array.from({ length: count + 1 }, (_, i) => from + ((to - from) * i) / count)
}

/** Times of a night on which the Moon rules out every target: it must be below, or it is up and too bright. */
export function moonTooBright(almanac: Almanac, sky: NightSky, limits: MoonLimits): Interval[] {
  if (limits.below) return [...sky.moonUp]
  const most = limits.maxIllumination
  if (most === undefined) return []
  return sky.moonUp.flatMap((up) =>
    intervalsAbove((days) => moonIllumination(almanac, days) - most, timesIn(up)),
  )
}

/** Cuts from a target's windows the times when the Moon is up and closer than allowed. */
export function awayFromMoon(
  observer: Observer,
  almanac: Almanac,
  sky: NightSky,
  vector: Vector3,
  windows: Interval[],
  minSeparationDeg: number,
): Interval[] {
  const separation = (days: number): number =>
    angleDeg(vector, observer.topocentric(almanac.moon(days), days))
  // The Moon moves at most some 16 degrees a day against the stars, parallax included.
  if (separation(sky.middle) > minSeparationDeg + 16) return windows
  const close = intersect(windows, sky.moonUp).flatMap((window) =>
    intervalsAbove((days) => minSeparationDeg - separation(days), timesIn(window)),
  )
  return without(windows, close)
}
