import { checkMode } from './checkMode'
import { ScienceError } from '../ScienceError'
import { airAt, airDispersionArcsec } from './airDispersion'
import { sourceImage } from './image/sourceImage'
import { deliveredImageArcsec } from './imageQuality'
import { imagingRates } from './imagingRates'
import { skyAbArcsec2 } from './skyBrightness'
import { slitRates } from './slitRates'
import { airTransmission } from './throughput'
import type { Conditions, ModeRecord, SnrPer, Source } from './types'

/** What falls inside an aperture: the source's share, electrons a second of continuum under a line, pixels. */
export interface Aperture {
  readonly share: number
  readonly continuum: number
  readonly pixels: number
}

/** Electrons a second of a source and its surroundings, for any aperture. */
export interface Rates {
  readonly wavelengthA: number
  readonly imageArcsec: number
  readonly skyAbArcsec2: number
  readonly skyBand: string
  /** Source electrons with nothing lost outside the aperture or slit. */
  readonly sourceWhole: number
  readonly skyPerPixel: number
  /** Electrons a second of source and sky in the brightest pixel. */
  readonly peakPixel: number
  /** Inside an aperture of a radius (half height along a slit), arcseconds. */
  aperture(radius: number): Aperture
}

const GUIDE_A = 5500

function check(mode: ModeRecord, source: Source, wavelengthA: number): void {
  if (source.kind === 'line' && !(source.fluxErgSCm2 > 0)) {
    throw new ScienceError('bad-source', 'The flux of a line must be above 0.')
  }
  if (source.kind === 'magnitude' && !(Math.abs(source.ab) <= 50)) {
    throw new ScienceError('bad-source', 'A magnitude lies between −50 and 50.')
  }
  if (!(wavelengthA >= mode.wavelengthMinA && wavelengthA <= mode.wavelengthMaxA)) {
    throw new ScienceError('outside-range', 'The wavelength lies outside the range of this mode.')
  }
}

/** How far the air pushes the image off the middle of the slit, arcseconds. */
function offSlit(mode: ModeRecord, conditions: Conditions, wavelengthA: number): number {
  if (mode.dispersionCorrected || conditions.slitAngle !== 'across') return 0
  const air = airAt(conditions.site.elevationM)
  return airDispersionArcsec(wavelengthA, conditions.guideWavelengthA ?? GUIDE_A, conditions.airmass, air)
}

/** Rates of a source through a mode under conditions. */
export function computeRates(mode: ModeRecord, source: Source, conditions: Conditions, per: SnrPer): Rates {
  const wavelengthA = source.wavelengthA ?? 0.5 * (mode.wavelengthMinA + mode.wavelengthMaxA)
  checkMode(mode)
  check(mode, source, wavelengthA)
  const { site, airmass } = conditions
  const pointArcsec = deliveredImageArcsec({
    seeingArcsec: conditions.seeingArcsec,
    airmass,
    wavelengthA,
    collectingAreaM2: mode.collectingAreaM2,
    opticsArcsec: mode.opticsArcsec,
  })
  const { light, imageArcsec } = sourceImage(pointArcsec, source.geometry)
  const computed = skyAbArcsec2(site, wavelengthA, mode.band, conditions.moon, airmass)
  const shared = {
    mode,
    source,
    light,
    wavelengthA,
    air: airTransmission(mode, site, wavelengthA, airmass) * (conditions.transparency ?? 1),
    skyAbArcsec2: conditions.skyAbArcsec2 ?? computed.ab,
  }
  const rates =
    mode.kind === 'imaging'
      ? imagingRates(shared)
      : slitRates({ ...shared, per, offArcsec: offSlit(mode, conditions, wavelengthA) })
  return { wavelengthA, imageArcsec, skyAbArcsec2: shared.skyAbArcsec2, skyBand: computed.band, ...rates }
}
