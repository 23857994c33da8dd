import { at } from '../numeric/at'
import { ScienceError } from '../ScienceError'

/** A table against wavelength, angstroms, growing. */
export interface Table {
  readonly wavelengthsA: readonly number[]
  readonly values: readonly number[]
}

function checkTable(table: Table, what: string): void {
  const { wavelengthsA, values } = table
  if (wavelengthsA.length < 2 || wavelengthsA.length !== values.length)
    throw new ScienceError(
      'bad-source',
      `${what} needs two rows at least, each with a wavelength and a value.`,
    )
  for (let i = 0; i < values.length; i += 1) {
    if (i > 0 && !(at(wavelengthsA, i) > at(wavelengthsA, i - 1)))
      throw new ScienceError(
        'bad-source',
        `The wavelengths of ${what.toLowerCase()} must grow from row to row.`,
      )
    if (!(at(values, i) >= 0 && at(values, i) < Infinity))
      throw new ScienceError('bad-source', `The values of ${what.toLowerCase()} must be 0 or more.`)
  }
}

/** The value of a table at a wavelength, straight between rows, 0 outside. */
function read({ wavelengthsA, values }: Table, wavelengthA: number): number {
  const last = wavelengthsA.length - 1
  if (wavelengthA < at(wavelengthsA, 0) || wavelengthA > at(wavelengthsA, last)) return 0
  let low = 0
  let high = last
  while (high - low > 1) {
    const middle = (low + high) >> 1
    if (at(wavelengthsA, middle) <= wavelengthA) low = middle
    else high = middle
  }
  const t = (wavelengthA - at(wavelengthsA, low)) / (at(wavelengthsA, high) - at(wavelengthsA, low))
  return at(values, low) + t * (at(values, high) - at(values, low))
}

const STEPS = 2000

/** Integral of lambda f(lambda) T(lambda) over a band: photons, but for a constant. */
function photons(f: (wavelengthA: number) => number, band: Table): number {
  const from = at(band.wavelengthsA, 0)
  const to = at(band.wavelengthsA, band.wavelengthsA.length - 1)
  const step = (to - from) / STEPS
  let sum = 0
  for (let i = 0; i < STEPS; i += 1) {
    const wavelengthA = from + (i + 0.5) * step
    sum += wavelengthA * f(wavelengthA) * read(band, wavelengthA)
  }
  return sum * step
}

const flatInFrequency = (wavelengthA: number): number => wavelengthA ** -2

/**
 * K correction between a rest band Q and an observed band R of a tabulated spectrum, AB magnitudes:
 * m_R = M_Q + mu + K_QR (Hogg et al. 2002, astro-ph/0210394, eq. 13), photons counted. The spectrum is L_lambda in
 * any unit; the bands are transmissions. Throws a ScienceError where the spectrum does not cover both bands.
 */
export function spectrumK(z: number, spectrum: Table, restBand: Table, observedBand: Table): number {
  checkTable(spectrum, 'A spectrum')
  checkTable(restBand, 'A band')
  checkTable(observedBand, 'A band')
  if (!(z >= 0)) throw new ScienceError('bad-redshift', 'A K correction needs a redshift of 0 or more.')
  const first = at(spectrum.wavelengthsA, 0)
  const last = at(spectrum.wavelengthsA, spectrum.wavelengthsA.length - 1)
  const edges = (band: Table, stretch: number): [number, number] => [
    at(band.wavelengthsA, 0) / stretch,
    at(band.wavelengthsA, band.wavelengthsA.length - 1) / stretch,
  ]
  for (const [low, high] of [edges(restBand, 1), edges(observedBand, 1 + z)])
    if (low < first || high > last)
      throw new ScienceError('outside-range', 'The spectrum does not cover the band at this redshift.')
  const seen = photons((w) => read(spectrum, w / (1 + z)), observedBand)
  const own = photons((w) => read(spectrum, w), restBand)
  const zeroSeen = photons(flatInFrequency, observedBand)
  const zeroOwn = photons(flatInFrequency, restBand)
  if (!(seen > 0 && own > 0))
    throw new ScienceError('bad-source', 'The spectrum has no light in one of the two bands.')
  return -2.5 * Math.log10((seen * zeroOwn) / ((1 + z) * zeroSeen * own))
}
