import { ScienceError } from '../ScienceError'
import { createNeutrinos } from './neutrinos'
import { checkParameters } from './parameters'
import { photonDensity } from './photons'

/** A matter density as many papers print it: baryons, dark matter and massive neutrinos together. */
export interface PublishedMatter {
  /** Hubble constant, km/s/Mpc, above 0. */
  readonly H0KmSMpc: number
  /** Matter over critical density now, massive neutrinos included. */
  readonly publishedOm: number
  /** Temperature of the microwave background now, K. At 0 there are no neutrinos either. */
  readonly Tcmb0K: number
  readonly Neff: number
  /** Masses, eV, one a species. */
  readonly mNuEv: readonly number[]
}

/** Density now of the neutrinos that have a mass, over the critical one. Komatsu et al. 2011, eq. 26. */
export function massiveNeutrinoDensity(given: Omit<PublishedMatter, 'publishedOm'>): number {
  return densityOf({ ...given, publishedOm: 0 })
}

/**
 * Om0 as this engine takes it, baryons and dark matter alone, from a published density that counts massive
 * neutrinos as matter (Planck Collaboration 2020, A&A 641, A6, section 2.2: some 0.0014 for 0.06 eV).
 * Massless species are never part of it. Throws a ScienceError where nothing is left for matter.
 */
export function matterWithoutNeutrinos(given: PublishedMatter): number {
  const neutrinos = densityOf(given)
  const Om0 = given.publishedOm - neutrinos
  if (Om0 >= 0) return Om0
  throw new ScienceError(
    'bad-parameter',
    `Neutrinos of these masses alone make Ων = ${neutrinos.toPrecision(3)}, more than the matter density given.`,
  )
}

function densityOf({ H0KmSMpc, publishedOm, Tcmb0K, Neff, mNuEv }: PublishedMatter): number {
  const parameters = {
    name: 'Published',
    H0: H0KmSMpc,
    Om0: publishedOm,
    Ode0: 'flat',
    w0: -1,
    wa: 0,
    Tcmb0: Tcmb0K,
    Neff,
    mNuEv,
  } as const
  checkParameters(parameters)
  return photonDensity(H0KmSMpc, Tcmb0K) * createNeutrinos(parameters).massiveNow
}
