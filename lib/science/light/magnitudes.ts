import { PLANCK_ERG_S } from '../constants'
import { ScienceError } from '../ScienceError'
import { findBand } from './bands'

/** Flux density of AB magnitude 0: 3631 Jy in erg/s/cm^2/Hz (Oke & Gunn 1983). */
export const AB_ZERO_ERG = 3.631e-20

/** AB magnitude of a magnitude in another system. Vega by band, after Blanton & Roweis 2007; ST by wavelength. */
export function toAb(value: number, system: 'AB' | 'Vega' | 'ST', band: string): number {
  if (!Number.isFinite(value)) throw new ScienceError('bad-source', 'A magnitude must be a number.')
  if (system === 'AB') return value
  const { vegaAb, wavelengthA } = findBand(band)
  return system === 'Vega' ? value + vegaAb : value - 5 * Math.log10(wavelengthA) + 18.692
}

/** Photons/s/cm^2/A outside the air from an AB magnitude at a wavelength, angstroms: f_nu / (h lambda). */
export function abPhotonRate(ab: number, wavelengthA: number): number {
  return (AB_ZERO_ERG * 10 ** (-0.4 * ab)) / (PLANCK_ERG_S * wavelengthA)
}

/** Photons/s/cm^2 of a line of `fluxErgSCm2` at a wavelength, angstroms. */
export function linePhotonRate(fluxErgSCm2: number, wavelengthA: number): number {
  return (fluxErgSCm2 * wavelengthA * 1e-8) / (PLANCK_ERG_S * 2.997_924_58e10)
}
