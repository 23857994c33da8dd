import { ScienceError } from '../ScienceError'
import { naturalSpline, type Spline } from '../numeric/naturalSpline'

export type DustLaw = 'F99' | 'CCM89'

/** The map of Schlegel, Finkbeiner & Davis 1998 reads high by this much (Schlafly & Finkbeiner 2011, section 5). */
export const SFD_RECALIBRATION = 0.86

export interface Dust {
  /** Reddening E(B-V) of the Galaxy on this line of sight, magnitudes. */
  readonly ebv: number
  /** Read from the SFD map, and so to be recalibrated; not for values that are already. */
  readonly isSfd: boolean
  readonly law: DustLaw
  readonly rv?: number
}

const FROM_A = 1000
const TO_A = 33_000

/** A(lambda)/E(B-V) of Fitzpatrick 1999 (PASP 111, 63): a spline through table 3, the FM curve in the ultraviolet. */
function fitzpatrick(rv: number): Spline {
  const ultraviolet = (x: number): number => {
    const [x0, gamma, c3] = [4.596, 0.99, 3.23]
    const c2 = -0.824 + 4.717 / rv
    const c1 = 2.03 - 3.007 * c2
    const drude = (x * x) / ((x * x - x0 * x0) ** 2 + (x * gamma) ** 2)
    return rv + c1 + c2 * x + c3 * drude
  }
  const anchors: [number, number][] = [
    [0, 0],
    [1 / 2.65, (0.265 * rv) / 3.1],
    [1 / 1.22, (0.829 * rv) / 3.1],
    [1 / 0.6, -0.426 + 1.0044 * rv],
    [1 / 0.547, -0.05 + 1.0016 * rv],
    [1 / 0.467, 0.701 + 1.0016 * rv],
    [1 / 0.411, 1.208 + 1.0032 * rv - 0.00033 * rv * rv],
    [1 / 0.27, ultraviolet(1 / 0.27)],
    [1 / 0.26, ultraviolet(1 / 0.26)],
  ]
  const spline = naturalSpline(anchors)
  return (x) => (x <= 1 / 0.27 ? spline(x) : ultraviolet(x) + (x > 5.9 ? farRise(x) : 0))
}

/** The far-ultraviolet rise of the FM curve. */
function farRise(x: number): number {
  const y = x - 5.9
  return 0.41 * (0.5392 * y * y + 0.05644 * y * y * y)
}

const polynomial = (coefficients: readonly number[], y: number): number =>
  coefficients.reduceRight((sum, coefficient) => sum * y + coefficient, 0)

/** A(lambda)/A(V) of Cardelli, Clayton & Mathis 1989 (ApJ 345, 245), eqs. 2 to 4; x is the inverse micrometre. */
function cardelli(x: number, rv: number): number {
  if (x < 1.1) return 0.574 * x ** 1.61 - (0.527 * x ** 1.61) / rv
  if (x <= 3.3) {
    const y = x - 1.82
    const a = polynomial([1, 0.17699, -0.50447, -0.02427, 0.72085, 0.01979, -0.7753, 0.32999], y)
    const b = polynomial([0, 1.41338, 2.28305, 1.07233, -5.38434, -0.62251, 5.3026, -2.09002], y)
    return a + b / rv
  }
  const rise = x > 5.9 ? x - 5.9 : 0
  const fa = -0.04473 * rise ** 2 - 0.009779 * rise ** 3
  const fb = 0.213 * rise ** 2 + 0.1207 * rise ** 3
  const a = 1.752 - 0.316 * x - 0.104 / ((x - 4.67) ** 2 + 0.341) + fa
  const b = -3.09 + 1.825 * x + 1.206 / ((x - 4.62) ** 2 + 0.263) + fb
  return a + b / rv
}

const splines = new Map<number, Spline>()

function fitzpatrickOf(rv: number): Spline {
  const known = splines.get(rv) ?? fitzpatrick(rv)
  if (splines.size > 16) splines.clear()
  splines.set(rv, known)
  return known
}

/**
 * Magnitudes the dust of the Galaxy takes at an observed wavelength, angstroms, 1,000 to 33,000. By Fitzpatrick 1999
 * or Cardelli, Clayton & Mathis 1989, R_V 3.1 when not given. Throws a ScienceError outside those ranges.
 */
export function extinctionMag(dust: Dust, wavelengthA: number): number {
  const { ebv, law, rv = 3.1 } = dust
  if (!(ebv >= 0 && ebv <= 10))
    throw new ScienceError('bad-source', 'A reddening E(B−V) lies between 0 and 10 magnitudes.')
  if (!(rv >= 2 && rv <= 6)) throw new ScienceError('bad-parameter', 'R_V lies between 2 and 6.')
  if (!(wavelengthA >= FROM_A && wavelengthA <= TO_A))
    throw new ScienceError('outside-range', 'The law of reddening reaches from 1,000 Å to 33,000 Å.')
  const x = 1e4 / wavelengthA
  const reddening = dust.isSfd ? SFD_RECALIBRATION * ebv : ebv
  return reddening * (law === 'F99' ? fitzpatrickOf(rv)(x) : rv * cardelli(x, rv))
}
