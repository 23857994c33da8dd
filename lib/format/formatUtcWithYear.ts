import { utcParts } from './utcParts'

/** Date with year and time to the minute: `31 March 2027, 22:00 UTC`. */
export function formatUtcWithYear(at: Date): string {
  const { day, month, year, hour, minute } = utcParts(at)
  return `${day} ${month} ${year}, ${hour}:${minute} UTC`
}
