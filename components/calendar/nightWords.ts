import type { NightElsewhere } from '@/lib/domain/calendar/nightElsewhere'
import type { CalendarNight } from '@/lib/domain/calendar/types'
import { formatCalendarDate, formatHoursFromSeconds, formatPercent } from '@/lib/format'

const short = { science: 'science', engineering: 'engineering', promised: 'promised' } as const

/** One night in a sentence, for its cell: `5 August 2027: science, 9.4 h (LANTERN); Moon 12 % lit`. */
export function nightWords(
  night: CalendarNight,
  instruments: readonly { id: number; name: string }[],
  elsewhere: readonly NightElsewhere[] = [],
): string {
  const parts = night.parts.map(({ useFor, darkSeconds, instrumentId, note }) => {
    const instrument = instruments.find(({ id }) => id === instrumentId)?.name
    const also = [instrument, note].filter(Boolean).join(', ')
    return `${short[useFor]}, ${formatHoursFromSeconds(darkSeconds)}${also ? ` (${also})` : ''}`
  })
  const what = parts.length > 0 ? parts.join('; ') : 'for nothing'
  const calls = [
    ...new Set(
      elsewhere.filter(({ eveningDate }) => eveningDate === night.date).map((one) => one.callNumber),
    ),
  ]
  const others = calls.map((number) => `; offered by call ${number}`).join('')
  return `${formatCalendarDate(night.date)}: ${what}; Moon ${formatPercent(night.moonLit)} lit${others}`
}
