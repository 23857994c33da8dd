import { mixtureOf, type Mixture } from './mixture'

/** Wings of the seeing profile: 2.5 to 4 fits most telescopes (Trujillo et al. 2001, MNRAS 328, 977). */
export const MOFFAT_BETA = 3

const STEP = 0.5
const FROM = -11
const TO = 3.6

/**
 * A Moffat profile (1 + r^2/alpha^2)^-beta of a full width at half maximum, arcseconds, as Gaussians. By the
 * integral of the gamma function the profile is a mixture of Gaussians of variance alpha^2 / 2t with t spread as
 * t^(beta-2) exp(-t); steps even in ln t converge exponentially. The light inside any circle is good to 1e-5.
 */
export function moffatMixture(fwhm: number, beta = MOFFAT_BETA): Mixture {
  const alpha = fwhm / (2 * Math.sqrt(2 ** (1 / beta) - 1))
  const parts = []
  for (let u = FROM; u <= TO; u += STEP) {
    const t = Math.exp(u)
    parts.push({ share: t ** (beta - 1) * Math.exp(-t), variance: (alpha * alpha) / (2 * t) })
  }
  return mixtureOf(parts)
}
