import { z } from 'zod'
import { refuse } from '@/lib/errors'
import { formatNumber } from '@/lib/format'

/** What one call may ask for. */
export const mostRedshifts = 100_000
export const mostTargets = 500
export const mostNights = 400
export const mostInstants = 1_000
export const mostWavelengths = 10_000

/** Refuses a list that is longer than one call may be. */
export function requireAtMost(list: readonly unknown[], most: number, what: string): void {
  if (list.length > most)
    throw refuse.tooLarge(
      `${formatNumber(list.length)} ${what} were given; one call takes at most ${formatNumber(most)}.`,
    )
}

/**
 * A list schema that counts before it looks at what is in the list, so that a million wrong values cost no more
 * than one. Its description stays that of the list.
 */
export function listOf<T extends z.ZodType>(item: T, most: number, what: string) {
  return z.preprocess(
    (value) => {
      if (Array.isArray(value)) requireAtMost(value, most, what)
      return value
    },
    z.array(item, `Give a list of ${what}.`).meta({ maxItems: most }),
  )
}
