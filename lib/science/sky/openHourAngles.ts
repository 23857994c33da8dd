import { DEG_RAD } from '../constants'
import { arcsAbove } from './horizonCrossings'
import type { HorizonCurve } from './horizonCurve'
import { semiArcDeg } from './hourAngle'
import { intersect, without, type Interval } from './intervals'
import { horizonsAbove, type PointingLimits } from './pointing'

/** Arcs of hour angle, degrees from -180 to 180, above a horizon. */
function arcsWithin(curve: HorizonCurve, declination: number): Interval[] {
  const arcs = arcsAbove(curve, Math.sin(declination))
  if (arcs === null) return [[-180, 180]]
  return arcs
    .flatMap(([from, to]): Interval[] => {
      const [start, end] = [from / DEG_RAD, to / DEG_RAD]
      return end <= 180
        ? [[start, end]]
        : [
            [-180, end - 360],
            [start, 180],
          ]
    })
    .sort(([a], [b]) => a - b)
}

/**
 * Arcs of hour angle, degrees from -180 to 180, at which a declination (radians) lies above an altitude and within
 * the limits of a telescope at a latitude (radians).
 */
export function openHourAngles(
  latitude: number,
  declination: number,
  { lowestAltitudeDeg = -90, highestAltitudeDeg = 90, horizons }: PointingLimits,
): Interval[] {
  const arc = semiArcDeg(latitude, declination, lowestAltitudeDeg)
  if (arc === 0) return []
  let open: Interval[] = [[-arc, arc]]
  for (const curve of horizonsAbove(lowestAltitudeDeg, latitude, horizons))
    open = intersect(open, arcsWithin(curve, declination))
  if (highestAltitudeDeg >= 90) return open
  const blind = semiArcDeg(latitude, declination, highestAltitudeDeg)
  return blind === 0 ? open : without(open, [[-blind, blind]])
}
