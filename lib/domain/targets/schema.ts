import { z } from 'zod'
import { parseDeclination, parseRightAscension } from '@/lib/science/sky'
import { SERSIC_LEAST, SERSIC_MOST } from '@/lib/science/exposure'
import { parseMagnitude } from '@/lib/science/magnitude'
import { parseRedshift } from '@/lib/science/redshift'
import type { TargetValues } from './types'
import { readBandChoice } from './bands'
import { typedNumber } from './typedNumber'
import { typedText } from './typedText'

const angle = (read: typeof parseRightAscension) => (text: string) => {
  const answer = read(text)
  return answer.ok ? { ok: true, value: answer.deg } : answer
}

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
  geometry: z.enum(['point', 'sersic', 'uniform']),
  effectiveRadius: typedNumber('A half-light radius', 0.01, 600),
  sersicIndex: typedNumber('A Sérsic index', SERSIC_LEAST, SERSIC_MOST),
  pmRa: typedNumber('A proper motion', -20_000, 20_000),
  pmDec: typedNumber('A proper motion', -20_000, 20_000),
  epoch: typedNumber('An epoch', 1900, 2100),
})

type Cells = z.output<typeof cells>

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
    sersicIndex: c.geometry === 'sersic' ? (c.sersicIndex.value ?? 1) : null,
    redshiftTyped: c.redshift.typed,
    redshift: c.redshift.value,
    redshiftError: c.redshiftError.value,
    redshiftFrame: c.redshiftFrame,
    redshiftType: c.redshiftType,
    need: c.need,
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
