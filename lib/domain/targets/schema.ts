import { z } from 'zod'
import { parseDeclination, parseRightAscension } from '@/lib/science/sky'
import { SERSIC_LEAST, SERSIC_MOST } from '@/lib/science/exposure'
import { parseMagnitude } from '@/lib/science/magnitude'
import { restLines } from '@/lib/science/light'
import { parseRedshift, readNumber } from '@/lib/science/redshift'
import type { TargetValues } from './types'
import { readBandChoice } from './bands'
import { longestSpectrum, readSpectrumTable } from './spectrumTable'
import { spectrumOf } from './spectrumOf'
import { typedNumber } from './typedNumber'
import { typedText } from './typedText'

const angle = (read: typeof parseRightAscension) => (text: string) => {
  const answer = read(text)
  return answer.ok ? { ok: true, value: answer.deg } : answer
}

const lineNames = restLines.map(({ name }) => name) as [string, ...string[]]

/** A number above 0, most often in powers of ten. */
const positive = (text: string) => {
  const value = readNumber(text)
  return value !== null && value > 0
    ? { ok: true, value }
    : { ok: false, message: 'Write a number above 0, such as 2.5e-17.' }
}

/** Far outside these, flux and luminosity have been taken for each other. */
const lineRange = { flux: [1e-22, 1e-6], luminosity: [1e30, 1e52] } as const

const cells = z.object({
  name: z
    .string()
    .transform((text) => text.trim())
    .pipe(z.string().min(1, 'Give the target a name.').max(120, 'A name has at most 120 characters.')),
  ra: typedText(angle(parseRightAscension)),
  dec: typedText(angle(parseDeclination)),
  redshift: typedText(parseRedshift, 20),
  redshiftType: z.enum(['spectroscopic', 'photometric', 'assumed']),
  redshiftError: typedNumber('A redshift error', 0, 10),
  redshiftFrame: z.enum(['heliocentric', 'cmb']),
  magnitude: typedText(parseMagnitude),
  magnitudeError: typedNumber('A magnitude error', 0, 5),
  /** Band and system as one choice: 'r AB'. */
  band: z.string().max(12),
  provenance: z.enum(['observed', 'predicted']),
  source: z.string().trim().max(240, 'A source has at most 240 characters.'),
  need: z.enum(['required', 'optional', 'backup']),
  /** Name of its group; empty for none. */
  group: z.string().trim().max(120, 'A group’s name has at most 120 characters.'),
  event: z.string().trim().max(120, 'A class of event has at most 120 characters.'),
  trigger: z.string().trim().max(240, 'A trigger has at most 240 characters.'),
  reaction: typedNumber('A reaction time', 0.1, 8760),
  triggers: typedNumber('A number of triggers', 1, 100),
  geometry: z.enum(['point', 'sersic', 'uniform']),
  effectiveRadius: typedNumber('A half-light radius', 0.01, 600),
  effectiveRadiusError: typedNumber('An error of the half-light radius', 0, 600),
  sersicIndex: typedNumber('A Sérsic index', SERSIC_LEAST, SERSIC_MOST),
  ebv: typedNumber('A reddening E(B−V)', 0, 5),
  magnification: typedNumber('A magnification', 0.01, 1000),
  magnificationError: typedNumber('An error of the magnification', 0, 1000),
  lineName: z.union([z.literal(''), z.enum(lineNames)], 'This line is not on the list.'),
  lineKind: z.enum(['flux', 'luminosity']),
  lineValue: typedText(positive),
  lineError: typedText(positive),
  lineWidth: typedNumber('A line width', 0, 20_000),
  spectrum: z.enum(['flat', 'power-law', 'black-body', 'table']),
  spectralIndex: typedNumber('A spectral index', -10, 10),
  spectralIndexError: typedNumber('An error of the spectral index', 0, 10),
  temperature: typedNumber('A temperature in kelvin', 100, 1_000_000),
  spectrumTable: typedText(readSpectrumTable, longestSpectrum),
  pmRa: typedNumber('A proper motion', -20_000, 20_000),
  pmDec: typedNumber('A proper motion', -20_000, 20_000),
  epoch: typedNumber('An epoch', 1900, 2100),
})

type Cells = z.output<typeof cells>

/** What is awaited says all four: what, on which sign, how soon and how often. */
function awaitedProblems({ event, trigger, reaction, triggers }: Cells): [keyof Cells, string][] {
  if (event === '' && trigger === '' && reaction.typed === '' && triggers.typed === '') return []
  const problems: [keyof Cells, string | false][] = [
    ['event', event === '' && 'Say what class of event is awaited.'],
    ['trigger', trigger === '' && 'Say what must be seen before it is observed.'],
    ['reaction', reaction.value === null && 'Say within how many hours of the trigger it must be observed.'],
    [
      'triggers',
      triggers.value === null
        ? 'Say how many triggers you ask for.'
        : !Number.isInteger(triggers.value) && 'Triggers are counted in whole numbers.',
    ],
  ]
  return problems.flatMap(([cell, words]): [keyof Cells, string][] => (words ? [[cell, words]] : []))
}

