import { DEG_RAD } from '../constants'
import { brent } from '../numeric/brent'
import { ScienceError } from '../ScienceError'

/**
 * Airmass at a true (airless) altitude, degrees, -0.5 to 90: Young 1994 (Appl. Opt. 33, 1108).
 * Largest error 0.0037 at the horizon, where it is 31.7. Null below the horizon.
 */
export function airmassYoung1994(trueAltitudeDeg: number): number | null {
  if (!(trueAltitudeDeg >= 0)) return null
  const c = Math.sin(trueAltitudeDeg * DEG_RAD)
  return ((1.002432 * c + 0.148386) * c + 0.0096467) / (((c + 0.149864) * c + 0.0102963) * c + 0.000303978)
}

/**
 * Airmass at an apparent (refracted) altitude, degrees, 0 to 90: Kasten & Young 1989 (Appl. Opt. 28, 4735),
 * whose own table is in apparent altitude. Null below the horizon.
 */
export function airmassKastenYoung1989(apparentAltitudeDeg: number): number | null {
  if (!(apparentAltitudeDeg >= 0)) return null
  return 1 / (Math.sin(apparentAltitudeDeg * DEG_RAD) + 0.50572 * (apparentAltitudeDeg + 6.07995) ** -1.6364)
}

/** True altitude, degrees, at which the airmass of Young 1994 is `airmass`, from 1 to 31.7. */
export function altitudeOfAirmassDeg(airmass: number): number {
  const horizon = airmassYoung1994(0) ?? 0
  if (!(airmass >= 1 && airmass <= horizon)) {
    throw new ScienceError('outside-range', `An airmass lies between 1 and ${horizon.toFixed(1)}.`)
  }
  // The fit gives 0.9999999 at the zenith.
  if (airmass <= (airmassYoung1994(90) ?? 1)) return 90
  return brent((altitude) => (airmassYoung1994(altitude) ?? horizon) - airmass, 0, 90, 1e-10)
}
