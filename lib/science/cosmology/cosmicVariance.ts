import { ScienceError } from '../ScienceError'

/**
 * Fields of growing area whose dark matter was measured: UDF, GOODS, GEMS, COSMOS. Coefficients of Moster et al. 2011,
 * table 3, as two independent transcriptions have them; the sides of the fields (3.3', 10' by 16', 28', 84') from memory
 * of their table 1. The long EGS strip is left out.
 */
const udf = { areaArcmin2: 3.3 * 3.3, sigmaA: 0.251, sigmaB: 0.364, beta: 0.358 }
const goods = { areaArcmin2: 10 * 16, sigmaA: 0.261, sigmaB: 0.854, beta: 0.684 }
const gems = { areaArcmin2: 28 * 28, sigmaA: 0.161, sigmaB: 0.52, beta: 0.729 }
const cosmos = { areaArcmin2: 84 * 84, sigmaA: 0.069, sigmaB: 0.234, beta: 0.834 }
const neighbours = [
  [udf, goods],
  [goods, gems],
  [gems, cosmos],
] as const

/** b0, b1, b2 of the bias by the logarithm of the stellar mass in solar masses: Moster et al. 2011, table 4. */
const biases = {
  '8.5-9.0': [0.062, 2.59, 1.025],
  '9.0-9.5': [0.074, 2.58, 1.039],
  '9.5-10.0': [0.042, 3.17, 1.147],
  '10.0-10.5': [0.053, 3.07, 1.225],
  '10.5-11.0': [0.069, 3.19, 1.269],
  '11.0-11.5': [0.173, 2.89, 1.438],
  'above-11.0': [0.185, 2.86, 1.448],
} as const

/** Galaxies by the logarithm of their stellar mass in solar masses. */
export type StellarMass = keyof typeof biases
export const stellarMasses = Object.keys(biases) as StellarMass[]

export interface VarianceInput {
  readonly areaDeg2: number
  readonly zMin: number
  readonly zMax: number
  readonly stellarMass: StellarMass
}

const ARCMIN2_PER_DEG2 = 3600
/** Where the fits hold, from memory of the paper; shells thinner than this are no longer independent of each other. */
const MEAN_Z = [0.1, 3.5] as const
const THINNEST = 0.1

const outside = (sentence: string): ScienceError => new ScienceError('outside-range', sentence)

function check({ areaDeg2, zMin, zMax }: VarianceInput): void {
  const arcmin2 = areaDeg2 * ARCMIN2_PER_DEG2
  if (!(arcmin2 >= udf.areaArcmin2 * (1 - 1e-9) && arcmin2 <= cosmos.areaArcmin2 * (1 + 1e-9)))
    throw outside('Cosmic variance is known for areas from 11 square arcminutes to 1.96 square degrees.')
  const mean = 0.5 * (zMin + zMax)
  if (!(zMin >= 0 && zMax - zMin >= THINNEST * (1 - 1e-9)))
    throw outside('Cosmic variance is known for shells of 0.1 in redshift or more.')
  if (!(mean >= MEAN_Z[0] && mean <= MEAN_Z[1]))
    throw outside('Cosmic variance is known for mean redshifts from 0.1 to 3.5.')
}

/** Root variance of dark matter in a field for a shell of 0.2: Moster et al. 2011, eq. 10. */
const ofField = ({ sigmaA, sigmaB, beta }: typeof udf, meanZ: number): number =>
  sigmaA / (meanZ ** beta + sigmaB)

/** The same for any area between those of the fields, as a power of the area from one to the next. */
function darkMatter(areaArcmin2: number, meanZ: number): number {
  const [low, high] = neighbours.find(([, next]) => areaArcmin2 <= next.areaArcmin2) ?? [gems, cosmos]
  const share = Math.log(areaArcmin2 / low.areaArcmin2) / Math.log(high.areaArcmin2 / low.areaArcmin2)
  return ofField(low, meanZ) ** (1 - share) * ofField(high, meanZ) ** share
}

/**
 * Root cosmic variance of galaxies over their mean count, sigma_gal = b(m*, z) sigma_dm(z) (Moster et al. 2011, ApJ
 * 731, 113, eqs. 10 to 13): b = b0 (1 + z)^b1 + b2 and sigma_dm as the root of 0.2 over the depth in redshift. Between
 * the areas of its fields sigma_dm is interpolated here as a power of the area, for fields about as long as wide.
 * Good to some tens of percent. Throws a ScienceError outside 10.9 arcmin^2 to 1.96 deg^2, mean redshifts of 0.1 to 3.5
 * and for shells thinner than 0.1.
 */
export function cosmicVariance(input: VarianceInput): number {
  check(input)
  const { areaDeg2, zMin, zMax, stellarMass } = input
  const meanZ = 0.5 * (zMin + zMax)
  const [b0, b1, b2] = biases[stellarMass]
  const bias = b0 * (1 + meanZ) ** b1 + b2
  const dark = darkMatter(areaDeg2 * ARCMIN2_PER_DEG2, meanZ)
  return bias * dark * Math.sqrt(0.2 / (zMax - zMin))
}
