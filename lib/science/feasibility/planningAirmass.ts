import { DEG_RAD } from '../constants'
import { airmassYoung1994, altitudeOfAirmassDeg } from '../sky'
import { semiArcDeg } from '../sky/hourAngle'
import type { ReportInput } from './types'

/** Hour angles the window is averaged over. */
const STEPS = 24

/**
 * Airmass averaged over the hour angles at which a target stands above its airmass limit; that limit
 * itself when it has no position or never rises above it.
 */
export function planningAirmass({ target, site, observation }: ReportInput): number {
  if (target.decDeg === null) return observation.maxAirmass
  const latitude = site.latitudeDeg * DEG_RAD
  const declination = target.decDeg * DEG_RAD
  const limit = altitudeOfAirmassDeg(observation.maxAirmass)
  const arc = semiArcDeg(latitude, declination, limit)
  if (arc === 0) return observation.maxAirmass
  let sum = 0
  for (let i = 0; i < STEPS; i += 1) {
    const hourAngle = ((i + 0.5) / STEPS) * arc * DEG_RAD
    const sine =
      Math.sin(latitude) * Math.sin(declination) +
      Math.cos(latitude) * Math.cos(declination) * Math.cos(hourAngle)
    sum += airmassYoung1994(Math.asin(Math.min(1, sine)) / DEG_RAD) ?? observation.maxAirmass
  }
  return Math.max(1, sum / STEPS)
}
