import { extinctionMag, igmTransmission } from '@/lib/science/light'
import type { ObserveLightRequest } from './observeLightSchema'

/** Magnitudes the dust asked about takes at an observed wavelength, angstroms. */
export function dustOf({ ebv = 0, ebvIsSfd = false, dustLaw = 'F99', rv }: ObserveLightRequest) {
  const dust = { ebv, isSfd: ebvIsSfd, law: dustLaw, rv }
  return (wavelengthA: number): number => extinctionMag(dust, wavelengthA)
}

/** What is let through at an observed wavelength, angstroms, of a source at the redshift asked about. */
export function wavelengthRow(input: ObserveLightRequest) {
  const dust = dustOf(input)
  return (observedA: number) => {
    const byDust = input.ebv ? 10 ** (-0.4 * dust(observedA)) : 1
    const byIgm = igmTransmission(input.z, observedA)
    return {
      restA: observedA / (1 + input.z),
      observedA,
      throughDust: byDust,
      throughIgm: byIgm,
      through: byDust * byIgm,
    }
  }
}
