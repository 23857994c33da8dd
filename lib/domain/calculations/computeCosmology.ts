import { z } from 'zod'
import { ScienceError } from '@/lib/science/ScienceError'
import { cosmologyEngineVersion, type Cosmology } from '@/lib/science/cosmology'
import { asRefused, eachOrRefused } from './asRefused'
import { cosmologyInput, universeOf } from './cosmologySchema'
import { exactly } from './exactly'
import { listOf, mostRedshifts } from './limits'

const redshift = z.number('A redshift is a number.')

export const cosmologyRequest = exactly({
  cosmology: cosmologyInput,
  z: listOf(redshift, mostRedshifts, 'redshifts'),
  pairs: listOf(z.tuple([redshift, redshift]), mostRedshifts, 'pairs')
    .optional()
    .meta({ description: 'Angular-diameter distance of the second redshift seen from the first' }),
})

export type CosmologyRequest = z.output<typeof cosmologyRequest>

/** Null where this universe has no such quantity at any redshift: an age without a beginning, a modulus at z = 0. */
function orNull(read: () => number, ...codes: string[]): number | null {
  try {
    return read()
  } catch (error) {
    if (error instanceof ScienceError && codes.includes(error.code)) return null
    throw error
  }
}

function rowOf(c: Cosmology, z: number) {
  return {
    z,
    E: c.E(z),
    hubbleKmSMpc: c.hubbleKmSMpc(z),
    comovingMpc: c.comovingMpc(z),
    transverseComovingMpc: c.transverseComovingMpc(z),
    angularDiameterMpc: c.angularDiameterMpc(z),
    luminosityMpc: c.luminosityMpc(z),
    distanceModulusMag: z === 0 ? null : c.distanceModulusMag(z),
    lookbackGyr: c.lookbackGyr(z),
    ageGyr: orNull(() => c.ageGyr(z), 'no-beginning'),
    comovingVolumeMpc3: c.comovingVolumeMpc3(z),
    differentialVolumeMpc3Sr: c.differentialVolumeMpc3Sr(z),
    kpcPerArcsec: c.kpcPerArcsec(z),
    criticalDensityGCm3: c.criticalDensityGCm3(z),
    Om: c.Om(z),
    Ode: c.Ode(z),
    Ok: c.Ok(z),
    q: c.q(z),
    Or: c.Or(z),
    kpcComovingPerArcsec: c.kpcComovingPerArcsec(z),
    dimmingMag: c.dimmingMag(z),
  }
}

/** The parameters of a universe as answers name them. */
export function describeCosmology({ parameters, Ok0, Ode0 }: Cosmology) {
  const { mNuEv, ...rest } = parameters
  return { ...rest, Ode0, Ok0, mNu: [...mNuEv] }
}

/** Every quantity at each redshift, and distances between pairs. */
export function computeCosmology(input: CosmologyRequest) {
  const universe = universeOf(input.cosmology)
  const { z: rows, pairs } = eachOrRefused({
    z: [input.z, (z: number) => rowOf(universe, z)],
    pairs: [
      input.pairs ?? [],
      ([z1, z2]: readonly [number, number]) => ({
        z1,
        z2,
        angularDiameterMpc: universe.angularDiameterBetweenMpc(z1, z2),
      }),
    ],
  })
  return {
    engine: cosmologyEngineVersion,
    cosmology: describeCosmology(universe),
    universe: asRefused('cosmology', () => universe.universe),
    rows,
    pairs,
  }
}
