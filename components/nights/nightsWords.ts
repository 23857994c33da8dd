import type { NightsLine } from '@/lib/domain/decisions/readNights'
import { formatHoursFromSeconds, formatNumber } from '@/lib/format'

/** `92.0`, or `13.5 of 27.0` in part. */
export function hoursOf(line: Pick<NightsLine, 'wholeSeconds'>, seconds: number): string {
  const given = formatNumber(seconds / 3600, 1)
  return seconds < line.wholeSeconds ? `${given} of ${formatNumber(line.wholeSeconds / 3600, 1)}` : given
}

/** Why the suggestion gives a line nothing. */
export function whyNotInWords(line: Pick<NightsLine, 'whyNot' | 'leastSeconds' | 'assessment'>): string {
  if (!line.whyNot) return 'only together with its other instrument'
  if (line.whyNot.reason === 'set-aside') return 'set aside'
  if (line.whyNot.reason === 'not-possible')
    return `assessed as not possible${line.assessment ? `: ${line.assessment.reason}` : ''}`
  return `${formatHoursFromSeconds(line.whyNot.left)} left, ${formatHoursFromSeconds(line.leastSeconds)} is the least`
}
