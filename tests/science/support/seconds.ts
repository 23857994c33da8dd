/** Seconds between a date and an ISO 8601 time. */
export function secondsApart(found: Date, expected: string): number {
  return Math.abs(found.getTime() - new Date(expected).getTime()) / 1000
}
