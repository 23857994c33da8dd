import { formatCalendarDate } from '@/lib/format'

/** `July to December 2027`; both years where the season spans two. */
export function seasonWords(from: string, to: string): string {
  const month = (date: string) => formatCalendarDate(date, false).replace(/^\d+ /, '')
  const [firstYear, lastYear] = [from.slice(0, 4), to.slice(0, 4)]
  const first = firstYear === lastYear ? month(from) : `${month(from)} ${firstYear}`
  return `${first} to ${month(to)} ${lastYear}`
}
