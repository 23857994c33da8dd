import { ScienceError } from '../ScienceError'

/** How many are expected, and by how much that will differ from field to field: one standard deviation each. */
export interface ExpectedCount {
  readonly count: number
  /** Of counting alone, the root of the count. */
  readonly poisson: number
  /** Of how galaxies cluster; 0 where no cosmic variance is given. */
  readonly cosmic: number
  /** Both in quadrature. */
  readonly together: number
}

/**
 * Count of objects of a comoving number density, Mpc^-3, in a volume, Mpc^3: N = n V, with root N of counting and
 * sigma_gal N of clustering (sigma_gal as a share of the count). Throws a ScienceError for what is negative or no number.
 */
export function expectedCount(volumeMpc3: number, densityMpc3: number, variance = 0): ExpectedCount {
  if (!(densityMpc3 >= 0 && densityMpc3 <= 1e6))
    throw new ScienceError('bad-parameter', 'A number density lies between 0 and 1,000,000 per Mpc³.')
  if (!(volumeMpc3 >= 0 && volumeMpc3 < Infinity))
    throw new ScienceError('bad-parameter', 'A volume is 0 or more.')
  if (!(variance >= 0 && variance < Infinity))
    throw new ScienceError('bad-parameter', 'A variance is 0 or more.')
  const count = densityMpc3 * volumeMpc3
  const [poisson, cosmic] = [Math.sqrt(count), variance * count]
  return { count, poisson, cosmic, together: Math.hypot(poisson, cosmic) }
}
