/** Facility records as computed with: each cites the version of the record it was read from. */
export interface SiteRecord extends SiteFacts {
  siteId: number
  name: string
  recordVersion: number
}

/** A row of a horizon, straight to the next one and all around; azimuth from north through east. */
export interface HorizonPoint {
  azimuthDeg: number
  altitudeDeg: number
}

/** What a version of a site's record says. */
export interface SiteFacts {
  latitudeDeg: number
  /** East positive. */
  longitudeDeg: number
  elevationM: number
  timeZone: string
  utcOffsetHours: number
  lowestAltitudeDeg: number
  /** What stands around the site: the lowest airless altitude by azimuth; empty for none. */
  horizon: HorizonPoint[]
  /** Band to magnitude an airmass. */
  extinctionMagPerAirmass: Record<string, number>
  /** Band to moonless zenith sky, AB mag per square arcsec. */
  darkSkyMagArcsec2: Record<string, number>
  /** At zenith and 500 nm. */
  seeingArcsec: { best10: number; median: number; worst90: number }
  /** Null where none is on record. */
  weather?: SiteWeather | null
}

/** How often nights are lost to weather. */
export interface SiteWeather {
  /** Share of the nights lost, for each month from January; 0 to 1. */
  lostByMonth: number[]
  /** Correlation of a night with the one before it; 0 to below 1. */
  persistence: number
}

export interface ModeRecord extends ModeFacts {
  modeId: number
  slug: string
  name: string
  recordVersion: number
  instrument: { id: number; slug: string; name: string }
  telescope: {
    id: number
    slug: string
    name: string
    recordVersion: number
    apertureM: number
    collectingAreaM2: number
    horizon: HorizonPoint[]
    highestAltitudeDeg: number | null
  }
}

/** What a version of a mode's record says. */
export interface ModeFacts {
  kind: 'imaging' | 'long-slit'
  wavelengthMinA: number
  wavelengthMaxA: number
  medium: 'air' | 'vacuum'
  band: string | null
  pixelScaleArcsec: number
  dispersionAPerPixel: number | null
  slitWidthArcsec: number | null
  resolvingPower: number | null
  /** Counted once a sub-exposure: of one read, or of the ramp of reads it consists of. */
  readNoiseE: number
  readNoisePer: 'read' | 'ramp'
  darkEPerS: number
  fullWellE: number
  gainEPerAdu: number
  minSubExposureS: number
  maxSubExposureS: number
  systematicFloor: number
  twilightLimitDeg: number
  /** From pixels around the source, from the next frame in pairs, or from frames of blank sky. */
  skySubtraction: 'around' | 'paired' | 'blank-sky'
  /** Pixels the sky around is measured from; null for as many as one likes. */
  backgroundPixels: number | null
  /** Glow of telescope and instrument, electrons a second and pixel. */
  thermalEPerS: number
  /** Width of the image the optics alone make. */
  opticsArcsec: number
  dispersionCorrected: boolean
  /** Filters in the beam, in words; empty where there are none. */
  filters: string
  /** Which calibrations the observatory takes, and on whose time; in words. */
  calibrationPolicy: string
  throughput: { wavelengthA: number; efficiency: number }[]
  throughputIncludes: string[]
  overheads: { acquisitionS: number; readoutS: number; ditherS: number; calibrationFraction: number }
}

/** What the facility is made of, each carried by the one before. */
export type FacilityKind = 'site' | 'telescope' | 'instrument' | 'mode'

/** Every site and instrument mode with the record in force. */
export interface FacilityView {
  sites: SiteRecord[]
  modes: ModeRecord[]
}

/** What a version of a telescope's record says. */
export interface TelescopeFacts {
  apertureM: number
  collectingAreaM2: number
  /** What stands in its own way, besides the horizon of the site; empty for nothing. */
  horizon: HorizonPoint[]
  /** Above it lies the blind spot of an altazimuth mount; null where there is none. */
  highestAltitudeDeg: number | null
}

/** What of a telescope's record says where it can point. */
export type TelescopePointing = Pick<TelescopeFacts, 'horizon' | 'highestAltitudeDeg'>

/** One version of a record: what it says, since when it holds, who wrote it. Versions are never changed. */
export interface RecordVersion<Facts> {
  recordVersion: number
  /** First evening it holds for. */
  validFrom: string
  savedAt: Date
  /** Null for what was there from the beginning. */
  savedBy: string | null
  facts: Facts
}

/** Who computes with a record: what is said before it is changed. */
export interface RecordUse {
  /** Drafts of calls that still take proposals, by call. */
  drafts: { callNumber: number; seasonFrom: string; count: number }[]
  /** Proposals sent with an earlier or the present version; they keep it. */
  sent: number
  /** Somebody has computed with it: a new version cannot begin in the past. */
  wasUsed: boolean
}
