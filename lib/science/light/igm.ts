import { slot } from '../numeric/slot'

/** Wavelength of the Lyman limit, angstroms. */
export const LYMAN_LIMIT_A = 911.75

// Inoue et al. 2014 (MNRAS 442, 1805), table 2: Lyman alpha to the 40th level, at the lowest redshifts. The other two
// columns of the forest, and the other one of the damped systems, are these times a constant.
// prettier-ignore
const forest = Float64Array.of(
  1.69e-2, 4.692e-3, 2.239e-3, 1.319e-3, 8.707e-4, 6.178e-4, 4.609e-4, 3.569e-4, 2.843e-4, 2.318e-4, 1.923e-4,
  1.622e-4, 1.385e-4, 1.196e-4, 1.043e-4, 9.174e-5, 8.128e-5, 7.251e-5, 6.505e-5, 5.868e-5, 5.319e-5, 4.843e-5,
  4.427e-5, 4.063e-5, 3.738e-5, 3.454e-5, 3.199e-5, 2.971e-5, 2.766e-5, 2.582e-5, 2.415e-5, 2.263e-5, 2.126e-5,
  2e-5, 1.885e-5, 1.78e-5, 1.682e-5, 1.593e-5, 1.51e-5,
)
// prettier-ignore
const damped = Float64Array.of(
  1.617e-4, 1.545e-4, 1.498e-4, 1.46e-4, 1.429e-4, 1.402e-4, 1.381e-4, 1.363e-4, 1.348e-4, 1.338e-4, 1.327e-4,
  1.319e-4, 1.313e-4, 1.307e-4, 1.303e-4, 1.299e-4, 1.296e-4, 1.293e-4, 1.291e-4, 1.289e-4, 1.287e-4, 1.286e-4,
  1.284e-4, 1.283e-4, 1.282e-4, 1.281e-4, 1.281e-4, 1.28e-4, 1.279e-4, 1.279e-4, 1.278e-4, 1.278e-4, 1.277e-4,
  1.277e-4, 1.277e-4, 1.276e-4, 1.276e-4, 1.276e-4, 1.275e-4,
)
/** Second and third column of the forest over the first; second of the damped systems over its first. */
const FOREST_2 = 2.354e-3 / 1.69e-2
const FOREST_3 = 1.026e-4 / 1.69e-2
const DAMPED_2 = 1.545e-4 / 1.617e-4

/** Optical depth of the Lyman lines at an observed wavelength (eqs. 21 and 22). */
function linesDepth(z: number, wavelengthA: number): number {
  let depth = 0
  for (let i = 0; i < forest.length; i += 1) {
    const level = (i + 2) * (i + 2)
    const x = wavelengthA / ((LYMAN_LIMIT_A * level) / (level - 1))
    if (x < 1 || x >= 1 + z) continue
    const a = slot(forest, i)
    depth += x < 2.2 ? a * x ** 1.2 : x < 5.7 ? a * FOREST_2 * x ** 3.7 : a * FOREST_3 * x ** 5.5
    depth += x < 3 ? slot(damped, i) * x ** 2 : slot(damped, i) * DAMPED_2 * x ** 3
  }
  return depth
}

/** Optical depth of the Lyman continuum of the forest (eqs. 25 to 27); x is the wavelength over the limit. */
function forestContinuum(z: number, x: number): number {
  const far = 1 + z
  if (z < 1.2) return 0.325 * (x ** 1.2 - far ** -0.9 * x ** 2.1)
  if (z < 4.7) {
    const near = 2.55e-2 * far ** 1.6 * x ** 2.1
    return x < 2.2 ? near + 0.325 * x ** 1.2 - 0.25 * x ** 2.1 : near - 2.55e-2 * x ** 3.7
  }
  const near = 5.22e-4 * far ** 3.4 * x ** 2.1
  if (x < 2.2) return near + 0.325 * x ** 1.2 - 3.14e-2 * x ** 2.1
  return x < 5.7 ? near + 0.218 * x ** 2.1 - 2.55e-2 * x ** 3.7 : near - 5.22e-4 * x ** 5.5
}

/** Optical depth of the Lyman continuum of the damped systems (eqs. 28 and 29). */
function dampedContinuum(z: number, x: number): number {
  const far = 1 + z
  if (z < 2) return 0.211 * far ** 2 - 7.66e-2 * far ** 2.3 * x ** -0.3 - 0.135 * x ** 2
  const near = 4.7e-2 * far ** 3 - 1.78e-2 * far ** 3.3 * x ** -0.3
  return x < 3 ? near + 0.634 - 0.135 * x ** 2 - 0.291 * x ** -0.3 : near - 2.92e-2 * x ** 3
}

/**
 * Mean share of the light of a source at redshift z that the intergalactic medium lets through at an observed
 * wavelength, angstroms: lines and continuum of the Lyman alpha forest and the damped systems (Inoue et al. 2014).
 * No hard edge at the Lyman limit. A mean over many lines of sight: a single one scatters widely, and past z = 6 the
 * forest is extrapolated.
 */
export function igmTransmission(z: number, wavelengthA: number): number {
  const x = wavelengthA / LYMAN_LIMIT_A
  const continuum = x > 1 && x < 1 + z ? forestContinuum(z, x) + dampedContinuum(z, x) : 0
  return Math.exp(-linesDepth(z, wavelengthA) - Math.max(0, continuum))
}

/** The same through a band, for a source flat in f_nu: the mean over ln(wavelength) between two ends, angstroms. */
export function igmInBand(z: number, fromA: number, toA: number): number {
  const steps = 400
  let sum = 0
  for (let i = 0; i < steps; i += 1) sum += igmTransmission(z, fromA * (toA / fromA) ** ((i + 0.5) / steps))
  return sum / steps
}

/** Observed wavelengths, angstroms, growing, at which the mean transmission to redshift z steps most: limit and lines. */
export function lymanKnotsA(z: number): number[] {
  const levels = [8, 7, 6, 5, 4, 3, 2].map((level) => (level * level) / (level * level - 1))
  return [1, ...levels].map((over) => LYMAN_LIMIT_A * over * (1 + z))
}
