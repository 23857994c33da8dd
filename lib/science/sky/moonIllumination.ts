import type { Almanac } from './almanac'
import { angleDeg, subtract } from './vector'

/** Angle Sun-Moon-Earth, degrees: 0 at full Moon, 180 at new. */
export function moonPhaseAngleDeg(almanac: Almanac, days: number): number {
  const moon = almanac.moon(days)
  const toSun = subtract(almanac.sun(days), moon)
  return angleDeg(toSun, [-moon[0], -moon[1], -moon[2]])
}

/** Illuminated fraction of the Moon's disc seen from the Earth's centre, 0 to 1 (Meeus, eq. 48.1). */
export function moonIllumination(almanac: Almanac, days: number): number {
  return 0.5 * (1 + Math.cos((moonPhaseAngleDeg(almanac, days) * Math.PI) / 180))
}
