/** A place on Earth: geodetic (WGS 84), east longitudes positive. */
export interface Site {
  readonly latitudeDeg: number
  readonly longitudeDeg: number
  readonly elevationM: number
}

/** A direction beyond the solar system: ICRS at epoch J2000.0. `pmRaMasYr` includes cos(declination). */
export interface SkyTarget {
  readonly id: string
  readonly raDeg: number
  readonly decDeg: number
  readonly pmRaMasYr?: number
  readonly pmDecMasYr?: number
}

/** When the Sun passes 6, 12 and 18 degrees below the horizon; null where it does not. */
export interface Twilight {
  readonly civil: Date | null
  readonly nautical: Date | null
  readonly astronomical: Date | null
}

/** One night, from local mean noon of its evening date to the next noon. */
export interface Night {
  /** Evening date at the site, YYYY-MM-DD. */
  readonly date: string
  /** Upper limb on the horizon with mean refraction: the Sun's centre 50 arcminutes below it. */
  readonly sunset: Date | null
  readonly sunrise: Date | null
  readonly eveningTwilight: Twilight
  readonly morningTwilight: Twilight
  /** Start and end of darkness by the twilight limit asked for; null when it never gets that dark. */
  readonly darkFrom: Date | null
  readonly darkTo: Date | null
  readonly darkHours: number
  /** Illuminated fraction of the Moon at the middle of the night, 0 to 1. */
  readonly moonIllumination: number
  /** Intervals between sunset and sunrise with the Moon's centre above the airless horizon. */
  readonly moonUp: [Date, Date][]
  /** 'day': the Sun never sets; 'night': it never rises. */
  readonly polar: 'day' | 'night' | null
}

/** What of the Moon a target can bear. Each limit counts only while the Moon is up. */
export interface MoonLimits {
  /** Largest illuminated fraction, 0 to 1. */
  readonly maxIllumination?: number
  /** Smallest distance from the Moon, degrees. */
  readonly minSeparationDeg?: number
  /** The Moon must be below the horizon. */
  readonly below?: boolean
}
