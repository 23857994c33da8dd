import { ScienceError } from '../ScienceError'

const J2000_MS = Date.UTC(2000, 0, 1, 12)
const DAY_MS = 86_400_000

/** Days of universal time since 2000 January 1, 12:00. UTC stands for UT1; they stay within 0.9 s. */
export function daysOf(at: Date): number {
  const ms = at.getTime()
  if (Number.isNaN(ms)) throw new ScienceError('bad-date', 'This is not a moment in time.')
  return (ms - J2000_MS) / DAY_MS
}

export function dateOf(days: number): Date {
  return new Date(Math.round(days * DAY_MS) + J2000_MS)
}

/** UTC midnight of a calendar date, in days. Refuses what is not a date of the years 1900 to 2200. */
export function midnightOf(date: string): number {
  const at = new Date(`${date}T00:00:00Z`)
  const year = at.getUTCFullYear()
  const real = /^\d{4}-\d{2}-\d{2}$/.test(date) && !Number.isNaN(at.getTime()) && calendarDate(at) === date
  if (!real) throw new ScienceError('bad-date', `“${date}” is not a date: write it as 2027-07-01.`)
  if (year < 1900 || year > 2200) {
    throw new ScienceError('bad-date', 'The sky is computed for the years 1900 to 2200.')
  }
  return daysOf(at)
}

export function calendarDate(at: Date): string {
  return at.toISOString().slice(0, 10)
}

export function dateAfter(date: string, days: number): string {
  return calendarDate(dateOf(midnightOf(date) + days))
}

/** Every date from `from` to `to`, both included; at most ten years. */
export function datesBetween(from: string, to: string): string[] {
  const first = midnightOf(from)
  const count = midnightOf(to) - first + 1
  if (count < 1) throw new ScienceError('bad-date', 'The last night lies before the first.')
  if (count > 3653)
    throw new ScienceError('bad-date', 'At most ten years of nights can be asked for at once.')
  return Array.from({ length: count }, (_, i) => calendarDate(dateOf(first + i)))
}
