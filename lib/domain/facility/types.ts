/** Facility records as computed with: each cites the version of the record it was read from. */
export interface SiteRecord {
  siteId: number
  name: string
  recordVersion: number
  latitudeDeg: number
  /** East positive. */
  longitudeDeg: number
  elevationM: number
  timeZone: string
  utcOffsetHours: number
  lowestAltitudeDeg: number
  /** Band to magnitude an airmass. */
  extinctionMagPerAirmass: Record<string, number>
  /** Band to moonless zenith sky, AB mag per square arcsec. */
  darkSkyMagArcsec2: Record<string, number>
  /** At zenith and 500 nm. */
  seeingArcsec: { best10: number; median: number; worst90: number }
}

export interface ModeRecord {
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
  }
  kind: 'imaging' | 'long-slit'
  wavelengthMinA: number
  wavelengthMaxA: number
  medium: 'air' | 'vacuum'
  band: string | null
  pixelScaleArcsec: number
  dispersionAPerPixel: number | null
  slitWidthArcsec: number | null
  resolvingPower: number | null
  readNoiseE: number
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
  throughput: { wavelengthA: number; efficiency: number }[]
  throughputIncludes: string[]
  overheads: { acquisitionS: number; readoutS: number; ditherS: number; calibrationFraction: number }
}

/** Every site and instrument mode with the record in force. */
export interface FacilityView {
  sites: SiteRecord[]
  modes: ModeRecord[]
}
