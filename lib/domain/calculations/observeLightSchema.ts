import { z } from 'zod'
import { cosmologyInput } from './cosmologySchema'
import { exactly } from './exactly'
import { listOf, mostWavelengths } from './limits'
import { bandName, restSpectrum } from './spectrumSchema'

const number = z.number('This is a number.')
const wavelength = z
  .number('A wavelength is a number.')
  .gt(0, 'A wavelength lies above 0 and below 1e12 Å.')
  .lt(1e12, 'A wavelength lies above 0 and below 1e12 Å.')

/** A source at a redshift and what stands before it. Angstroms in vacuum, erg/s, kiloparsecs, AB magnitudes. */
export const observeLightRequest = exactly({
  cosmology: cosmologyInput,
  z: z.number('A redshift is a number.'),
  absoluteMagnitudeAb: number
    .min(-60, 'An absolute magnitude lies between −60 and 60.')
    .max(60, 'An absolute magnitude lies between −60 and 60.')
    .optional()
    .meta({ description: 'AB, the rest band being the observed one' }),
  spectralIndex: number
    .min(-20, 'A spectral index lies between −20 and 20.')
    .max(20, 'A spectral index lies between −20 and 20.')
    .optional()
    .meta({ description: 'f_nu ~ nu^alpha; 0 when not given' }),
  magnitudeWavelengthA: wavelength
    .optional()
    .meta({ description: 'Observed wavelength of the magnitude, wanted where dust is to be taken from it' }),
  measured: exactly({
    ab: number
      .min(-50, 'A magnitude lies between −50 and 50.')
      .max(50, 'A magnitude lies between −50 and 50.'),
    band: bandName,
    spectrum: restSpectrum,
  })
    .optional()
    .meta({
      description:
        'An observed magnitude in a band, carried to each wavelength by the shape of the spectrum at the redshift, dust and gas counted once',
    }),
  lineLuminosityErgS: number
    .gt(0, 'A luminosity lies above 0 and below 1e60 erg/s.')
    .lt(1e60, 'A luminosity lies above 0 and below 1e60 erg/s.')
    .optional(),
  lineRestWavelengthA: wavelength
    .optional()
    .meta({ description: 'Rest wavelength of the line, wanted where dust is to be taken from it' }),
  sizeKpc: number
    .gt(0, 'A size lies above 0 and below 1e9 kpc.')
    .lt(1e9, 'A size lies above 0 and below 1e9 kpc.')
    .optional()
    .meta({ description: 'Proper size' }),
  restWavelengthsA: listOf(wavelength, mostWavelengths, 'wavelengths').optional(),
  observedWavelengthsA: listOf(wavelength, mostWavelengths, 'wavelengths').optional(),
  ebv: number
    .min(0, 'A reddening E(B−V) lies between 0 and 10.')
    .max(10, 'A reddening E(B−V) lies between 0 and 10.')
    .optional()
    .meta({ description: 'Reddening by the dust of the Galaxy, magnitudes' }),
  ebvIsSfd: z.boolean('This is true or false.').optional().meta({
    description: 'Read from the map of Schlegel, Finkbeiner & Davis 1998, and so to be recalibrated',
  }),
  dustLaw: z
    .enum(['F99', 'CCM89'], 'A law of dust is F99 or CCM89.')
    .optional()
    .meta({ description: 'Fitzpatrick 1999, when not given, or Cardelli, Clayton & Mathis 1989' }),
  rv: number
    .min(2, 'R_V lies between 2 and 6.')
    .max(6, 'R_V lies between 2 and 6.')
    .optional()
    .meta({ description: '3.1 when not given' }),
  magnification: number.optional().meta({ description: 'By a lens; 1 when not given' }),
  magnificationError: number.optional(),
  lens: exactly({ z: number, dispersionKmS: number })
    .optional()
    .meta({ description: 'A singular isothermal sphere before the source' }),
})

export type ObserveLightRequest = z.output<typeof observeLightRequest>
