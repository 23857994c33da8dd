import { formatDay } from './formatDay'
import { formatDayWithYear } from './formatDayWithYear'

/** A calendar date kept as `YYYY-MM-DD` (no time, no zone), in words: `5 October`, or with its year. */
export function formatCalendarDate(date: string, withYear = true): string {
  const at = new Date(`${date}T00:00:00Z`)
  return withYear ? formatDayWithYear(at) : formatDay(at)
}
