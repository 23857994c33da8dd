import { sharedAlmanac } from './almanac'
import { apparentVector, checkTarget } from './apparentPlace'
import { moonIllumination } from './moonIllumination'
import { createObserver } from './observer'
import { daysOf } from './time'
import type { Site, SkyTarget } from './types'
import { angleDeg } from './vector'

/** Airless topocentric altitude of the Sun's centre, degrees; within 0.01. */
export function sunAltitudeDeg(site: Site, at: Date): number {
  const observer = createObserver(site, sharedAlmanac)
  const days = daysOf(at)
  return observer.altitudeDeg(observer.topocentric(sharedAlmanac.sun(days), days), days)
}

/** Airless topocentric altitude of the Moon's centre, degrees; within 0.02. */
export function moonAltitudeDeg(site: Site, at: Date): number {
  const observer = createObserver(site, sharedAlmanac)
  const days = daysOf(at)
  return observer.altitudeDeg(observer.topocentric(sharedAlmanac.moon(days), days), days)
}

/** Illuminated fraction of the Moon's disc, 0 to 1. */
export function moonIlluminationAt(at: Date): number {
  return moonIllumination(sharedAlmanac, daysOf(at))
}

/** Local apparent sidereal time, hours, 0 to 24. */
export function localSiderealHours(site: Site, at: Date): number {
  return createObserver(site, sharedAlmanac).siderealDeg(daysOf(at)) / 15
}

/** Angle between a target and the Moon as seen from the site, degrees, 0 to 180. */
export function moonSeparationDeg(site: Site, target: Omit<SkyTarget, 'id'>, at: Date): number {
  const named = { id: '', ...target }
  checkTarget(named)
  const days = daysOf(at)
  const moon = createObserver(site, sharedAlmanac).topocentric(sharedAlmanac.moon(days), days)
  return angleDeg(apparentVector(sharedAlmanac, named, days), moon)
}
