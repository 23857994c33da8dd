import { z } from 'zod'
import { bands } from '@/lib/science/light'
import { quantity, type Quantity } from './quantity'

export const knownBands = Object.keys(bands)

const row = z.object({ at: z.string(), value: z.string() })

/** A table of a value by band: as typed in, a record by band out; each message at its cell. */
export function bandTable(of: Quantity) {
  const cell = quantity(of)
  return z
    .array(row)
    .min(1, 'Give at least one band.')
    .max(knownBands.length, 'There are more rows than bands.')
    .transform((rows, ctx): Record<string, number> => {
      const found: Record<string, number> = {}
      rows.forEach(({ at, value }, index) => {
        const band = at.trim()
        const say = (path: 'at' | 'value', message: string) =>
          ctx.addIssue({ code: 'custom', path: [index, path], message })
        if (band === '') say('at', 'Name the band.')
        else if (!Object.hasOwn(bands, band))
          say('at', `${band} is not a band that is computed with; known are ${knownBands.join(', ')}.`)
        else if (Object.hasOwn(found, band)) say('at', `${band} is given twice.`)
        const read = cell.safeParse(value)
        if (read.success) found[band] = read.data
        else say('value', read.error.issues[0]?.message ?? 'This cannot be read.')
      })
      return found
    })
}

/** What the two tables of a site hold. */
export const extinctionQuantity: Quantity = {
  what: 'An extinction',
  low: 0,
  high: 3,
  unit: ' mag an airmass',
}
export const darkSkyQuantity: Quantity = {
  what: 'A dark sky',
  low: 5,
  high: 30,
  unit: ' AB mag a square arcsecond',
}
