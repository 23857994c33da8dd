import type { Conditions, ModeRecord, SiteRecord } from '../../../lib/science/exposure'

/** An invented site. */
export const ridge: SiteRecord = {
  latitudeDeg: -37.4,
  longitudeDeg: -70.2,
  elevationM: 2390,
  utcOffsetHours: -3,
  lowestAltitudeDeg: 20,
  extinctionMagPerAirmass: { g: 0.18, V: 0.13, r: 0.11, i: 0.07, J: 0.08 },
  darkSkyMagArcsec2: { g: 22.1, V: 21.7, r: 21.3, i: 20.4, J: 17 },
  seeingQuantilesArcsec: { best10: 0.6, median: 0.8, worst90: 1.3 },
}

/** An invented long-slit spectrograph on a 3.8-m telescope. */
export const slit: ModeRecord = {
  id: 'slit',
  kind: 'long-slit',
  wavelengthMinA: 3600,
  wavelengthMaxA: 7200,
  medium: 'air',
  collectingAreaM2: 10.2,
  pixelScaleArcsec: 0.3,
  dispersionAPerPixel: 1.2,
  slitWidthArcsec: 1,
  resolvingPower: 1200,
  readNoiseE: 3.5,
  darkEPerS: 0.001,
  fullWellE: 120_000,
  gainEPerAdu: 1.6,
  minSubExposureS: 1,
  maxSubExposureS: 1800,
  systematicFloor: 0.01,
  throughput: [
    { wavelengthA: 3500, efficiency: 0.1 },
    { wavelengthA: 5500, efficiency: 0.28 },
    { wavelengthA: 7500, efficiency: 0.25 },
  ],
  throughputIncludes: ['telescope', 'instrument', 'detector'],
  band: null,
  twilightLimitDeg: -18,
  overheads: { acquisitionS: 480, readoutS: 40, ditherS: 5, calibrationFraction: 0.05 },
}

/** An invented imager behind the same telescope. */
export const imager: ModeRecord = {
  ...slit,
  id: 'imager',
  kind: 'imaging',
  wavelengthMinA: 5500,
  wavelengthMaxA: 6900,
  band: 'r',
  dispersionAPerPixel: null,
  slitWidthArcsec: null,
  resolvingPower: null,
  systematicFloor: 0.001,
  maxSubExposureS: 600,
}

export const dark: Conditions = { site: ridge, airmass: 1.2, seeingArcsec: 0.8, moon: 'dark' }
