import { utcParts } from './utcParts'

/** An instant to the second, as it stands on a receipt: `01:04:29 UTC on 21 March 2027`. */
export function formatUtcInstant(at: Date): string {
  const { day, month, year, hour, minute, second } = utcParts(at)
  return `${hour}:${minute}:${second} UTC on ${day} ${month} ${year}`
}
