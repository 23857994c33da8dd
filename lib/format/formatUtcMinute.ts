import { utcParts } from './utcParts'

/** The clock alone, to the minute, where the head already says UTC: `02:14`. */
export function formatUtcMinute(at: Date, offsetHours = 0): string {
  const { hour, minute } = utcParts(at, offsetHours)
  return `${hour}:${minute}`
}
