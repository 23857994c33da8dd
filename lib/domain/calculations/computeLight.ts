import { cosmologyEngineVersion, type Cosmology } from '@/lib/science/cosmology'
import { einsteinRadiusArcsec, magnifiedMag, observeLight } from '@/lib/science/light'
import { refuse } from '@/lib/errors'
import { asRefused, eachOrRefused } from './asRefused'
import { describeCosmology } from './computeCosmology'
import { universeOf } from './cosmologySchema'
import { dustOf, wavelengthRow } from './lightOnTheWay'
import type { ObserveLightRequest } from './observeLightSchema'

type Magnified = ReturnType<typeof magnifiedMag>

function magnifiedBy({ magnification = 1, magnificationError = 0 }: ObserveLightRequest): Magnified {
  const { magnitudes } = asRefused('magnification', () => magnifiedMag(magnification))
  const { error } = asRefused('magnificationError', () => magnifiedMag(magnification, magnificationError))
  return { magnitudes, error }
}

/** Magnitudes that dust takes at a wavelength; refused at `field` where dust was given without a wavelength. */
function dustMagAt(input: ObserveLightRequest, field: string, wavelengthA: number | undefined): number {
  if (!input.ebv) return 0
  if (wavelengthA === undefined)
    throw refuse.field(field, 'Dust takes more of blue light than of red: give the wavelength.')
  return asRefused(field, () => dustOf(input)(wavelengthA))
}

function magnitudeOf(input: ObserveLightRequest, universe: Cosmology, through: Magnified) {
  const { absoluteMagnitudeAb, z, magnitudeWavelengthA } = input
  if (absoluteMagnitudeAb === undefined) return null
  const dustMag = dustMagAt(input, 'magnitudeWavelengthA', magnitudeWavelengthA)
  const seen = observeLight({ ...input, cosmology: universe })
  const withoutDustOrLensAb = seen.apparentMagnitudeAb ?? NaN
  return {
    apparentAb: withoutDustOrLensAb + dustMag - through.magnitudes,
    errorMag: through.error,
    absoluteAb: absoluteMagnitudeAb,
    distanceModulusMag: universe.distanceModulusMag(z),
    kCorrectionMag: seen.kCorrectionMag,
    withoutDustOrLensAb,
    dustMag,
    magnificationMag: -through.magnitudes,
  }
}

function lineOf(input: ObserveLightRequest, universe: Cosmology, through: Magnified) {
  const { lineLuminosityErgS, lineRestWavelengthA, z } = input
  if (lineLuminosityErgS === undefined) return null
  const observedWavelengthA = lineRestWavelengthA === undefined ? null : lineRestWavelengthA * (1 + z)
  const dustMag = dustMagAt(input, 'lineRestWavelengthA', observedWavelengthA ?? undefined)
  const fluxErgSCm2 = observeLight({ ...input, cosmology: universe }).lineFluxErgSCm2 ?? NaN
  return {
    observedWavelengthA,
    withoutDustOrLensErgSCm2: fluxErgSCm2,
    dustMag,
    magnificationMag: -through.magnitudes,
    fluxErgSCm2: fluxErgSCm2 * 10 ** (-0.4 * (dustMag - through.magnitudes)),
  }
}

/**
 * What reaches us of a source: magnitude and line flux with dust and lens told apart, size, and at each wavelength
 * the shares of light that dust and the intergalactic medium let through.
 */
export function computeLight(input: ObserveLightRequest) {
  const { z, lens } = input
  const universe = universeOf(input.cosmology)
  const seen = asRefused('z', () => observeLight({ ...input, cosmology: universe }))
  const through = magnifiedBy(input)
  const row = wavelengthRow(input)
  const { restWavelengthsA, observedWavelengthsA } = eachOrRefused({
    restWavelengthsA: [input.restWavelengthsA ?? [], (rest: number) => row(rest * (1 + z))],
    observedWavelengthsA: [input.observedWavelengthsA ?? [], row],
  })
  return {
    engine: cosmologyEngineVersion,
    cosmology: describeCosmology(universe),
    z,
    magnitude: magnitudeOf(input, universe, through),
    line: lineOf(input, universe, through),
    kCorrectionMag: seen.kCorrectionMag,
    angularSizeArcsec: seen.angularSizeArcsec,
    dimming: { bolometricMag: seen.dimmingMag, perFrequencyMag: 0.75 * seen.dimmingMag },
    einsteinRadiusArcsec: lens ? asRefused('lens', () => einsteinRadiusArcsec(universe, lens, z)) : null,
    rows: [...restWavelengthsA, ...observedWavelengthsA],
  }
}
