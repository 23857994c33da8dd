import { abPhotonRate, linePhotonRate } from '../light'
import { AB_ZERO_ERG } from '../light/magnitudes'
import { PLANCK_ERG_S, SPEED_OF_LIGHT_KM_S } from '../constants'
import { ScienceError } from '../ScienceError'
import { deliveredImageArcsec, sourceWidthArcsec } from './imageQuality'
import { moffatInCircle, moffatInRectangle } from './moffat'
import { skyAbArcsec2 } from './skyBrightness'
import { airTransmission, efficiencyAt, efficiencyIntegral } from './throughput'
import type { Conditions, ModeRecord, SnrPer, Source } from './types'

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
  /** Share of the source, and pixels, inside an aperture of a radius (half height along a slit), arcseconds. */
  aperture(radius: number): { share: number; continuum: number; pixels: number }
}

const CM2_PER_M2 = 1e4

function middleOf(mode: ModeRecord): number {
  return 0.5 * (mode.wavelengthMinA + mode.wavelengthMaxA)
}

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

/** Rates of a source through a mode under conditions. */
export function computeRates(mode: ModeRecord, source: Source, conditions: Conditions, per: SnrPer): Rates {
  const wavelengthA = source.wavelengthA ?? middleOf(mode)
  check(mode, source, wavelengthA)
  const { site, airmass } = conditions
  const pointArcsec = deliveredImageArcsec({
    seeingArcsec: conditions.seeingArcsec,
    airmass,
    wavelengthA,
    collectingAreaM2: mode.collectingAreaM2,
    opticsArcsec: mode.opticsArcsec,
  })
  const imageArcsec = sourceWidthArcsec(pointArcsec, source.geometry)
  const computed = skyAbArcsec2(site, wavelengthA, mode.band, conditions.moon, airmass)
  const sky = conditions.skyAbArcsec2 ?? computed.ab
  const areaCm2 = mode.collectingAreaM2 * CM2_PER_M2
  const air = airTransmission(mode, site, wavelengthA, airmass) * (conditions.transparency ?? 1)
  const shared = { wavelengthA, imageArcsec, skyAbArcsec2: sky, skyBand: computed.band }
  const pixel = mode.pixelScaleArcsec
  const uniformArea = source.geometry.kind === 'uniform' ? source.geometry.areaArcsec2 : null

  if (mode.kind === 'imaging') {
    // Photons of AB magnitude 0 through the whole band, then electrons.
    const zero = (areaCm2 * AB_ZERO_ERG * efficiencyIntegral(mode)) / PLANCK_ERG_S
    const line = source.kind === 'line'
    const sourceWhole = line
      ? areaCm2 * efficiencyAt(mode, wavelengthA) * linePhotonRate(source.fluxErgSCm2, wavelengthA) * air
      : zero * 10 ** (-0.4 * source.ab) * air
    const continuumWhole =
      line && source.continuumAb !== undefined ? zero * 10 ** (-0.4 * source.continuumAb) * air : 0
    const skyPerPixel = zero * 10 ** (-0.4 * sky) * pixel * pixel
    const inPixel =
      uniformArea === null ? moffatInCircle(imageArcsec, pixel / Math.sqrt(Math.PI)) : pixel * pixel
    return {
      ...shared,
      sourceWhole,
      skyPerPixel,
      peakPixel: (sourceWhole + continuumWhole) * inPixel + skyPerPixel,
      aperture(radius) {
        const share = uniformArea ?? moffatInCircle(imageArcsec, radius)
        const arcsec2 = uniformArea ?? Math.PI * radius * radius
        return { share, continuum: continuumWhole * share, pixels: Math.max(1, arcsec2 / (pixel * pixel)) }
      },
    }
  }

  const { dispersionAPerPixel: dispersion, slitWidthArcsec: slit, resolvingPower } = mode
  if (!dispersion || !slit || !resolvingPower) {
    throw new ScienceError(
      'bad-mode',
      'A long-slit mode needs a dispersion, a slit width and a resolving power.',
    )
  }
  const element = wavelengthA / resolvingPower
  const widths = { image: element, pixel: dispersion, angstrom: 1, 'resolution-element': element }
  const lineA =
    source.kind === 'line' ? Math.hypot(element, (wavelengthA * source.widthKmS) / SPEED_OF_LIGHT_KM_S) : null
  // A line is summed over twice its width, 98 % of a Gaussian; a continuum over the stretch asked for.
  const stretchA = lineA === null ? widths[per] : 2 * lineA
  const efficiency = efficiencyAt(mode, wavelengthA)
  const perAngstrom = (ab: number): number => areaCm2 * efficiency * abPhotonRate(ab, wavelengthA)
  const continuumPerA =
    source.kind === 'magnitude'
      ? perAngstrom(source.ab) * air
      : source.continuumAb === undefined
        ? 0
        : perAngstrom(source.continuumAb) * air
  const sourceWhole =
    source.kind === 'magnitude'
      ? continuumPerA * stretchA
      : 0.981 * areaCm2 * efficiency * linePhotonRate(source.fluxErgSCm2, wavelengthA) * air
  const skyPerPixel = perAngstrom(sky) * slit * pixel * dispersion
  const slitCounted = mode.throughputIncludes.includes('slit')
  const through = (half: number): number =>
    uniformArea !== null
      ? slit * 2 * half
      : moffatInRectangle(imageArcsec, slitCounted ? 20 * imageArcsec : slit / 2, half)
  const peakLine = lineA === null ? 0 : (sourceWhole * dispersion) / (1.064 * lineA)
  return {
    ...shared,
    sourceWhole,
    skyPerPixel,
    peakPixel: (continuumPerA * dispersion + peakLine) * through(pixel / 2) + skyPerPixel,
    aperture(radius) {
      const half = uniformArea === null ? radius : uniformArea / slit / 2
      const share = through(half)
      const pixels = Math.max(1, (2 * half) / pixel) * Math.max(1, stretchA / dispersion)
      const continuum = source.kind === 'line' ? continuumPerA * stretchA * share : 0
      return { share, continuum, pixels }
    },
  }
}
