import { ScienceError } from '../ScienceError'

/**
 * A Friedmann-Lemaitre-Robertson-Walker model.
 * `Om0` counts baryons and dark matter, without massive neutrinos, which are added from `mNuEv`.
 */
export interface CosmologyParameters {
  readonly name: string
  /** Hubble constant, km/s/Mpc, above 0. */
  readonly H0: number
  /** Density of matter now over the critical density, 0 or more. */
  readonly Om0: number
  /** Density of dark energy now over the critical density, or 'flat': what makes space exactly flat. */
  readonly Ode0: number | 'flat'
  /** Equation of state w(a) = w0 + wa (1 - a): Chevallier & Polarski 2001, Linder 2003. */
  readonly w0: number
  readonly wa: number
  /** Temperature of the microwave background now, K. 0 leaves radiation out. */
  readonly Tcmb0: number
  /** Effective number of neutrino species. */
  readonly Neff: number
  /** Neutrino masses, eV, one a species; species not listed are massless. */
  readonly mNuEv: readonly number[]
}

interface Range {
  readonly low: number
  readonly high: number
  readonly lowAllowed: boolean
  readonly sentence: string
  /** Said of a number above the range, where the sentence is about its low end. */
  readonly tooLarge?: string
}

const ranges = {
  H0: {
    low: 0,
    high: 1e6,
    lowAllowed: false,
    sentence: 'The Hubble constant H₀ must be above 0 km/s/Mpc.',
    tooLarge: 'The Hubble constant H₀ must be at most 1 000 000 km/s/Mpc.',
  },
  Om0: {
    low: 0,
    high: 1e3,
    lowAllowed: true,
    sentence: 'The matter density Ωm must be 0 or more.',
    tooLarge: 'The matter density Ωm must be at most 1000.',
  },
  w0: { low: -20, high: 20, lowAllowed: true, sentence: 'w₀ must lie between −20 and 20.' },
  wa: { low: -20, high: 20, lowAllowed: true, sentence: 'wₐ must lie between −20 and 20.' },
  Tcmb0: {
    low: 0,
    high: 100,
    lowAllowed: true,
    sentence: 'The background temperature must lie between 0 and 100 K.',
  },
  Neff: {
    low: 0,
    high: 100,
    lowAllowed: true,
    sentence: 'The number of neutrino species must lie between 0 and 100.',
  },
} as const satisfies Record<string, Range>

function check(value: number, range: Range): void {
  const aboveLow = range.lowAllowed ? value >= range.low : value > range.low
  if (aboveLow && value <= range.high) return
  throw new ScienceError('bad-parameter', (value > range.high && range.tooLarge) || range.sentence)
}

/** Throws a ScienceError with a sentence on the first parameter that no universe can have. */
export function checkParameters(p: CosmologyParameters): void {
  check(p.H0, ranges.H0)
  check(p.Om0, ranges.Om0)
  if (p.Ode0 !== 'flat' && !(Math.abs(p.Ode0) <= 1e3)) {
    throw new ScienceError(
      'bad-parameter',
      'The dark energy density must be a number between −1000 and 1000.',
    )
  }
  check(p.w0, ranges.w0)
  check(p.wa, ranges.wa)
  check(p.Tcmb0, ranges.Tcmb0)
  // Colder, the masses of neutrinos over their temperature run out of numbers.
  if (p.Tcmb0 > 0 && p.Tcmb0 < 1e-3) {
    throw new ScienceError('bad-parameter', 'The background temperature must be 0, or 0.001 K or more.')
  }
  check(p.Neff, ranges.Neff)
  if (p.mNuEv.some((mass) => !(mass >= 0 && mass <= 1e3))) {
    throw new ScienceError('bad-parameter', 'A neutrino mass must lie between 0 and 1000 eV.')
  }
  if (p.mNuEv.length > Math.floor(p.Neff)) {
    throw new ScienceError(
      'bad-parameter',
      `${p.mNuEv.length} neutrino ${p.mNuEv.length === 1 ? 'mass was' : 'masses were'} given for ${Math.floor(p.Neff)} species.`,
    )
  }
}

/** Every parameter no universe can have, with its sentence; empty when there is none. */
export function parameterTroubles(
  p: CosmologyParameters,
): Partial<Record<keyof CosmologyParameters, string>> {
  // Each is tried among values that are certainly good; masses need the number of species as given.
  const good: CosmologyParameters = {
    name: p.name,
    H0: 70,
    Om0: 0.3,
    Ode0: 'flat',
    w0: -1,
    wa: 0,
    Tcmb0: 0,
    Neff: 100,
    mNuEv: [],
  }
  const tried: readonly (keyof CosmologyParameters)[] = [
    'H0',
    'Om0',
    'Ode0',
    'w0',
    'wa',
    'Tcmb0',
    'Neff',
    'mNuEv',
  ]
  const found: Partial<Record<keyof CosmologyParameters, string>> = {}
  for (const key of tried) {
    const species = key === 'mNuEv' && !found.Neff ? { Neff: p.Neff } : {}
    try {
      checkParameters({ ...good, ...species, [key]: p[key] })
    } catch (error) {
      if (!(error instanceof ScienceError)) throw error
      found[key] = error.message
    }
  }
  return found
}
