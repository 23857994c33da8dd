import { z } from 'zod'
import { quantity } from './quantity'
import type { HorizonPoint } from './types'

/** A row a degree: a horizon is not known better, and every computation holds its stars against all of them. */
export const mostHorizonRows = 360

const azimuth = quantity({ what: 'An azimuth', low: 0, high: 360, unit: '°' })
const altitude = quantity({ what: 'A lowest altitude', low: 0, high: 85, unit: '°' })

/** Lowest altitude by azimuth: rows as typed in, numbers out; each message at its cell. No rows are no horizon. */
export const horizonTable = z
  .array(z.object({ at: z.string(), value: z.string() }))
  .max(mostHorizonRows, `At most ${mostHorizonRows} rows are kept.`)
  .transform((rows, ctx): HorizonPoint[] => {
    const read: HorizonPoint[] = []
    let before: number | null = null
    rows.forEach((row, index) => {
      const say = (path: 'at' | 'value', message: string) =>
        ctx.addIssue({ code: 'custom', path: [index, path], message })
      const at = azimuth.safeParse(row.at)
      const value = altitude.safeParse(row.value)
      if (!at.success) say('at', at.error.issues[0]?.message ?? '')
      else if (at.data === 360)
        say('at', 'North is an azimuth of 0°: the table goes on from its last row to its first.')
      else if (before !== null && at.data === before) say('at', 'This azimuth stands in the row before.')
      else if (before !== null && at.data < before) say('at', 'Azimuths grow from row to row.')
      if (!value.success) say('value', value.error.issues[0]?.message ?? '')
      if (at.success) before = at.data
      if (at.success && value.success) read.push({ azimuthDeg: at.data, altitudeDeg: value.data })
    })
    return read
  })