/** Cells that only make sense together. */
function together(values: Cells, ctx: z.RefinementCtx): void {
  const need = (path: keyof Cells, message: string) => ctx.addIssue({ code: 'custom', path: [path], message })
  if (values.ra.value === null && values.dec.value !== null)
    need('ra', 'A declination needs its right ascension.')
  if (values.dec.value === null && values.ra.value !== null)
    need('dec', 'A right ascension needs its declination.')
  if (values.magnitude.value !== null && !readBandChoice(values.band))
    need('band', 'Say in which band and system the magnitude is.')
  if (values.geometry !== 'point' && values.effectiveRadius.value === null)
    need('effectiveRadius', 'An extended source needs its half-light radius.')
  const [radius, error] = [values.effectiveRadius.value, values.effectiveRadiusError.value]
  if (error !== null && radius === null)
    need('effectiveRadiusError', 'An error needs the half-light radius it is of.')
  if (error !== null && radius !== null && error > radius)
    need(
      'effectiveRadiusError',
      'An error larger than the size itself leaves no size: call it a point source.',
    )
  if (values.spectrum === 'power-law' && values.spectralIndex.value === null)
    need('spectralIndex', 'A power law needs its index.')
  if (values.spectrum === 'black-body' && values.temperature.value === null)
    need('temperature', 'A black body needs its temperature.')
  if (values.spectrum === 'table' && values.spectrumTable.value === null)
    need('spectrumTable', 'Choose the file of the spectrum, or another shape.')
  for (const [path, message] of awaitedProblems(values)) need(path, message)
  const line = values.lineValue.value
  if (values.lineName !== '' && line === null) need('lineValue', `Give the ${values.lineKind} of the line.`)
  const [least, most] = lineRange[values.lineKind]
  if (values.lineName !== '' && line !== null && (line < least || line > most))
    need(
      'lineValue',
      values.lineKind === 'flux'
        ? 'A line flux is given in erg/s/cm², some 1e-17; this looks like a luminosity.'
        : 'A line luminosity is given in erg/s, some 1e42; this looks like a flux.',
    )
}

function toValues(c: Cells): TargetValues {
  const band = readBandChoice(c.band)
  return {
    name: c.name,
    raTyped: c.ra.typed,
    decTyped: c.dec.typed,
    raDeg: c.ra.value,
    decDeg: c.dec.value,
    epochYr: c.epoch.value ?? 2016,
    pmRaMasYr: c.pmRa.value,
    pmDecMasYr: c.pmDec.value,
    geometry: c.geometry,
    effectiveRadiusArcsec: c.effectiveRadius.value,
    effectiveRadiusErrorArcsec: c.effectiveRadiusError.value,
    sersicIndex: c.geometry === 'sersic' ? (c.sersicIndex.value ?? 1) : null,
    redshiftTyped: c.redshift.typed,
    redshift: c.redshift.value,
    redshiftError: c.redshiftError.value,
    redshiftFrame: c.redshiftFrame,
    redshiftType: c.redshiftType,
    need: c.need,
    group: c.group === '' ? null : c.group,
    opportunity:
      c.reaction.value === null || c.triggers.value === null
        ? null
        : {
            event: c.event,
            trigger: c.trigger,
            reactionSeconds: Math.round(c.reaction.value * 3600),
            triggers: c.triggers.value,
          },
    galacticEbv: c.ebv.value,
    magnification: c.magnification.value,
    magnificationError: c.magnificationError.value,
    spectrum: spectrumOf(c.spectrum, {
      index: c.spectralIndex.value,
      indexError: c.spectralIndexError.value,
      temperatureK: c.temperature.value,
      table: c.spectrumTable.value,
    }),
    line:
      c.lineName === '' || c.lineValue.value === null
        ? null
        : {
            name: c.lineName,
            kind: c.lineKind,
            value: c.lineValue.value,
            error: c.lineError.value,
            widthKmS: c.lineWidth.value ?? 0,
          },
    brightness:
      c.magnitude.value === null || !band
        ? null
        : {
            value: c.magnitude.value,
            error: c.magnitudeError.value,
            system: band.system,
            band: band.band,
            provenance: c.provenance,
            source: c.source,
          },
  }
}

/** One row of the targets table: text as typed in, a target's values out, each message at its cell. */
export const targetRowSchema = cells.superRefine(together).transform(toValues)

export type TargetRow = z.input<typeof targetRowSchema>
