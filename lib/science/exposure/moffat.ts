import { integrate } from '../numeric/gaussLegendre'

/** Wings of the seeing profile: 2.5 to 4 fits most telescopes (Trujillo et al. 2001, MNRAS 328, 977). */
export const MOFFAT_BETA = 3

/** Scale radius of a Moffat profile of a full width at half maximum. */
function scaleRadius(fwhm: number, beta: number): number {
  return fwhm / (2 * Math.sqrt(2 ** (1 / beta) - 1))
}

/** Share of the light inside a centred circle: 1 - (1 + r^2/alpha^2)^(1-beta). */
export function moffatInCircle(fwhm: number, radius: number, beta = MOFFAT_BETA): number {
  const alpha = scaleRadius(fwhm, beta)
  return 1 - (1 + (radius / alpha) ** 2) ** (1 - beta)
}

/** Share of the light inside a centred rectangle, from its half sides, by Gauss-Legendre over a quarter. */
export function moffatInRectangle(
  fwhm: number,
  halfWidth: number,
  halfHeight: number,
  beta = MOFFAT_BETA,
): number {
  const alpha = scaleRadius(fwhm, beta)
  const peak = (beta - 1) / (Math.PI * alpha * alpha)
  const strip = (x: number): number =>
    integrate((y) => (1 + (x * x + y * y) / (alpha * alpha)) ** -beta, 0, halfHeight)
  return 4 * peak * integrate(strip, 0, halfWidth)
}

/** Full width at half maximum of a Moffat profile with half its light inside a radius. */
export function widthOfHalfLight(radius: number, beta = MOFFAT_BETA): number {
  return (2 * radius * Math.sqrt(2 ** (1 / beta) - 1)) / Math.sqrt(2 ** (1 / (beta - 1)) - 1)
}
