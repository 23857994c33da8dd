import { slot } from '../../numeric/slot'
import { erf } from '../../numeric/erf'

/**
 * A round image as a sum of Gaussians: their shares of the light, which sum to 1, and variances along one
 * axis, arcseconds squared. Convolution adds variances, and every aperture has a closed form.
 */
export interface Mixture {
  readonly shares: Float64Array
  readonly variances: Float64Array
}

/** The mixture of some parts with any weights, brought to a sum of 1; parts too faint to matter are dropped. */
export function mixtureOf(parts: readonly { share: number; variance: number }[], least = 1e-7): Mixture {
  const whole = parts.reduce((sum, { share }) => sum + share, 0)
  const kept = parts.filter(({ share }) => share > least * whole)
  const sum = kept.reduce((total, { share }) => total + share, 0)
  return {
    shares: Float64Array.from(kept, ({ share }) => share / sum),
    variances: Float64Array.from(kept, ({ variance }) => variance),
  }
}

/** Share of the light inside a centred circle, radius in arcseconds: sum of w (1 - exp(-r^2 / 2 s^2)). */
export function inCircle({ shares, variances }: Mixture, radius: number): number {
  let sum = 0
  const r2 = 0.5 * radius * radius
  for (let i = 0; i < shares.length; i += 1) sum -= slot(shares, i) * Math.expm1(-r2 / slot(variances, i))
  return sum
}

/**
 * Share of the light inside a rectangle, from its half sides in arcseconds; the image may lie off its middle
 * across the width by `offset`, as atmospheric dispersion puts it.
 */
export function inRectangle(
  { shares, variances }: Mixture,
  halfWidth: number,
  halfHeight: number,
  offset = 0,
): number {
  let sum = 0
  for (let i = 0; i < shares.length; i += 1) {
    const scale = 1 / Math.sqrt(2 * slot(variances, i))
    const across = 0.5 * (erf((halfWidth + offset) * scale) + erf((halfWidth - offset) * scale))
    sum += slot(shares, i) * across * erf(halfHeight * scale)
  }
  return sum
}

/** Share of the light an arcsecond squared at a radius, arcseconds. */
export function surfaceShare({ shares, variances }: Mixture, radius: number): number {
  let sum = 0
  for (let i = 0; i < shares.length; i += 1) {
    const variance = slot(variances, i)
    sum += (slot(shares, i) / (2 * Math.PI * variance)) * Math.exp((-0.5 * radius * radius) / variance)
  }
  return sum
}
