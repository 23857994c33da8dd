import { utcParts } from './utcParts'

/** The day with its year: `31 March 2027`. */
export function formatDayWithYear(at: Date): string {
  const { day, month, year } = utcParts(at)
  return `${day} ${month} ${year}`
}
