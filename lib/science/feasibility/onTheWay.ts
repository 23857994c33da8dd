import { extinctionMag, igmTransmission } from '../light'
import type { ReportTarget } from './types'

/** Magnitudes a lens makes a target brighter by, alike at every wavelength. */
export function lensMag({ magnification }: Pick<ReportTarget, 'magnification'>): number {
  return magnification ? 2.5 * Math.log10(magnification) : 0
}

/**
 * Magnitudes that light loses on its way to us, by dust of the Galaxy (Fitzpatrick 1999) and the intergalactic medium
 * (Inoue et al. 2014), at an observed vacuum wavelength in angstroms.
 */
export function absorbedMag(
  { galacticEbv, redshift }: Pick<ReportTarget, 'galacticEbv' | 'redshift'>,
  wavelengthA: number,
): number {
  const dust = galacticEbv ? extinctionMag({ ebv: galacticEbv, isSfd: true, law: 'F99' }, wavelengthA) : 0
  const gas = redshift ? -2.5 * Math.log10(Math.max(1e-12, igmTransmission(redshift, wavelengthA))) : 0
  return dust + gas
}

/**
 * Magnitudes that light predicted from a luminosity loses on its way, less what a lens gives it. What was observed has
 * been through it all.
 */
export function lostOnTheWayMag(target: ReportTarget, wavelengthA: number): number {
  return absorbedMag(target, wavelengthA) - lensMag(target)
}
