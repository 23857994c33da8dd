import { z } from 'zod'
import { parseDeclination, parseRightAscension } from '@/lib/science/sky'
import { isCalendarDay } from '../calendarDay'
import { numberBetween, readable } from './texts'

const DAY_MS = 86_400_000
/** As many nights as the calculation takes at once. */
const MOST_NIGHTS = 400

/** An evening as the calendar writes it: 2027-08-01. */
const evening = readable((text) => {
  if (!isCalendarDay(text)) return { ok: false, message: 'Write a date as 2027-08-01.' }
  const year = Number(text.slice(0, 4))
  return year >= 1900 && year <= 2100
    ? { ok: true }
    : { ok: false, message: 'Sun and Moon are computed from 1900 to 2100.' }
})

/** A position, an airmass and a Moon, from one evening to another. */
export const seasonSchema = z
  .object({
    ra: readable(parseRightAscension),
    dec: readable(parseDeclination),
    airmass: numberBetween('An airmass', 1, 3),
    from: evening,
    to: evening,
    moon: z.enum(['any', 'grey', 'dark']),
    separation: numberBetween('A distance from the Moon', 0, 180),
    /** Short name of a telescope; empty for the site alone. */
    telescope: z.string().max(40, 'There is no such telescope.'),
  })
  .superRefine(({ from, to }, context) => {
    // Said at its own field already.
    if (!evening.safeParse(from).success || !evening.safeParse(to).success) return
    const nights = (Date.parse(to) - Date.parse(from)) / DAY_MS + 1
    if (nights < 1)
      context.addIssue({ code: 'custom', path: ['to'], message: 'The last evening comes before the first.' })
    if (nights > MOST_NIGHTS)
      context.addIssue({ code: 'custom', path: ['to'], message: `At most ${MOST_NIGHTS} nights at once.` })
  })

export type SeasonInput = z.input<typeof seasonSchema>
