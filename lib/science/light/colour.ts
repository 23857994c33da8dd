import { ScienceError } from '../ScienceError'
import { findBand } from './bands'
import { photonMean, type Passband } from './passband'
import { arrivingSpectrum, type ArrivingSpectrum, type SpectralShape } from './spectralShape'

export interface ColourInput {
  readonly shape: SpectralShape
  /** Of the source; 0 when it has none. */
  readonly z: number
  /** The band a magnitude is given in, and where it is wanted. */
  readonly from: Passband
  readonly to: Passband
  /** Magnitudes that dust and gas on the way take at an observed vacuum wavelength, angstroms. */
  readonly lostMag?: (wavelengthA: number) => number
  /** Where that loss bends. */
  readonly lostKnotsA?: readonly number[]
  /**
   * Whether the magnitude given has been through dust and gas already, so that only what differs between the two bands
   * is added; else all of it is.
   */
  readonly isObserved: boolean
}

/** Beyond this step in ln(wavelength) a magnitude says little of the light without a colour. */
const FAR_LN = 0.15

/** Whether a wavelength, angstroms, lies so far from the middle of a band that the shape of the spectrum matters. */
export function isFarFromBand(band: string, wavelengthA: number): boolean {
  return Math.abs(Math.log(wavelengthA / findBand(band).wavelengthA)) > FAR_LN
}

const nm = (wavelengthA: number): string => String(Math.round(wavelengthA / 10))

/** Refuses a band, angstroms, that a spectrum is not known over. */
function requireReach({ reachA }: ArrivingSpectrum, { fromA, toA }: Passband): void {
  if (!reachA || (fromA > reachA[0] * (1 - 1e-9) && toA < reachA[1] * (1 + 1e-9))) return
  const wanted = fromA === toA ? nm(fromA) : `${nm(fromA)} to ${nm(toA)}`
  throw new ScienceError(
    'outside-range',
    `The table of the spectrum reaches from ${nm(reachA[0])} to ${nm(reachA[1])}\u00a0nm as observed; ${wanted}\u00a0nm is wanted.`,
  )
}

/**
 * Magnitudes to add to an AB magnitude in one band to have that in others, or at one wavelength: synthetic photometry
 * over photon rates, m_to - m_from = -2.5 log10(<f_nu>_to / <f_nu>_from), dust and gas counted once. Throws a
 * ScienceError where the spectrum does not cover a band or has no light in it.
 */
export function carryFrom(input: Omit<ColourInput, 'to'>): (to: Passband) => number {
  const { shape, z, from, lostMag, lostKnotsA = [], isObserved } = input
  const spectrum = arrivingSpectrum(shape, z)
  const { fluxNu } = spectrum
  const knots = lostMag ? [...spectrum.knotsA, ...lostKnotsA] : spectrum.knotsA
  const dimmed = lostMag
    ? (wavelengthA: number) => fluxNu(wavelengthA) * 10 ** (-0.4 * lostMag(wavelengthA))
    : fluxNu
  const mean = (light: typeof fluxNu, band: Passband) => {
    requireReach(spectrum, band)
    const found = photonMean(light, band, knots)
    if (found > 0) return found
    throw new ScienceError('bad-source', 'A spectrum of this shape has no light in one of the two bands.')
  }
  const given = mean(isObserved ? dimmed : fluxNu, from)
  return (to) => 2.5 * Math.log10(given / mean(dimmed, to))
}

/** The same from one band to one other. */
export const carriedMag = ({ to, ...input }: ColourInput): number => carryFrom(input)(to)
