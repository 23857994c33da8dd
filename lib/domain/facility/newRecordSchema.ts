import { z } from 'zod'
import { firstEvening } from './recordSchema'

const shortName = z
  .string()
  .trim()
  .min(1, 'Give it a short name.')
  .max(40, 'A short name has at most 40 characters.')
  .regex(
    /^[a-z0-9]+(-[a-z0-9]+)*$/,
    'Small letters, digits and single hyphens between them, as quillon-ridge.',
  )
  // The page on which records begin has this address.
  .refine((slug) => slug !== 'new', 'This word is taken: choose another one.')

/** What everything new is called. */
export const nameFields = {
  name: z.string().trim().min(1, 'Give it a name.').max(80, 'A name has at most 80 characters.'),
  /** Stands in addresses and never changes. */
  slug: shortName,
}

/** What carries it: the short name of a site, telescope or instrument. */
export const carrier = (what: string) => z.string().min(1, `Choose the ${what}.`).max(60)

/** What a new record says besides its facts. */
export const newRecordFields = { ...nameFields, validFrom: firstEvening }
