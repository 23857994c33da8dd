import { integrate } from '../numeric/gaussLegendre'
import { ScienceError } from '../ScienceError'
import { findBand } from './bands'

/** What photons are counted through: a share by observed vacuum wavelength, angstroms. One wavelength when both ends are. */
export interface Passband {
  readonly fromA: number
  readonly toA: number
  transmission(wavelengthA: number): number
  /** Where the transmission bends. */
  readonly knotsA: readonly number[]
}

const whole = () => 1

/** A named band as a box of its middle and width: within some 0.01 mag of the true curve for smooth spectra. */
export function boxBand(name: string): Passband {
  const { wavelengthA, widthA } = findBand(name)
  return {
    fromA: wavelengthA - widthA / 2,
    toA: wavelengthA + widthA / 2,
    transmission: whole,
    knotsA: [],
  }
}

/** One wavelength, angstroms. */
export const oneWavelength = (wavelengthA: number): Passband => ({
  fromA: wavelengthA,
  toA: wavelengthA,
  transmission: whole,
  knotsA: [],
})

/** Growing pieces between two ends, in ln(wavelength), cut where something bends. */
function pieces(fromA: number, toA: number, knotsA: readonly number[]): number[] {
  const inside = knotsA.filter((knotA) => knotA > fromA && knotA < toA).sort((a, b) => a - b)
  return [fromA, ...inside, toA].map(Math.log)
}

/**
 * Mean f_nu of a spectrum through a passband, weighed by photons: integral of f_nu T / lambda over that of T / lambda
 * (Hogg et al. 2002, astro-ph/0210394, eq. 6, AB zero flux flat in f_nu). 20-point Gauss-Legendre between knots.
 */
export function photonMean(
  fluxNu: (wavelengthA: number) => number,
  band: Passband,
  knotsA: readonly number[] = [],
): number {
  if (band.fromA === band.toA) return fluxNu(band.fromA)
  const edges = pieces(band.fromA, band.toA, [...band.knotsA, ...knotsA])
  let light = 0
  let weight = 0
  for (let i = 1; i < edges.length; i += 1) {
    const [low = 0, high = 0] = [edges[i - 1], edges[i]]
    const through = (x: number) => band.transmission(Math.exp(x))
    light += integrate((x) => fluxNu(Math.exp(x)) * through(x), low, high)
    weight += integrate(through, low, high)
  }
  if (!(weight > 0)) throw new ScienceError('bad-mode', 'A band lets no light through.')
  return light / weight
}
