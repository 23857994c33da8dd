import { MPC_KM } from '../constants'
import type { Cosmology } from '../cosmology'
import { ScienceError } from '../ScienceError'

export interface LightInput {
  readonly cosmology: Cosmology
  readonly z: number
  /** Absolute AB magnitude, the rest band being the observed one. */
  readonly absoluteMagnitudeAb?: number
  /** f_nu ~ nu^alpha; 0 (flat in f_nu) when not given. */
  readonly spectralIndex?: number
  readonly lineLuminosityErgS?: number
  /** Proper size. */
  readonly sizeKpc?: number
  readonly restWavelengthsA?: readonly number[]
}

export interface ObservedLight {
  readonly apparentMagnitudeAb: number | null
  readonly kCorrectionMag: number
  readonly lineFluxErgSCm2: number | null
  readonly angularSizeArcsec: number | null
  readonly observedWavelengthsA: number[]
  /** Bolometric dimming of surface brightness, 10 log10(1+z). */
  readonly dimmingMag: number
}

/** K correction of a power law in one band, K = -2.5 (1 + alpha) log10(1+z) (Hogg et al. 2002, eq. 12). */
export function powerLawK(z: number, spectralIndex: number): number {
  return -2.5 * (1 + spectralIndex) * Math.log10(1 + z)
}

/** Flux of a line, erg/s/cm^2, from its luminosity, erg/s: L / (4 pi D_L^2). */
export function lineFlux(luminosityErgS: number, luminosityMpc: number): number {
  const cm = luminosityMpc * MPC_KM * 1e5
  return luminosityErgS / (4 * Math.PI * cm * cm)
}

/** What reaches us of a source at redshift z > 0: m = M + mu + K; sizes, wavelengths, line flux. */
export function observeLight(input: LightInput): ObservedLight {
  const { cosmology, z } = input
  const scale = cosmology.kpcPerArcsec(z)
  if (!(scale > 0))
    throw new ScienceError('bad-redshift', 'What is seen at a distance needs a redshift above 0.')
  const kCorrectionMag = powerLawK(z, input.spectralIndex ?? 0)
  return {
    apparentMagnitudeAb:
      input.absoluteMagnitudeAb === undefined
        ? null
        : input.absoluteMagnitudeAb + cosmology.distanceModulusMag(z) + kCorrectionMag,
    kCorrectionMag,
    lineFluxErgSCm2:
      input.lineLuminosityErgS === undefined
        ? null
        : lineFlux(input.lineLuminosityErgS, cosmology.luminosityMpc(z)),
    angularSizeArcsec: input.sizeKpc === undefined ? null : input.sizeKpc / scale,
    observedWavelengthsA: (input.restWavelengthsA ?? []).map((rest) => rest * (1 + z)),
    dimmingMag: cosmology.dimmingMag(z),
  }
}
