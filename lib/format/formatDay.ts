import { utcParts } from './utcParts'

/** The day of an instant in UTC: `31 March`. */
export function formatDay(at: Date): string {
  const { day, month } = utcParts(at)
  return `${day} ${month}`
}
