import { brent } from '../numeric/brent'

/** A stretch of a horizon between two rows: altitude = `altitude` + `slope` (A - `from`), radians. */
export interface Stretch {
  readonly from: number
  readonly to: number
  readonly altitude: number
  readonly slope: number
}

/** A sine may vary by this much unseen: less than half a second of time, even where a star grazes the horizon. */
const UNSEEN = 1e-9

/**
 * Sine of the declination of the horizon at azimuth A, and its first two derivatives by A:
 * sin d = sin lat sin a + cos lat cos a cos A with a = a0 + s (A - A0).
 * Source: Meeus 1998, Astronomical Algorithms, section 13, the inverse of equations 13.5 and 13.6, azimuth from north.
 */
export function sineOf(latitude: number, { from, altitude, slope }: Stretch, azimuth: number) {
  const [sinLat, cosLat] = [Math.sin(latitude), Math.cos(latitude)]
  const a = altitude + slope * (azimuth - from)
  const [sinA, cosA, sinAz, cosAz] = [Math.sin(a), Math.cos(a), Math.sin(azimuth), Math.cos(azimuth)]
  return {
    value: sinLat * sinA + cosLat * cosA * cosAz,
    first: slope * (sinLat * cosA - cosLat * sinA * cosAz) - cosLat * cosA * sinAz,
    second:
      -slope * slope * sinLat * sinA -
      cosLat * ((slope * slope + 1) * cosA * cosAz - 2 * slope * sinA * sinAz),
  }
}

/**
 * Azimuths inside a stretch, growing, at which its declination turns from rising to falling or back. None is missed
 * that matters: an interval is halved until bounds on the second and third derivative show that it holds none or
 * one, or until the sine varies by less than 1e-9 in it.
 */
export function turningPoints(latitude: number, stretch: Stretch): number[] {
  const slope = Math.abs(stretch.slope)
  const [sinLat, cosLat] = [Math.abs(Math.sin(latitude)), Math.abs(Math.cos(latitude))]
  const mostSecond = slope ** 2 * sinLat + (slope + 1) ** 2 * cosLat
  const mostThird = slope ** 3 * sinLat + (slope + 1) ** 3 * cosLat
  const first = (azimuth: number) => sineOf(latitude, stretch, azimuth).first
  const search = (low: number, high: number): number[] => {
    const middle = (low + high) / 2
    const half = (high - low) / 2
    const at = sineOf(latitude, stretch, middle)
    if (Math.abs(at.first) > mostSecond * half) return []
    if ((Math.abs(at.first) + mostSecond * half) * 2 * half < UNSEEN) return []
    if (Math.abs(at.second) <= mostThird * half) return [...search(low, middle), ...search(middle, high)]
    return first(low) > 0 === first(high) > 0 ? [] : [brent(first, low, high, 1e-10)]
  }
  return search(stretch.from, stretch.to)
}
