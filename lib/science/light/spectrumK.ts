import { at } from '../numeric/at'
import { ScienceError } from '../ScienceError'
import { checkTable, readTable, type Table } from './spectrumTable'

const STEPS = 2000

/** Integral of lambda f(lambda) T(lambda) over a band: photons, but for a constant. */
function photons(f: (wavelengthA: number) => number, band: Table): number {
  const from = at(band.wavelengthsA, 0)
  const to = at(band.wavelengthsA, band.wavelengthsA.length - 1)
  const step = (to - from) / STEPS
  let sum = 0
  for (let i = 0; i < STEPS; i += 1) {
    const wavelengthA = from + (i + 0.5) * step
    sum += wavelengthA * f(wavelengthA) * readTable(band, wavelengthA)
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
  const seen = photons((w) => readTable(spectrum, w / (1 + z)), observedBand)
  const own = photons((w) => readTable(spectrum, w), restBand)
  const zeroSeen = photons(flatInFrequency, observedBand)
  const zeroOwn = photons(flatInFrequency, restBand)
  if (!(seen > 0 && own > 0))
    throw new ScienceError('bad-source', 'The spectrum has no light in one of the two bands.')
  return -2.5 * Math.log10((seen * zeroOwn) / ((1 + z) * zeroSeen * own))
}
