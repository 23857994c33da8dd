import type { PointingLimits } from '../sky'

/** What besides the airmass keeps a telescope off a target, as `, clear of the horizon`; empty for nothing. */
export function limitWords({ horizons = [], highestAltitudeDeg = 90 }: PointingLimits = {}): string {
  const horizon = horizons.some((profile) => profile.length > 0)
  if (highestAltitudeDeg >= 90) return horizon ? ', clear of the horizon' : ''
  return horizon ? ', clear of horizon and zenith' : ', clear of the zenith'
}
