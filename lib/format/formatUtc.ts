import { utcParts } from './utcParts'

/** Date and time without the year, for what is near: `31 March 22:00 UTC`. */
export function formatUtc(at: Date): string {
  const { day, month, hour, minute } = utcParts(at)
  return `${day} ${month} ${hour}:${minute} UTC`
}
