import { SPEED_OF_LIGHT_KM_S } from '../constants'
import { abPhotonRate, linePhotonRate } from '../light'
import { ScienceError } from '../ScienceError'
import type { RatesInput, RatesOfKind } from './imagingRates'
import { inRectangle } from './image/mixture'
import { efficiencyAt } from './throughput'
import type { SnrPer } from './types'

const CM2_PER_M2 = 1e4
/** A Gaussian line is summed over twice its full width, which holds this share of it. */
const LINE_SHARE = 0.981
/** Peak of a Gaussian of unit area times its full width, inverted. */
const GAUSSIAN_WIDTH = 1.064
/** Half width of a slit whose losses the throughput table has counted already, arcseconds. */
const WIDE_OPEN = 300

/** Electrons a second through a slit, summed along it and over a stretch of the spectrum. */
export function slitRates(input: RatesInput & { per: SnrPer; offArcsec: number }): RatesOfKind {
  const { mode, source, light, wavelengthA, air, skyAbArcsec2, per, offArcsec } = input
  const { dispersionAPerPixel: dispersion, slitWidthArcsec: slit, resolvingPower, pixelScaleArcsec } = mode
  if (!dispersion || !slit || !resolvingPower) {
    throw new ScienceError(
      'bad-mode',
      'A long-slit mode needs a dispersion, a slit width and a resolving power.',
    )
  }
  const areaCm2 = mode.collectingAreaM2 * CM2_PER_M2
  const elementA = wavelengthA / resolvingPower
  const widths = { image: elementA, pixel: dispersion, angstrom: 1, 'resolution-element': elementA }
  const lineA =
    source.kind === 'line'
      ? Math.hypot(elementA, (wavelengthA * source.widthKmS) / SPEED_OF_LIGHT_KM_S)
      : null
  const stretchA = lineA === null ? widths[per] : 2 * lineA
  const efficiency = efficiencyAt(mode, wavelengthA)
  const perAngstrom = (ab: number): number => areaCm2 * efficiency * abPhotonRate(ab, wavelengthA)
  const continuumAb = source.kind === 'line' ? source.continuumAb : source.ab
  const continuumPerA = continuumAb === undefined ? 0 : air * perAngstrom(continuumAb)
  const sourceWhole =
    source.kind === 'line'
      ? LINE_SHARE * areaCm2 * efficiency * linePhotonRate(source.fluxErgSCm2, wavelengthA) * air
      : continuumPerA * stretchA
  const skyPerPixel =
    perAngstrom(skyAbArcsec2) * slit * pixelScaleArcsec * dispersion + (mode.thermalEPerS ?? 0)
  const isCounted = mode.throughputIncludes.includes('slit')
  const through = (half: number): number => {
    if (!light) return slit * 2 * half
    return inRectangle(light, isCounted ? WIDE_OPEN : slit / 2, half, isCounted ? 0 : offArcsec)
  }
  const peakLine = lineA === null ? 0 : (sourceWhole * dispersion) / (GAUSSIAN_WIDTH * lineA)
  const uniformHalf = source.geometry.kind === 'uniform' ? source.geometry.areaArcsec2 / slit / 2 : null
  return {
    sourceWhole,
    skyPerPixel,
    peakPixel: (continuumPerA * dispersion + peakLine) * through(pixelScaleArcsec / 2) + skyPerPixel,
    aperture(radius) {
      const half = uniformHalf ?? radius
      const share = through(half)
      const pixels = Math.max(1, (2 * half) / pixelScaleArcsec) * Math.max(1, stretchA / dispersion)
      return { share, continuum: source.kind === 'line' ? continuumPerA * stretchA * share : 0, pixels }
    },
  }
}
