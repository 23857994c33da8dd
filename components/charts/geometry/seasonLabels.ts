import { formatUtcMinute } from '@/lib/format'
import { seasonHours } from './season'

export interface HourLabel {
  hour: number
  local: string
  utc: string
}

/** Labels of the hour axis, every `step` hours, as the site's clock and as UTC. */
export function hourLabels(utcOffsetHours: number, step: number): HourLabel[] {
  const labels: HourLabel[] = []
  for (let hour: number = seasonHours.from; hour <= seasonHours.to; hour += step) {
    const at = new Date(Date.UTC(2000, 0, 1) + (hour - utcOffsetHours) * 3_600_000)
    labels.push({
      hour,
      local: formatUtcMinute(at, utcOffsetHours).slice(0, 2),
      utc: formatUtcMinute(at).slice(0, 2),
    })
  }
  return labels
}
