import { z } from 'zod'
import { formatNumber } from '@/lib/format'
import { quantity } from './quantity'

/** Every proposal that observes with a mode keeps its table: more rows than this take room and say nothing more. */
export const mostThroughputRows = 2000

const cell = {
  at: quantity({ what: 'A wavelength', low: 1000, high: 300_000, unit: '\u00a0Å' }),
  value: quantity({ what: 'An efficiency', low: 0, high: 1 }),
}

/** Efficiency against wavelength: rows as typed in, numbers out; each message at its cell. */
export const throughputTable = z
  .array(z.object({ at: z.string(), value: z.string() }))
  .min(2, 'Give at least two rows.')
  .max(mostThroughputRows, `At most ${formatNumber(mostThroughputRows)} rows are kept.`)
  .transform((rows, ctx) => {
    const read: { wavelengthA: number; efficiency: number }[] = []
    let before: number | null = null
    rows.forEach((row, index) => {
      const say = (path: 'at' | 'value', message: string) =>
        ctx.addIssue({ code: 'custom', path: [index, path], message })
      const at = cell.at.safeParse(row.at)
      const value = cell.value.safeParse(row.value)
      if (!at.success) say('at', at.error.issues[0]?.message ?? '')
      else if (before !== null && at.data === before) say('at', 'This wavelength stands in the row before.')
      else if (before !== null && at.data < before) say('at', 'Wavelengths grow from row to row.')
      if (!value.success) say('value', value.error.issues[0]?.message ?? '')
      if (at.success) before = at.data
      if (at.success && value.success) read.push({ wavelengthA: at.data, efficiency: value.data })
    })
    return read
  })
