import { BOLTZMANN_EV_K } from '../constants'
import { createSmoothTable } from '../numeric/smoothTable'
import type { CosmologyParameters } from './parameters'

/** Energy of one massless species over that of the photons: 7/8 (4/11)^(4/3). */
const MASSLESS_SHARE = 0.875 * (4 / 11) ** (4 / 3)

/** Fit of Komatsu et al. 2011 (ApJS 192, 18), eq. 26: f(y) = (1 + (A y)^p)^(1/p). Good to some 1e-5. */
const A = 0.3173
const P = 1.83

interface Species {
  readonly count: number
  /** ln of A m / (k T_nu) at present. */
  readonly lnAy0: number
}

/** Energy density of all neutrinos over that of the photons, and its slope, against x = ln(1+z). */
export interface Neutrinos {
  readonly massive: boolean
  /** What the species with a mass have of the ratio now. */
  readonly massiveNow: number
  ratio(x: number): number
  slope(x: number): number
}

/** Neutrinos of a model: T_nu = (4/11)^(1/3) Tcmb0; Neff is shared evenly between floor(Neff) species. */
export function createNeutrinos(p: CosmologyParameters): Neutrinos {
  const masses = p.Tcmb0 > 0 ? p.mNuEv.filter((mass) => mass > 0) : []
  if (masses.length === 0) {
    const constant = MASSLESS_SHARE * p.Neff
    return { massive: false, massiveNow: 0, ratio: () => constant, slope: () => 0 }
  }
  const kT = BOLTZMANN_EV_K * p.Tcmb0 * (4 / 11) ** (1 / 3)
  const speciesCount = Math.floor(p.Neff)
  const share = (MASSLESS_SHARE * p.Neff) / speciesCount
  const massless = speciesCount - masses.length
  const species: Species[] = [...new Set(masses)].map((mass) => ({
    count: masses.filter((other) => other === mass).length,
    lnAy0: Math.log((A * mass) / kT),
  }))
  const exact = (x: number): number => {
    let sum = massless
    // (1 + u)^(1/p) with u = (A y)^p, by exponentials: powers cost three times as much.
    for (const { count, lnAy0 } of species) {
      sum += count * Math.exp(Math.log1p(Math.exp(P * (lnAy0 - x))) / P)
    }
    return share * sum
  }
  // The nearest singularity lies at an imaginary part of pi/p = 1.7: 14 terms on a piece of 0.25 are exact.
  const ratio = createSmoothTable(exact, -0.25, 7.25, 0.25)
  return {
    massive: true,
    massiveNow: exact(0) - share * massless,
    ratio,
    slope(x) {
      let sum = 0
      for (const { count, lnAy0 } of species) {
        const u = Math.exp(P * (lnAy0 - x))
        sum -= count * u * (1 + u) ** (1 / P - 1)
      }
      return share * sum
    },
  }
}
