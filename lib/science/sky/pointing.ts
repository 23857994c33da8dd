import { horizonCurve, type HorizonCurve } from './horizonCurve'
import type { HorizonProfile } from './horizonProfile'

/** Where a telescope can point; altitudes airless, degrees. */
export interface PointingLimits {
  /** Lowest altitude it reaches. */
  readonly lowestAltitudeDeg?: number
  /** Highest altitude it can follow: an altazimuth mount has a blind spot overhead. */
  readonly highestAltitudeDeg?: number
  /** What stands around it; a direction has to be above all of them. */
  readonly horizons?: readonly HorizonProfile[]
}

/** Horizons that reach above a lowest altitude somewhere, ready to be held against stars; the others change nothing. */
export function horizonsAbove(
  lowestDeg: number,
  latitude: number,
  horizons: readonly HorizonProfile[] = [],
): HorizonCurve[] {
  return horizons
    .filter((profile) => profile.length > 0)
    .map((profile) => horizonCurve(latitude, profile))
    .filter(({ highestDeg }) => highestDeg > lowestDeg)
}
