import {
  boxBand,
  carryFrom,
  extinctionMag,
  igmTransmission,
  lymanKnotsA,
  oneWavelength,
} from '@/lib/science/light'
import { asRefused } from './asRefused'
import type { ObserveLightRequest } from './observeLightSchema'

/** Magnitudes the dust asked about takes at an observed wavelength, angstroms. */
export function dustOf({ ebv = 0, ebvIsSfd = false, dustLaw = 'F99', rv }: ObserveLightRequest) {
  const dust = { ebv, isSfd: ebvIsSfd, law: dustLaw, rv }
  return (wavelengthA: number): number => extinctionMag(dust, wavelengthA)
}

/** AB magnitude at an observed wavelength, angstroms, of what was measured in a band; null where nothing was. */
function carriedAb(input: ObserveLightRequest): (observedA: number) => number | null {
  const { measured, z } = input
  if (!measured) return () => null
  const dust = dustOf(input)
  const gasMag = (wavelengthA: number) => -2.5 * Math.log10(Math.max(1e-12, igmTransmission(z, wavelengthA)))
  const carry = asRefused('measured', () =>
    carryFrom({
      shape: measured.spectrum,
      z,
      from: boxBand(measured.band),
      isObserved: true,
      lostMag: (wavelengthA) => (input.ebv ? dust(wavelengthA) : 0) + gasMag(wavelengthA),
      lostKnotsA: lymanKnotsA(z),
    }),
  )
  return (observedA) => measured.ab + carry(oneWavelength(observedA))
}

/** What is let through at an observed wavelength, angstroms, of a source at the redshift asked about. */
export function wavelengthRow(input: ObserveLightRequest) {
  const dust = dustOf(input)
  const ab = carriedAb(input)
  return (observedA: number) => {
    const byDust = input.ebv ? 10 ** (-0.4 * dust(observedA)) : 1
    const byIgm = igmTransmission(input.z, observedA)
    return {
      restA: observedA / (1 + input.z),
      observedA,
      throughDust: byDust,
      throughIgm: byIgm,
      through: byDust * byIgm,
      ab: ab(observedA),
    }
  }
}
