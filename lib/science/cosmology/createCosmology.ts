import { ARCSEC_RAD, GYR_S, MPC_KM, SPEED_OF_LIGHT_KM_S } from '../constants'
import { createAntipode } from './antipode'
import { createBatch, modulusMag } from './batch'
import { finite } from './finite'
import { transverseFactor, volumeFactor } from './curvature'
import { createDensity } from './density'
import { createInverse } from './inverse'
import { checkParameters, type CosmologyParameters } from './parameters'
import { createRedshiftCheck } from './redshiftCheck'
import { ScienceError } from '../ScienceError'
import { createTimeline } from './timeline'
import type { Cosmology, CosmologyQuantity } from './types'
import { classify, type Universe } from './universe'

/**
 * Sets a universe up once; each redshift then costs some ten nanoseconds.
 *
 * E^2 = Or(z) + Om0 (1+z)^3 + Ok0 (1+z)^2 + Ode0 (1+z)^{3(1+w0+wa)} exp(-3 wa z/(1+z)).
 * Distances, volumes and times: Hogg 1999 (astro-ph/9905116). Neutrinos: Komatsu et al. 2011, eq. 26.
 * Throws a ScienceError on parameters no universe can have.
 */
export function createCosmology(parameters: CosmologyParameters): Cosmology {
  checkParameters(parameters)
  const density = createDensity(parameters)
  const timeline = createTimeline(density)
  const check = createRedshiftCheck(parameters.name, timeline)
  const { Ok0, Ode0, Om0 } = density
  const hubbleDistanceMpc = SPEED_OF_LIGHT_KM_S / parameters.H0
  const hubbleTimeGyr = MPC_KM / parameters.H0 / GYR_S
  const antipode = createAntipode(parameters.name, Ok0, timeline)
  let universe: Universe | null = null

  const { tables } = timeline
  // In Hubble units: by the table of the quantity, or more slowly where that has none.
  const chi = (z: number): number => {
    const d = tables.distance().read(z)
    return Number.isNaN(d) ? timeline.distance().read(check.seen(z)) : d
  }
  const lookback = (z: number): number => {
    const t = tables.pastTime().read(z)
    if (!Number.isNaN(t)) return t
    const x = check.any(z)
    return (x >= 0 ? timeline.pastTime() : timeline.futureTime()).read(x)
  }
  const ageOf = (z: number): number => {
    const t = tables.age()?.read(z) ?? NaN
    if (!Number.isNaN(t)) return t
    const x = check.any(z)
    const age = timeline.age()
    if (age) return age(x)
    throw new ScienceError('no-beginning', `${parameters.name} has no big bang to count an age from.`)
  }
  const E2 = (z: number): number => finite(density.E2(check.any(z), 1 + z))
  const E = (z: number): number => {
    const value = tables.E().read(z)
    return Number.isNaN(value) ? Math.sqrt(E2(z)) : value
  }
  /** What is seen across the sky must stay short of the antipode. */
  const chiAcross = (z: number): number => antipode.guard(chi(z), z)
  const transverse = (z: number): number => {
    const d = chiAcross(z)
    return hubbleDistanceMpc * d * transverseFactor(Ok0 * d * d)
  }
  const luminosity = (z: number): number => (1 + z) * transverse(z)
  const kpcComovingPerArcsec = (z: number): number => transverse(z) * ARCSEC_RAD * 1e3

  const quantities: Record<CosmologyQuantity, (z: number) => number> = {
    E,
    hubbleKmSMpc: (z) => finite(parameters.H0 * E(z)),
    comovingMpc: (z) => hubbleDistanceMpc * chi(z),
    transverseComovingMpc: transverse,
    angularDiameterMpc: (z) => transverse(z) / (1 + z),
    luminosityMpc: luminosity,
    distanceModulusMag: (z) => modulusMag(luminosity(z)),
    lookbackGyr: (z) => hubbleTimeGyr * lookback(z),
    ageGyr: (z) => hubbleTimeGyr * ageOf(z),
    comovingVolumeMpc3(z) {
      const d = chiAcross(z)
      return finite(4 * Math.PI * hubbleDistanceMpc ** 3 * (d * d * d) * volumeFactor(Ok0 * d * d))
    },
    differentialVolumeMpc3Sr(z) {
      const d = transverse(z)
      return finite((hubbleDistanceMpc * d * d) / E(z))
    },
    kpcPerArcsec: (z) => kpcComovingPerArcsec(z) / (1 + z),
    kpcComovingPerArcsec,
    criticalDensityGCm3: (z) => finite(density.criticalDensity0GCm3 * E2(z)),
    Om: (z) => (Om0 * (1 + z) ** 3) / E2(z),
    Ode: (z) => density.darkEnergy(check.any(z)) / E2(z),
    Ok: (z) => (Ok0 * (1 + z) ** 2) / E2(z),
    Or: (z) => density.radiation(check.any(z)) / E2(z),
    q(z) {
      const x = check.any(z)
      return finite(density.slopeE2(x)) / (2 * finite(density.E2(x))) - 1
    },
    dimmingMag: (z) => (10 / Math.LN10) * check.any(z),
    timeDilation(z) {
      check.any(z)
      return 1 + z
    },
  }

  return {
    ...quantities,
    parameters,
    Ok0,
    Ode0,
    Or0: density.Ogamma0 + density.Onu0,
    hubbleDistanceMpc,
    hubbleTimeGyr,
    deepestRedshift: Math.expm1(timeline.pastEnd),
    get furthestRedshift() {
      return Math.expm1(timeline.futureEnd())
    },
    get antipodeRedshift() {
      return antipode.redshift()
    },
    get universe() {
      universe ??= classify(parameters, density, timeline, hubbleTimeGyr)
      return universe
    },
    angularDiameterBetweenMpc(z1, z2) {
      const d = chiAcross(z2) - chiAcross(z1)
      return (hubbleDistanceMpc * d * transverseFactor(Ok0 * d * d)) / (1 + z2)
    },
    batch: createBatch({
      H0: parameters.H0,
      Ok0,
      hubbleDistanceMpc,
      hubbleTimeGyr,
      one: quantities,
      tables,
      chi,
      lookback,
      age: ageOf,
      guard: (d, z) => antipode.guard(d, z),
    }),
    redshiftsAt: createInverse(quantities, timeline, antipode),
  }
}
