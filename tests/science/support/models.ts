import { createCosmology, type Cosmology, type CosmologyParameters } from '../../../lib/science/cosmology'

const matter: CosmologyParameters = {
  name: 'Test',
  H0: 70,
  Om0: 0.3,
  Ode0: 0.7,
  w0: -1,
  wa: 0,
  Tcmb0: 0,
  Neff: 0,
  mNuEv: [],
}

/** A universe of matter and Lambda without radiation, unless told otherwise. */
export function universe(change: Partial<CosmologyParameters>): Cosmology {
  return createCosmology({ ...matter, ...change })
}
