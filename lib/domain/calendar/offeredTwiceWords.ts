import { countInWords, formatCalendarDate } from '@/lib/format'
import type { NightBlock } from '../calls/nightBlock'
import type { NightElsewhere } from './nightElsewhere'

type Part = Pick<NightBlock, 'eveningDate' | 'from' | 'to' | 'useFor'>

/** Which of these parts of nights another call offers already, in a sentence that names it; null when none. */
export function offeredTwiceWords(
  telescope: string,
  parts: readonly Part[],
  elsewhere: readonly NightElsewhere[],
): string | null {
  const science = parts.filter(({ useFor }) => useFor === 'science')
  const twice = elsewhere.filter(({ eveningDate, from, to }) =>
    science.some((part) => part.eveningDate === eveningDate && part.from < to && from < part.to),
  )
  const [first] = twice.toSorted((a, b) => (a.eveningDate < b.eveningDate ? -1 : 1))
  if (!first) return null
  const more = new Set(twice.map(({ eveningDate }) => eveningDate)).size - 1
  const others = more > 0 ? `, and ${countInWords(more, 'more night', 'more nights')} of these` : ''
  return `Call ${first.callNumber} offers ${telescope} on the night of ${formatCalendarDate(first.eveningDate)} already${others}. A part of a night is offered by one call.`
}
