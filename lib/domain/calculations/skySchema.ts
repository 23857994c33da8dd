import { z } from 'zod'
import { refuse } from '@/lib/errors'
import { isCalendarDay } from '../calendarDay'
import { exactly } from './exactly'

const number = z.number('This is a number.')

export const siteInput = exactly({
  latitudeDeg: number
    .min(-90, 'A latitude lies between −90° and +90°.')
    .max(90, 'A latitude lies between −90° and +90°.'),
  longitudeDeg: number
    .min(-180, 'A longitude lies between −180° and +180°, east positive.')
    .max(360, 'A longitude lies between −180° and +180°, east positive.'),
  elevationM: number
    .min(-500, 'An elevation lies between −500 and 10,000 m.')
    .max(10_000, 'An elevation lies between −500 and 10,000 m.'),
})

export const targetInput = exactly({
  id: z
    .string('An id has 1 to 120 characters.')
    .min(1, 'An id has 1 to 120 characters.')
    .max(120, 'An id has 1 to 120 characters.'),
  raDeg: number
    .min(0, 'A right ascension lies between 0° and 360°.')
    .lt(360, 'A right ascension lies between 0° and 360°.'),
  decDeg: number
    .min(-90, 'A declination lies between −90° and +90°.')
    .max(90, 'A declination lies between −90° and +90°.'),
  pmRaMasYr: number.optional(),
  pmDecMasYr: number.optional(),
})

/** Ids tell the targets of an answer apart. */
export function requireOwnIds(targets: readonly { id: string }[]): void {
  const seen = new Set<string>()
  targets.forEach(({ id }, index) => {
    if (seen.has(id)) throw refuse.field(`targets.${index}.id`, `Two targets have the id “${id}”.`)
    seen.add(id)
  })
}

export const evening = z
  .string('An evening date is written as 2027-07-01.')
  .refine(isCalendarDay, 'An evening date is written as 2027-07-01.')
