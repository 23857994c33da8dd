import type { CosmologyParameters } from './parameters'
import type { Universe } from './universe'

/** Quantities that need one redshift and give one number. */
export const cosmologyQuantities = [
  'E',
  'hubbleKmSMpc',
  'comovingMpc',
  'transverseComovingMpc',
  'angularDiameterMpc',
  'luminosityMpc',
  'distanceModulusMag',
  'lookbackGyr',
  'ageGyr',
  'comovingVolumeMpc3',
  'differentialVolumeMpc3Sr',
  'kpcPerArcsec',
  'kpcComovingPerArcsec',
  'criticalDensityGCm3',
  'Om',
  'Ode',
  'Ok',
  'Or',
  'q',
  'dimmingMag',
  'timeDilation',
] as const

export type CosmologyQuantity = (typeof cosmologyQuantities)[number]

/** Quantities a redshift can be found from. */
export type InvertibleQuantity =
  'lookbackGyr' | 'ageGyr' | 'comovingMpc' | 'luminosityMpc' | 'angularDiameterMpc' | 'distanceModulusMag'

/**
 * One universe, ready to be asked many times. Every quantity is a function of redshift z and throws a
 * ScienceError for a z this universe does not have: z <= -1, past a bounce, or, for distances across the
 * sky, past the antipode of a closed space. Distances and volumes want z >= 0; times and densities go on
 * into the future, -1 < z < 0. Relative accuracy 1e-10 for 1e-4 <= z <= 1100 (z = 0 is exact).
 */
export interface Cosmology extends Readonly<Record<CosmologyQuantity, (z: number) => number>> {
  readonly parameters: CosmologyParameters
  /** Curvature now, 1 minus all densities; exactly 0 for a flat model. */
  readonly Ok0: number
  readonly Ode0: number
  /** Photons and neutrinos now, massive neutrinos included. */
  readonly Or0: number
  readonly hubbleDistanceMpc: number
  readonly hubbleTimeGyr: number
  readonly universe: Universe
  /** The largest redshift there is, or 10^9, where the engine stops. */
  readonly deepestRedshift: number
  /** The most negative redshift there is: of greatest size or, where growth goes on, where the engine stops. */
  readonly furthestRedshift: number
  /** Redshift of the antipode of a closed space, where light from every direction has met; null elsewhere. */
  readonly antipodeRedshift: number | null
  /** Angular-diameter distance of z2 seen from z1, Mpc, any curvature; negative when z2 < z1. */
  angularDiameterBetweenMpc(z1: number, z2: number): number
  /**
   * A quantity for a whole array, the same numbers as one by one, at some ten nanoseconds each. Writes into
   * `out` when given, which must be as long and may be the array of redshifts itself; allocates nothing per
   * redshift. Throws on the first redshift the quantity does not have; `out` is then left half written.
   */
  batch(quantity: CosmologyQuantity, redshifts: Float64Array, out?: Float64Array): Float64Array
  /** Every redshift, smallest first, at which a quantity has a value; empty when there is none. */
  redshiftsAt(quantity: InvertibleQuantity, value: number): number[]
}
