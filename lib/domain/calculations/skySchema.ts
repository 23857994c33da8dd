import { z } from 'zod'
import { refuse } from '@/lib/errors'

export const siteInput = z.object({
  latitudeDeg: z
    .number()
    .min(-90, 'A latitude lies between −90° and +90°.')
    .max(90, 'A latitude lies between −90° and +90°.'),
  longitudeDeg: z
    .number()
    .min(-180, 'A longitude lies between −180° and +180°, east positive.')
    .max(360, 'A longitude lies between −180° and +180°, east positive.'),
  elevationM: z
    .number()
    .min(-500, 'An elevation lies between −500 and 10,000 m.')
    .max(10_000, 'An elevation lies between −500 and 10,000 m.'),
})

export const targetInput = z.object({
  id: z.string().min(1).max(120),
  raDeg: z
    .number()
    .min(0, 'A right ascension lies between 0° and 360°.')
    .lt(360, 'A right ascension lies between 0° and 360°.'),
  decDeg: z
    .number()
    .min(-90, 'A declination lies between −90° and +90°.')
    .max(90, 'A declination lies between −90° and +90°.'),
  pmRaMasYr: z.number().optional(),
  pmDecMasYr: z.number().optional(),
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
  .string()
  .refine(
    (text) =>
      /^\d{4}-\d{2}-\d{2}$/.test(text) && new Date(`${text}T00:00:00Z`).toJSON()?.slice(0, 10) === text,
    'An evening date is written as 2027-07-01.',
  )
