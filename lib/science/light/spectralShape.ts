import { ScienceError } from '../ScienceError'
import { at } from '../numeric/at'
import { checkTable, readTable } from './spectrumTable'

/** Shape of a source's own spectrum, before dust and gas on the way; how bright it is stands elsewhere. */
export type SpectralShape =
  /** f_nu ~ nu^index; a redshift leaves it as it is. */
  | { readonly kind: 'power-law'; readonly index: number }
  /** A black body at rest with the source. */
  | { readonly kind: 'black-body'; readonly temperatureK: number }
  /** f_lambda in any unit against wavelength at rest with the source, vacuum, growing; straight between rows. */
  | { readonly kind: 'table'; readonly wavelengthsNm: readonly number[]; readonly fLambda: readonly number[] }

/** A spectrum as it reaches us: f_nu, in a unit of its own, at an observed vacuum wavelength in angstroms. */
export interface ArrivingSpectrum {
  fluxNu(wavelengthA: number): number
  /** Where it bends: observed wavelengths, growing. */
  readonly knotsA: readonly number[]
  /** Observed wavelengths it is known between; everywhere where there are none. */
  readonly reachA?: readonly [number, number]
}

/** Second radiation constant h c / k, angstrom kelvin: CODATA 2018, from exact constants. */
const HC_OVER_K_A = 1.438_776_877_503_934e8
/** Where a power law is 1; any wavelength serves. */
const PIVOT_A = 10_000

function ofTable(wavelengthsNm: readonly number[], fLambda: readonly number[], z: number): ArrivingSpectrum {
  const knotsA = wavelengthsNm.map((restNm) => restNm * 10 * (1 + z))
  const table = { wavelengthsA: knotsA, values: fLambda }
  checkTable(table, 'A spectrum')
  const [first, last] = [at(knotsA, 0), at(knotsA, knotsA.length - 1)]
  return {
    knotsA,
    reachA: [first, last],
    // The ends of a band may step over those of the table by rounding.
    fluxNu: (wavelengthA) =>
      wavelengthA ** 2 * readTable(table, Math.min(last, Math.max(first, wavelengthA))),
  }
}

/**
 * The spectrum of a shape at redshift z > -1 as it arrives, nothing lost on the way. Planck's law in frequency,
 * x^3 / (e^x - 1) with x = h nu (1 + z) / k T (Rybicki & Lightman 1979, eq. 1.51). Throws a ScienceError for an index
 * beyond +-20, a temperature outside 10 K to 1e9 K, and a table that does not grow.
 */
export function arrivingSpectrum(shape: SpectralShape, z: number): ArrivingSpectrum {
  if (!(z > -1 && z < 1e4)) throw new ScienceError('bad-redshift', 'A redshift lies above −1.')
  if (shape.kind === 'table') return ofTable(shape.wavelengthsNm, shape.fLambda, z)
  if (shape.kind === 'power-law') {
    const { index } = shape
    if (!(Math.abs(index) <= 20))
      throw new ScienceError('bad-source', 'A spectral index lies between −20 and 20.')
    return { knotsA: [], fluxNu: (wavelengthA) => (PIVOT_A / wavelengthA) ** index }
  }
  const { temperatureK } = shape
  if (!(temperatureK >= 10 && temperatureK <= 1e9))
    throw new ScienceError('bad-source', 'A temperature lies between 10 K and 1e9 K.')
  const scaleA = (HC_OVER_K_A * (1 + z)) / temperatureK
  return {
    knotsA: [],
    fluxNu(wavelengthA) {
      const x = scaleA / wavelengthA
      return x ** 3 / Math.expm1(x)
    },
  }
}
