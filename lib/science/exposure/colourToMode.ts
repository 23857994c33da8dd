import { boxBand, carriedMag, type ColourInput } from '../light'
import { modePassband } from './modePassband'
import type { ModeRecord } from './types'

/** A magnitude's band and the shape of its spectrum. */
export interface ColourOf extends Omit<ColourInput, 'from' | 'to'> {
  readonly band: string
}

/**
 * Magnitudes to add to an AB magnitude in a band to have that which a mode sees, through its filter or at a wavelength
 * of its own medium, angstroms. A band that is the mode's filter is taken to be just that filter. Throws a ScienceError
 * where the spectrum does not cover both.
 */
export function colourToMode(mode: ModeRecord, wavelengthA: number, { band, ...given }: ColourOf): number {
  const to = modePassband(mode, wavelengthA)
  const isOwnFilter = mode.kind === 'imaging' && mode.band === band
  return carriedMag({ ...given, from: isOwnFilter ? to : boxBand(band), to })
}
