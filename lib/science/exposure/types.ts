/** What an instrument mode is, as far as light is concerned. */
export interface ModeRecord {
  readonly id: string | number
  readonly kind: 'imaging' | 'long-slit'
  readonly wavelengthMinA: number
  readonly wavelengthMaxA: number
  readonly medium: 'air' | 'vacuum'
  readonly collectingAreaM2: number
  readonly pixelScaleArcsec: number
  readonly dispersionAPerPixel: number | null
  readonly slitWidthArcsec: number | null
  readonly resolvingPower: number | null
  readonly readNoiseE: number
  readonly darkEPerS: number
  readonly fullWellE: number
  readonly gainEPerAdu: number
  readonly minSubExposureS: number
  readonly maxSubExposureS: number
  /** Share of the sky that no stacking removes: 0.001 is common for dithered images, 0.01 for slits. */
  readonly systematicFloor: number
  readonly throughput: readonly { readonly wavelengthA: number; readonly efficiency: number }[]
  /** Of 'atmosphere', 'telescope', 'slit', 'instrument', 'detector': what the table counts already. */
  readonly throughputIncludes: readonly string[]
  readonly band: string | null
  readonly twilightLimitDeg: number
  readonly overheads: {
    readonly acquisitionS: number
    readonly readoutS: number
    readonly ditherS: number
    readonly calibrationFraction: number
  }
  /** Width of the image the optics alone would make, arcseconds. */
  readonly opticsArcsec?: number
  /**
   * How the sky is taken off: from pixels around the source, from the same pixels of the next frame (pairs, which
   * doubles its noise), or from frames of blank sky, which take as long again. From around when not given.
   */
  readonly skySubtraction?: 'around' | 'paired' | 'blank-sky'
  /** Pixels the sky around is measured from; unlimited when not given. */
  readonly backgroundPixels?: number
  /** Glow of telescope and instrument themselves, electrons a second and pixel. */
  readonly thermalEPerS?: number
  /** Prisms undo the dispersion of the air. */
  readonly dispersionCorrected?: boolean
}

/** What a site is, as far as light is concerned. */
export interface SiteRecord {
  readonly latitudeDeg: number
  readonly longitudeDeg: number
  readonly elevationM: number
  readonly utcOffsetHours: number
  readonly lowestAltitudeDeg: number
  /** Band to magnitudes an airmass. */
  readonly extinctionMagPerAirmass: Readonly<Record<string, number>>
  /** Band to moonless zenith sky, AB magnitudes per square arcsecond. */
  readonly darkSkyMagArcsec2: Readonly<Record<string, number>>
  /** At the zenith and 500 nm. */
  readonly seeingQuantilesArcsec: {
    readonly best10: number
    readonly median: number
    readonly worst90: number
  }
}

export type MoonClass = 'dark' | 'grey' | 'bright'

/** Whether a brightness was measured, or follows from a luminosity and so from a cosmology. */
export type Provenance = 'observed' | 'predicted'

export type Geometry =
  | { readonly kind: 'point' }
  /** A Sersic profile, exponential when no index is given, with half its light inside `effectiveRadiusArcsec`. */
  | { readonly kind: 'extended'; readonly effectiveRadiusArcsec: number; readonly sersicIndex?: number }
  /** Brightness is per square arcsecond; the signal is summed over `areaArcsec2`. */
  | { readonly kind: 'uniform'; readonly areaArcsec2: number }

export type Source =
  | {
      readonly kind: 'magnitude'
      readonly ab: number
      /** Where the signal-to-noise of a spectrum is asked for, angstroms; the middle of the range otherwise. */
      readonly wavelengthA?: number
      readonly geometry: Geometry
      readonly provenance: Provenance
    }
  | {
      readonly kind: 'line'
      readonly fluxErgSCm2: number
      readonly wavelengthA: number
      /** Intrinsic full width at half maximum. */
      readonly widthKmS: number
      /** Continuum under the line, which adds noise but no signal. */
      readonly continuumAb?: number
      readonly geometry: Geometry
      readonly provenance: Provenance
    }

export interface Conditions {
  readonly site: SiteRecord
  readonly airmass: number
  /** At the zenith and 500 nm. */
  readonly seeingArcsec: number
  readonly moon: MoonClass
  /** Share of the light that clouds let through, 1 when clear. */
  readonly transparency?: number
  /** Sky as measured, AB magnitudes per square arcsecond, in place of the computed one. */
  readonly skyAbArcsec2?: number
  /** A slit that does not follow the dispersion of the air loses light; along it when not given. */
  readonly slitAngle?: 'parallactic' | 'across'
  /** Where the slit is centred by, angstroms; 5500 when not given. */
  readonly guideWavelengthA?: number
}

/** What the signal-to-noise ratio counts: the whole image of a source, or a stretch of its spectrum. */
export type SnrPer = 'image' | 'pixel' | 'angstrom' | 'resolution-element'
