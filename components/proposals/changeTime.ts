import { formatDay, formatUtcMinute } from '@/lib/format'

/** When something changed: the clock for today, the day for before. */
export function changeTime(at: Date, now: Date): string {
  return at.toISOString().slice(0, 10) === now.toISOString().slice(0, 10)
    ? formatUtcMinute(at)
    : formatDay(at)
}
