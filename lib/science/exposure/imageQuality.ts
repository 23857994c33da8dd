import { ScienceError } from '../ScienceError'

/** Outer scale of the turbulence, metres, a common median. */
const OUTER_SCALE_M = 20
const ARCSEC = 206_264.806

/**
 * Full width at half maximum of a point as delivered, arcseconds: seeing at the zenith and 500 nm grows as
 * X^0.6 and lambda^-0.2, shrinks by the outer scale (Tokovinin 2002, PASP 114, 1156, eq. 19), and meets
 * optics and diffraction in quadrature.
 */
export function deliveredImageArcsec(input: {
  seeingArcsec: number
  airmass: number
  wavelengthA: number
  collectingAreaM2: number
  opticsArcsec?: number
}): number {
  const { seeingArcsec, airmass, wavelengthA } = input
  if (!(seeingArcsec > 0 && seeingArcsec <= 20)) {
    throw new ScienceError('outside-range', 'The seeing lies above 0 and below 20 arcseconds.')
  }
  if (!(airmass >= 1 && airmass <= 40)) {
    throw new ScienceError('outside-range', 'An airmass lies between 1 and 40.')
  }
  const kolmogorov = seeingArcsec * airmass ** 0.6 * (wavelengthA / 5000) ** -0.2
  const r0 = (0.976 * wavelengthA * 1e-10 * ARCSEC) / kolmogorov
  const shrink = 1 - 2.183 * (r0 / OUTER_SCALE_M) ** 0.356
  const air = kolmogorov * Math.sqrt(Math.max(shrink, 0))
  const diameterM = 2 * Math.sqrt(input.collectingAreaM2 / Math.PI)
  const diffraction = (1.03 * wavelengthA * 1e-10 * ARCSEC) / diameterM
  return Math.hypot(air, diffraction, input.opticsArcsec ?? 0)
}
