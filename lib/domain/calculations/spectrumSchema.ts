import { z } from 'zod'
import { bands } from '@/lib/science/light'
import { mostSpectrumRows } from '../targets/spectrumTable'
import { exactly } from './exactly'
import { listOf } from './limits'

const names = Object.keys(bands) as [string, ...string[]]

/** A band by its letter, told apart by case: r of the ugriz system, R of UBVRI. */
export const bandName = z.enum(names, `A band is one of ${names.join(', ')}.`)

const redshift = z
  .number('A redshift is a number.')
  .min(0, 'A redshift lies between 0 and 1,100.')
  .max(1100, 'A redshift lies between 0 and 1,100.')
  .default(0)
const wavelengthNm = z
  .number('A wavelength is a number.')
  .gt(0, 'A wavelength lies above 0 and below 1e7 nm.')
  .lt(1e7, 'A wavelength lies above 0 and below 1e7 nm.')
const flux = z
  .number('A flux is a number.')
  .min(0, 'A flux is 0 or more.')
  .lt(1e30, 'A flux lies below 1e30.')

const powerLaw = {
  kind: z.literal('power-law'),
  index: z
    .number('A spectral index is a number.')
    .min(-20, 'A spectral index lies between −20 and 20.')
    .max(20, 'A spectral index lies between −20 and 20.')
    .meta({ description: 'f_nu ~ nu^index' }),
}
const blackBody = {
  kind: z.literal('black-body'),
  temperatureK: z
    .number('A temperature is a number.')
    .min(100, 'A temperature lies between 100 and 1,000,000 K.')
    .max(1e6, 'A temperature lies between 100 and 1,000,000 K.')
    .meta({ description: 'At rest with the source' }),
}
const table = {
  kind: z.literal('table'),
  wavelengthsNm: listOf(wavelengthNm, mostSpectrumRows, 'wavelengths').meta({
    description: 'At rest with the source, in vacuum, growing',
  }),
  fLambda: listOf(flux, mostSpectrumRows, 'fluxes').meta({ description: 'f_lambda in any unit' }),
}
const kinds = 'A spectrum is of the kind power-law, black-body or table.'

/** The shape of a continuum at its own redshift. */
export const spectrum = z
  .discriminatedUnion(
    'kind',
    [exactly(powerLaw), exactly({ ...blackBody, z: redshift }), exactly({ ...table, z: redshift })],
    kinds,
  )
  .meta({ description: 'Carries the magnitude from its band to the mode; flat in f_nu when not given' })

/** The same where the redshift is told elsewhere. */
export const restSpectrum = z
  .discriminatedUnion('kind', [exactly(powerLaw), exactly(blackBody), exactly(table)], kinds)
  .meta({ description: 'Shape of the continuum before dust and gas' })
