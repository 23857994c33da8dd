import { z } from 'zod'
import { SERSIC_LEAST, SERSIC_MOST } from '@/lib/science/exposure'
import { exactly } from './exactly'
import { bandName, spectrum } from './spectrumSchema'

const number = z.number('This is a number.')
const wavelengthA = z
  .number('A wavelength is a number.')
  .gt(0, 'A wavelength lies above 0 and below 1e12 Å.')
  .lt(1e12, 'A wavelength lies above 0 and below 1e12 Å.')
  .meta({ description: 'Observed, in the medium of the mode' })
const magnitude = number
  .min(-50, 'A magnitude lies between −50 and 50.')
  .max(50, 'A magnitude lies between −50 and 50.')
const sersic = `A Sérsic index lies between ${SERSIC_LEAST} and ${SERSIC_MOST}.`

const geometry = z
  .discriminatedUnion(
    'kind',
    [
      exactly({ kind: z.literal('point') }),
      exactly({
        kind: z.literal('extended'),
        effectiveRadiusArcsec: number
          .gt(0, 'A half-light radius lies above 0 and below 3,600 arcseconds.')
          .lt(3600, 'A half-light radius lies above 0 and below 3,600 arcseconds.'),
        sersicIndex: number.min(SERSIC_LEAST, sersic).max(SERSIC_MOST, sersic).optional(),
      }),
      exactly({
        kind: z.literal('uniform'),
        areaArcsec2: number
          .gt(0, 'An area lies above 0 and below 1e8 square arcseconds.')
          .lt(1e8, 'An area lies above 0 and below 1e8 square arcseconds.'),
      }),
    ],
    'A geometry is of the kind point, extended or uniform.',
  )
  .default({ kind: 'point' })
  .meta({ description: 'A point when not given; the brightness of a uniform source is per square arcsecond' })

const source = z.discriminatedUnion(
  'kind',
  [
    exactly({
      kind: z.literal('magnitude'),
      ab: magnitude.optional().meta({ description: 'Not wanted where the limit is solved for' }),
      band: bandName.optional().meta({
        description: 'Band the magnitude is given in; where the mode works when not given',
      }),
      spectrum: spectrum.optional(),
      wavelengthA: wavelengthA.optional(),
      geometry,
    }),
    exactly({
      kind: z.literal('line'),
      fluxErgSCm2: number
        .gt(0, 'A flux lies above 0 and below 1 erg/s/cm².')
        .lt(1, 'A flux lies above 0 and below 1 erg/s/cm².')
        .optional()
        .meta({ description: 'Not wanted where the limit is solved for' }),
      wavelengthA,
      widthKmS: number
        .min(0, 'A width lies between 0 and 100,000 km/s.')
        .max(100_000, 'A width lies between 0 and 100,000 km/s.')
        .meta({ description: 'Full width at half maximum before the instrument' }),
      continuumAb: magnitude.optional(),
      geometry,
    }),
  ],
  'A source is of the kind magnitude or line.',
)

const conditions = exactly({
  airmass: number.min(1, 'An airmass lies between 1 and 40.').max(40, 'An airmass lies between 1 and 40.'),
  seeingArcsec: number
    .gt(0, 'A seeing lies above 0 and at most at 20 arcseconds.')
    .max(20, 'A seeing lies above 0 and at most at 20 arcseconds.')
    .meta({ description: 'At the zenith and 500 nm' }),
  moon: z.enum(['dark', 'grey', 'bright'], 'The Moon is dark, grey or bright.'),
  transparency: number
    .gt(0, 'A transparency lies above 0 and at most at 1.')
    .max(1, 'A transparency lies above 0 and at most at 1.')
    .optional(),
  skyAbArcsec2: magnitude.optional().meta({ description: 'Measured sky, in place of the computed one' }),
  slitAngle: z.enum(['parallactic', 'across'], 'A slit angle is parallactic or across.').optional(),
  guideWavelengthA: wavelengthA.optional(),
})

/** An exposure of the observatory's own: wavelengths in angstroms, `timeS` open shutter over all sub-exposures. */
export const exposureRequest = exactly({
  mode: z
    .union([z.string().max(60), z.number().int()], 'Give the slug or the id of a mode.')
    .meta({ description: 'Slug or id, from GET /api/v1/modes' }),
  source,
  conditions,
  solve: z.enum(['snr', 'time', 'limit'], 'Solve for snr, time or limit.'),
  snr: number
    .gt(0, 'A signal-to-noise lies above 0 and at most at 1e6.')
    .max(1e6, 'A signal-to-noise lies above 0 and at most at 1e6.')
    .optional(),
  timeS: number
    .gt(0, 'A time lies above 0 and at most at 1e7 s.')
    .max(1e7, 'A time lies above 0 and at most at 1e7 s.')
    .optional(),
  per: z
    .enum(
      ['image', 'pixel', 'angstrom', 'resolution-element'],
      'This counts per image, pixel, angstrom or resolution-element.',
    )
    .optional()
    .meta({ description: 'The image of an imaging mode, a resolution element of a spectrum when not given' }),
})

export type ExposureRequest = z.output<typeof exposureRequest>
