import { z } from 'zod'
import { fieldErrorsOf } from '@/lib/fieldErrorsOf'
import { refuse } from '@/lib/errors'
import { earliestMjd, latestMjd } from './limits'

const number = String.raw`[+-]?\d{1,9}(?:\.\d{0,15})?(?:[eE][+-]?\d{1,3})?`
const pair = new RegExp(`^(${number}),(${number})$`)
const range = new RegExp(`^(${number})?/(${number})?$`)

const position = z
  .string('POS is wanted: a right ascension and a declination, as POS=52,-27.8.')
  .transform((text, context) => {
    const [, ra, dec] = pair.exec(text.replaceAll(' ', '')) ?? []
    if (ra === undefined || dec === undefined)
      context.addIssue({
        code: 'custom',
        message: 'POS is a right ascension and a declination, as 52,-27.8.',
      })
    else if (!(Number(ra) >= 0 && Number(ra) <= 360))
      context.addIssue({
        code: 'custom',
        message: 'The right ascension of POS lies between 0 and 360 degrees.',
      })
    else if (!(Math.abs(Number(dec)) <= 90))
      context.addIssue({ code: 'custom', message: 'The declination of POS lies between -90 and 90 degrees.' })
    return { raDeg: Number(ra) % 360, decDeg: Number(dec) }
  })

const within = (mjd: number | null) => mjd === null || (mjd >= earliestMjd && mjd <= latestMjd)

const time = z.string().transform((text, context) => {
  const found = range.exec(text.replaceAll(' ', ''))
  const [, from, to] = found ?? []
  const asked = {
    fromMjd: from === undefined ? null : Number(from),
    toMjd: to === undefined ? null : Number(to),
  }
  if (!found)
    context.addIssue({
      code: 'custom',
      message: 'TIME is one range of modified Julian dates, as 61430/61460.',
    })
  else if (!within(asked.fromMjd) || !within(asked.toMjd))
    context.addIssue({ code: 'custom', message: `TIME lies between ${earliestMjd} and ${latestMjd}.` })
  else if (asked.fromMjd !== null && asked.toMjd !== null && asked.toMjd <= asked.fromMjd)
    context.addIssue({ code: 'custom', message: 'TIME ends before it begins.' })
  return asked
})

/** What each format is called, and the media type it is sent as. */
const formats = new Map<string, { kind: 'votable' | 'csv'; mediaType: string }>([
  ['votable', { kind: 'votable', mediaType: 'application/x-votable+xml' }],
  ['application/x-votable+xml', { kind: 'votable', mediaType: 'application/x-votable+xml' }],
  ['text/xml', { kind: 'votable', mediaType: 'text/xml' }],
  ['csv', { kind: 'csv', mediaType: 'text/csv' }],
  ['text/csv', { kind: 'csv', mediaType: 'text/csv' }],
])

const format = z.string().transform((text, context) => {
  const found = formats.get(text.split(';')[0]?.trim().toLowerCase() ?? '')
  if (!found) context.addIssue({ code: 'custom', message: 'RESPONSEFORMAT is votable or csv.' })
  return found ?? { kind: 'votable' as const, mediaType: 'application/x-votable+xml' }
})

/** The parameters of a query by their names in capitals. Unknown ones are left aside (DALI 1.1, section 3.3). */
export const observabilityQuery = z.object({
  POS: position.meta({ description: 'Right ascension and declination, ICRS degrees, as 52,-27.8' }),
  TIME: time.prefault('/').meta({
    description: 'Range of modified Julian dates, UTC, as 61430/61460; now to a year on when left open',
  }),
  MAXREC: z
    .string()
    .regex(/^\d{1,9}$/, 'MAXREC is a whole number, 0 or more.')
    .transform(Number)
    .optional()
    .meta({ description: 'Most rows; 0 for none but what describes them' }),
  MIN_OBS: z
    .string()
    .regex(/^\d{1,9}(\.\d{0,9})?$/, 'MIN_OBS is a number of seconds, 0 or more.')
    .transform(Number)
    .prefault('0')
    .meta({ description: 'Shortest window, seconds' }),
  FACILITY: z
    .string()
    .trim()
    .max(80, 'A FACILITY has at most 80 characters.')
    .optional()
    .meta({ description: 'Name of a telescope, or of the observatory' }),
  RESPONSEFORMAT: format.prefault('votable').meta({ description: 'votable or csv' }),
})

export type ObservabilityAsked = z.output<typeof observabilityQuery>

/** Reads a query: names in any case, each once; an empty value is as none. Refuses with a sentence a field. */
export function readAsked(parameters: URLSearchParams): ObservabilityAsked {
  const given = new Map<string, string>()
  for (const [name, value] of parameters) {
    const key = name.toUpperCase()
    if (!(key in observabilityQuery.shape) || value === '') continue
    if (given.has(key)) throw refuse.field(key, `${key} is given once.`)
    given.set(key, value)
  }
  const read = observabilityQuery.safeParse(Object.fromEntries(given))
  if (read.success) return read.data
  const wrong = fieldErrorsOf(read.error)
  throw refuse.invalid(Object.values(wrong).join(' '), wrong)
}
