import { z } from 'zod'
import { bands } from '@/lib/science/light'
import { optionalQuantity, quantity } from './quantity'
import { carrier, newRecordFields } from './newRecordSchema'
import { versionFields } from './recordSchema'
import { throughputTable } from './throughputSchema'
import type { ModeFacts } from './types'

/** What a throughput table may count already. */
export const throughputParts = [
  'telescope',
  'optics',
  'filter',
  'grating',
  'slit',
  'detector',
  'atmosphere',
] as const

const electrons = ' e⁻'
const seconds = '\u00a0s'
const duration = (what: string) => quantity({ what, low: 0, high: 36_000, unit: seconds })
const wavelength = (what: string) => quantity({ what, low: 1000, high: 300_000, unit: '\u00a0Å' })

const fields = {
  kind: z.enum(['imaging', 'long-slit'], 'Say whether it takes images or spectra.'),
  wavelengthMinA: wavelength('The blue end'),
  wavelengthMaxA: wavelength('The red end'),
  medium: z.enum(['air', 'vacuum'], 'Say whether wavelengths are in air or in vacuum.'),
  band: z
    .string()
    .trim()
    .refine((band) => band === '' || Object.hasOwn(bands, band), 'This band is not computed with.'),
  pixelScaleArcsec: quantity({ what: 'A pixel scale', low: 0.005, high: 20, unit: '″ a pixel' }),
  dispersionAPerPixel: optionalQuantity({
    what: 'A dispersion',
    low: 0.0005,
    high: 500,
    unit: '\u00a0Å a pixel',
  }),
  slitWidthArcsec: optionalQuantity({ what: 'A slit width', low: 0.02, high: 60, unit: '″' }),
  resolvingPower: optionalQuantity({ what: 'A resolving power', low: 5, high: 1_000_000 }),
  readNoiseE: quantity({ what: 'A read noise', low: 0, high: 1000, unit: electrons }),
  readNoisePer: z.enum(['read', 'ramp'], 'Say what the read noise is of.'),
  darkEPerS: quantity({ what: 'A dark current', low: 0, high: 1000, unit: `${electrons} a second` }),
  fullWellE: quantity({ what: 'A full well', low: 100, high: 100_000_000, unit: electrons }),
  gainEPerAdu: quantity({ what: 'A gain', low: 0.01, high: 1000, unit: `${electrons} a count` }),
  minSubExposureS: quantity({ what: 'A shortest sub-exposure', low: 0.001, high: 36_000, unit: seconds }),
  maxSubExposureS: quantity({ what: 'A longest sub-exposure', low: 0.001, high: 36_000, unit: seconds }),
  systematicFloor: quantity({ what: 'A systematic floor', low: 0, high: 0.1 }),
  twilightLimitDeg: quantity({ what: 'The Sun’s altitude', low: -18, high: 0, unit: '°' }),
  skySubtraction: z.enum(['around', 'paired', 'blank-sky'], 'Say how the sky is taken off.'),
  backgroundPixels: optionalQuantity({
    what: 'A number of pixels',
    low: 1,
    high: 100_000_000,
    whole: true,
  }),
  thermalEPerS: quantity({ what: 'A glow', low: 0, high: 1_000_000, unit: `${electrons} a second` }),
  opticsArcsec: quantity({ what: 'An image of the optics', low: 0, high: 60, unit: '″' }),
  dispersionCorrected: z.boolean(),
  filters: z.string().trim().max(200, 'At most 200 characters fit here.'),
  calibrationPolicy: z.string().trim().max(600, 'At most 600 characters fit here.'),
  throughput: throughputTable,
  throughputIncludes: z.array(z.enum(throughputParts)).max(throughputParts.length),
  acquisitionS: duration('An acquisition'),
  readoutS: duration('A read-out'),
  ditherS: duration('A dither'),
  calibrationFraction: quantity({ what: 'A share for calibration', low: 0, high: 2 }),
}

type Fields = z.output<z.ZodObject<typeof fields>>

/** Fields that only make sense together. */
function together(value: Fields, ctx: z.RefinementCtx): void {
  const say = (path: keyof Fields, message: string) => ctx.addIssue({ code: 'custom', path: [path], message })
  if (value.wavelengthMaxA <= value.wavelengthMinA) say('wavelengthMaxA', 'The red end lies beyond the blue.')
  if (value.maxSubExposureS < value.minSubExposureS)
    say('maxSubExposureS', 'The longest sub-exposure is not shorter than the shortest.')
  if (value.kind === 'imaging' && value.band === '') say('band', 'An imaging mode needs its band.')
  if (value.kind === 'long-slit') {
    if (value.dispersionAPerPixel === null) say('dispersionAPerPixel', 'A long slit needs its dispersion.')
    if (value.slitWidthArcsec === null) say('slitWidthArcsec', 'A long slit needs its width.')
    if (value.resolvingPower === null) say('resolvingPower', 'A long slit needs its resolving power.')
  }
  const first = value.throughput[0]
  const last = value.throughput.at(-1)
  if (!first || !last) return
  if (first.wavelengthA > value.wavelengthMinA || last.wavelengthA < value.wavelengthMaxA)
    say('throughput', 'The table does not cover the whole range of the mode.')
  else if (value.throughput.every(({ efficiency }) => efficiency === 0))
    say('throughput', 'No light comes through: every efficiency is 0.')
}

function factsOf({ acquisitionS, readoutS, ditherS, calibrationFraction, ...rest }: Fields): ModeFacts {
  return {
    ...rest,
    band: rest.band === '' ? null : rest.band,
    overheads: { acquisitionS, readoutS, ditherS, calibrationFraction },
  }
}

const version = z.object({ ...versionFields, ...fields })
const record = version
  .superRefine(together)
  .transform(({ slug, over, validFrom, ...rest }) => ({ slug, over, validFrom, facts: factsOf(rest) }))

export type ModeForm = z.input<typeof version>

const beginning = z.object({ ...newRecordFields, of: carrier('instrument'), ...fields })
const begun = beginning.superRefine(together).transform(({ slug, name, of, validFrom, ...rest }) => ({
  slug,
  name,
  of,
  validFrom,
  facts: factsOf(rest),
}))

export type NewModeForm = z.input<typeof beginning>

const slitOnly = { dispersionAPerPixel: '', slitWidthArcsec: '', resolvingPower: '' }

/** What the other kind needs does not show in the form: whatever was typed there is let go. */
function ownFields(given: unknown): unknown {
  if (typeof given !== 'object' || given === null || !('kind' in given)) return given
  if (given.kind === 'imaging') return { ...given, ...slitOnly }
  return given.kind === 'long-slit' ? { ...given, band: '' } : given
}

/** A new version of a mode's record: text as typed in, facts out. */
export const modeRecordSchema = z.preprocess(ownFields, record) as z.ZodType<
  z.output<typeof record>,
  ModeForm
>

/** A new mode of an instrument with its first record. */
export const newModeSchema = z.preprocess(ownFields, begun) as z.ZodType<z.output<typeof begun>, NewModeForm>
