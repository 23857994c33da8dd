import type { NightsLine } from '@/lib/domain/decisions/nightsView'
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
  const left = line.whyNot.left < 180 ? 'nothing' : formatHoursFromSeconds(line.whyNot.left)
  return `${left} left, ${formatHoursFromSeconds(line.leastSeconds)} is the least`
}

/** What stands beside given hours: `, in reserve, visitor, dark time`. */
export function termsInWords(line: Pick<NightsLine, 'isReserve' | 'service' | 'conditions'>): string {
  return [line.isReserve ? 'in reserve' : '', line.service === 'visitor' ? 'visitor' : '', line.conditions]
    .filter(Boolean)
    .map((term) => `, ${term}`)
    .join('')
}
