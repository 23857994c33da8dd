import { csvText } from '@/lib/format'
import type { TelescopeCalendar } from './types'

export const calendarHeads = ['telescope', 'evening', 'from', 'to', 'use', 'instrument', 'note'] as const

const fraction = (value: number) => String(Math.round(value * 1000) / 1000)

/**
 * The night calendar as a file that can be changed elsewhere and read back: a line for each part of each night, and
 * one with `none` for a night that is for nothing. The hours at the end are for reading only.
 */
export function calendarCsv(telescopes: readonly TelescopeCalendar[]): string {
  const rows = telescopes.flatMap(({ name, instruments, nights }) =>
    nights.flatMap(({ date, darkSeconds, parts }) =>
      parts.length === 0
        ? [[name, date, '0', '1', 'none', '', '', (darkSeconds / 3600).toFixed(3)]]
        : parts.map((part) => [
            name,
            date,
            fraction(part.from),
            fraction(part.to),
            part.useFor,
            instruments.find(({ id }) => id === part.instrumentId)?.name ?? '',
            part.note,
            (part.darkSeconds / 3600).toFixed(3),
          ]),
    ),
  )
  return csvText([...calendarHeads, 'dark hours'], rows)
}
