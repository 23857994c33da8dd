/** Signal-to-noise and exposure time. */
export { ccd, type CcdInput, type CcdResult } from './ccd'
export { airAt, airDispersionArcsec, type Air } from './airDispersion'
export { exposure, type ExposureInput } from './exposure'
export { exposureTimes } from './exposureTimes'
export { faintest, type Faintest, type FaintestInput } from './faintest'
export { SERSIC_LEAST, SERSIC_MOST } from './image/sersicMixture'
export { colourToMode, type ColourOf } from './colourToMode'
export { deliveredImageArcsec } from './imageQuality'
export type { ExposureReport, Regime } from './report'
export { skyAbArcsec2 } from './skyBrightness'
export type {
  Conditions,
  Geometry,
  ModeRecord,
  MoonClass,
  Provenance,
  SiteRecord,
  SnrPer,
  Source,
} from './types'
export { exposureEngineVersion } from './version'
