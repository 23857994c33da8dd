import { extinctionMag, igmTransmission } from '../light'
import type { ReportTarget } from './types'

/**
 * Magnitudes that light predicted from a luminosity loses on its way, by dust of the Galaxy (Fitzpatrick 1999) and the
 * intergalactic medium (Inoue et al. 2014), less what a lens gives it, at an observed vacuum wavelength in angstroms.
 * What was observed has been through it all.
 */
export function lostOnTheWayMag(target: ReportTarget, wavelengthA: number): number {
  const { galacticEbv, magnification, redshift } = target
  const dust = galacticEbv ? extinctionMag({ ebv: galacticEbv, isSfd: true, law: 'F99' }, wavelengthA) : 0
  const lens = magnification ? 2.5 * Math.log10(magnification) : 0
  const gas = redshift ? -2.5 * Math.log10(Math.max(1e-12, igmTransmission(redshift, wavelengthA))) : 0
  return dust + gas - lens
}
