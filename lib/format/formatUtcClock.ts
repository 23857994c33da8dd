import { utcParts } from './utcParts'

/** The clock alone, to the second: `02:14:07 UTC`. */
export function formatUtcClock(at: Date): string {
  const { hour, minute, second } = utcParts(at)
  return `${hour}:${minute}:${second} UTC`
}
