import { formatHours } from './formatHours'

/** Time as it is kept (whole seconds), shown in hours: 75,600 is `21.0 h`. */
export function formatHoursFromSeconds(seconds: number | null | undefined): string {
  return formatHours(seconds === null || seconds === undefined ? seconds : seconds / 3600)
}
