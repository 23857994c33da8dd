import { PLANCK_ERG_S } from '../constants'
import { linePhotonRate } from '../light'
import { AB_ZERO_ERG } from '../light/magnitudes'
import { inCircle, type Mixture } from './image/mixture'
import type { Rates } from './rates'
import { efficiencyAt, efficiencyIntegral } from './throughput'
import type { ModeRecord, Source } from './types'

const CM2_PER_M2 = 1e4

/** What both kinds of rates start from. */
export interface RatesInput {
  readonly mode: ModeRecord
  readonly source: Source
  /** Null for a source as bright everywhere. */
  readonly light: Mixture | null
  readonly wavelengthA: number
  /** Share of the light that air and clouds let through. */
  readonly air: number
  readonly skyAbArcsec2: number
}

export type RatesOfKind = Pick<Rates, 'sourceWhole' | 'skyPerPixel' | 'peakPixel' | 'aperture'>

/** Electrons a second through a filter: photons of the whole band, summed over a circle. */
export function imagingRates({
  mode,
  source,
  light,
  wavelengthA,
  air,
  skyAbArcsec2,
}: RatesInput): RatesOfKind {
  const areaCm2 = mode.collectingAreaM2 * CM2_PER_M2
  const pixel2 = mode.pixelScaleArcsec ** 2
  const zero = (areaCm2 * AB_ZERO_ERG * efficiencyIntegral(mode)) / PLANCK_ERG_S
  const ofMagnitude = (ab: number): number => zero * 10 ** (-0.4 * ab)
  const sourceWhole =
    air *
    (source.kind === 'line'
      ? areaCm2 * efficiencyAt(mode, wavelengthA) * linePhotonRate(source.fluxErgSCm2, wavelengthA)
      : ofMagnitude(source.ab))
  const continuumAb = source.kind === 'line' ? source.continuumAb : undefined
  const continuumWhole = continuumAb === undefined ? 0 : air * ofMagnitude(continuumAb)
  const skyPerPixel = ofMagnitude(skyAbArcsec2) * pixel2 + (mode.thermalEPerS ?? 0)
  const uniformArea = source.geometry.kind === 'uniform' ? source.geometry.areaArcsec2 : 0
  const inPixel = light ? inCircle(light, Math.sqrt(pixel2 / Math.PI)) : pixel2
  return {
    sourceWhole,
    skyPerPixel,
    peakPixel: (sourceWhole + continuumWhole) * inPixel + skyPerPixel,
    aperture(radius) {
      const share = light ? inCircle(light, radius) : uniformArea
      const arcsec2 = light ? Math.PI * radius * radius : uniformArea
      return { share, continuum: continuumWhole * share, pixels: Math.max(1, arcsec2 / pixel2) }
    },
  }
}
