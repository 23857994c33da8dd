import { DEG_RAD } from '../constants'
import { airmassYoung1994, altitudeOfAirmassDeg, openHourAngles } from '../sky'
import type { ReportInput } from './types'

/** Hour angles the window is averaged over. */
const STEPS = 48

/**
 * Airmass averaged over the hour angles at which a target stands above its airmass limit and the telescope can point
 * to it; that limit itself when it has no position or never comes there.
 */
export function planningAirmass({ target, site, observation, pointing }: ReportInput): number {
  if (target.decDeg === null) return observation.maxAirmass
  const latitude = site.latitudeDeg * DEG_RAD
  const declination = target.decDeg * DEG_RAD
  const lowestAltitudeDeg = Math.max(altitudeOfAirmassDeg(observation.maxAirmass), site.lowestAltitudeDeg)
  const arcs = openHourAngles(latitude, declination, { ...pointing, lowestAltitudeDeg })
  const width = arcs.reduce((sum, [from, to]) => sum + (to - from), 0)
  if (width === 0) return observation.maxAirmass
  let sum = 0
  for (const [from, to] of arcs) {
    // Each arc has its share of the steps, and one at least.
    const count = Math.max(1, Math.round((STEPS * (to - from)) / width))
    for (let i = 0; i < count; i += 1) {
      const hourAngle = (from + ((i + 0.5) / count) * (to - from)) * DEG_RAD
      const sine =
        Math.sin(latitude) * Math.sin(declination) +
        Math.cos(latitude) * Math.cos(declination) * Math.cos(hourAngle)
      const airmass = airmassYoung1994(Math.asin(Math.min(1, sine)) / DEG_RAD) ?? observation.maxAirmass
      sum += (airmass * (to - from)) / width / count
    }
  }
  return Math.max(1, sum)
}
