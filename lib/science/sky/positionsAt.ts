import { airmassYoung1994 } from './airmass'
import { sharedAlmanac } from './almanac'
import { apparentVector, checkTarget } from './apparentPlace'
import { moonIllumination, moonPhaseAngleDeg } from './moonIllumination'
import { moonlitSkyV } from './moonlight'
import { createObserver } from './observer'
import { daysOf } from './time'
import type { Site, SkyTarget } from './types'
import { angleDeg } from './vector'

/** Sky of Krisciunas & Schaefer 1991 at its best: 79 nL at the zenith, 0.172 mag an airmass. */
const DARK_ZENITH_V = 21.587
const EXTINCTION_V = 0.172

export interface TargetPosition {
  readonly id: string
  /** Airless, degrees; azimuth from north through east. */
  readonly altitudeDeg: number
  readonly azimuthDeg: number
  /** Young 1994; null below the horizon. */
  readonly airmass: number | null
  readonly moonSeparationDeg: number
  readonly sunSeparationDeg: number
  /** V magnitudes per square arcsecond; null below the horizon and while the Sun is above -18 degrees. */
  readonly skyVMagArcsec2: number | null
}

export interface InstantPositions {
  readonly at: Date
  /** Local apparent sidereal time, hours. */
  readonly lastHours: number
  readonly sunAltitudeDeg: number
  readonly moonAltitudeDeg: number
  readonly moonIllumination: number
  readonly targets: TargetPosition[]
}

export interface PositionsInput {
  readonly site: Site
  readonly targets: readonly SkyTarget[]
  readonly instants: readonly Date[]
  readonly darkZenithV?: number
  readonly extinctionV?: number
}

/** Where Sun, Moon and targets stand at some moments. Altitudes within 0.02 degrees, the Moon within 0.05. */
export function positionsAt(input: PositionsInput): InstantPositions[] {
  input.targets.forEach(checkTarget)
  const almanac = sharedAlmanac
  const observer = createObserver(input.site, almanac)
  return input.instants.map((at) => {
    const days = daysOf(at)
    const sun = observer.topocentric(almanac.sun(days), days)
    const moon = observer.topocentric(almanac.moon(days), days)
    const sunAltitudeDeg = observer.altitudeDeg(sun, days)
    const moonAltitudeDeg = observer.altitudeDeg(moon, days)
    const phaseAngleDeg = moonPhaseAngleDeg(almanac, days)
    return {
      at,
      lastHours: observer.siderealDeg(days) / 15,
      sunAltitudeDeg,
      moonAltitudeDeg,
      moonIllumination: moonIllumination(almanac, days),
      targets: input.targets.map((target): TargetPosition => {
        const vector = apparentVector(almanac, target, days)
        const { altitudeDeg, azimuthDeg } = observer.horizontal(vector, days)
        const separation = angleDeg(vector, moon)
        const sky = {
          phaseAngleDeg,
          separationDeg: separation,
          moonAltitudeDeg,
          targetAltitudeDeg: altitudeDeg,
          extinctionV: input.extinctionV ?? EXTINCTION_V,
          darkZenithV: input.darkZenithV ?? DARK_ZENITH_V,
        }
        return {
          id: target.id,
          altitudeDeg,
          azimuthDeg,
          airmass: airmassYoung1994(altitudeDeg),
          moonSeparationDeg: separation,
          sunSeparationDeg: angleDeg(vector, sun),
          skyVMagArcsec2: altitudeDeg > 0 && sunAltitudeDeg < -18 ? moonlitSkyV(sky) : null,
        }
      }),
    }
  })
}
