/** Sun, Moon, targets and nights at a site. */
export { airmassKastenYoung1989, airmassYoung1994, altitudeOfAirmassDeg } from './airmass'
export { createAlmanac, sharedAlmanac, type Almanac } from './almanac'
export { parseDeclination, parseRightAscension, type ParsedAngle } from './coordinates'
export {
  localSiderealHours,
  moonAltitudeDeg,
  moonIlluminationAt,
  moonSeparationDeg,
  sunAltitudeDeg,
} from './instants'
export { darkSeconds, type DarkSecondsInput } from './darkSeconds'
export { horizonAltitudeDeg, type HorizonProfile, type HorizonRow } from './horizonProfile'
export { dateOfMjd, mjdOf } from './mjd'
export { moonlitSkyV, type MoonlitSky } from './moonlight'
export { moonPhases, type MoonPhase } from './moonPhases'
export { eveningDateAt, nightAt } from './nightAt'
export { nightPieces, type NightPiece } from './nightPieces'
export { openHourAngles } from './openHourAngles'
export type { PointingLimits } from './pointing'
export { positionsAt, type InstantPositions, type PositionsInput, type TargetPosition } from './positionsAt'
export { separationArcsec, type Place } from './separationArcsec'
export { seasonGrid, type SeasonGrid, type SeasonNight } from './seasonGrid'
export type { MoonLimits, Night, Site, SkyTarget, Twilight } from './types'
export { skyEngineVersion } from './version'
export { visibility, type TargetVisibility, type Visibility, type VisibilityInput } from './visibility'
