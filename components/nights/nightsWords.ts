import type { NightsLine, NightsView } from '@/lib/domain/decisions/nightsView'
import { countInWords, formatHoursFromSeconds, formatNumber, formatPercent } from '@/lib/format'

/** `92.0`, or `13.5 of 27.0` in part. */
export function hoursOf(line: Pick<NightsLine, 'wholeSeconds'>, seconds: number): string {
  const given = formatNumber(seconds / 3600, 1)
  return seconds < line.wholeSeconds ? `${given} of ${formatNumber(line.wholeSeconds / 3600, 1)}` : given
}

/** Who would lose most, and how many others: `; displaces 7.5 h of 14-071 and 2.0 h of 14-083`. */
function displacedInWords(displaces: NonNullable<NightsLine['whyNot']>['displaces']): string {
  const worst = [...displaces].sort((a, b) => b.seconds - a.seconds)
  const [first, second] = worst.map(
    ({ reviewNumber, seconds }) => `${formatHoursFromSeconds(seconds)} of ${reviewNumber}`,
  )
  if (!first) return ''
  if (worst.length > 2) return `; displaces ${first} and time of ${worst.length - 1} others`
  return `; displaces ${first}${second ? ` and ${second}` : ''}`
}

/** Behind a least useful award: who says so. Half of the whole needs no word. */
export const leastByWords: Readonly<Record<NightsLine['leastBy'], string>> = {
  chair: ', as the chair set',
  investigators: ', as they say',
  half: '',
}

/** Why the suggestion gives a line nothing. */
export function whyNotInWords(
  line: Pick<NightsLine, 'whyNot' | 'leastSeconds' | 'leastBy' | 'assessment'>,
): string {
  if (!line.whyNot) return 'only together with its other instrument'
  if (line.whyNot.reason === 'set-aside') return 'set aside'
  if (line.whyNot.reason === 'never') return 'never, as laid down'
  if (line.whyNot.reason === 'below-line') return 'below the line: visits are given nights down to it'
  if (line.whyNot.reason === 'not-possible')
    return `assessed as not possible${line.assessment ? `: ${line.assessment.reason}` : ''}`
  if (line.whyNot.nights) return whyNoNights(line.whyNot, line.whyNot.nights)
  const left = line.whyNot.left < 180 ? 'nothing' : formatHoursFromSeconds(line.whyNot.left)
  const least = `${formatHoursFromSeconds(line.leastSeconds)} is the least${leastByWords[line.leastBy]}`
  if (line.whyNot.reason === 'not-usable') return `${left} that its targets can use, ${least}`
  return `${left} left, ${least}${displacedInWords(line.whyNot.displaces)}`
}

/** Why a visit has no nights: none suit it, or others have them. */
function whyNoNights(
  { reason, displaces }: NonNullable<NightsLine['whyNot']>,
  { most, least }: { most: number; least: number },
): string {
  const fewest = `${countInWords(least, 'night is', 'nights are')} the least`
  if (reason === 'no-nights')
    return `${most === 0 ? 'no night suits' : `${countInWords(most, 'night suits', 'nights suit')}`} its visit, ${fewest}`
  return `other visits have its nights, ${fewest}${displacedInWords(displaces)}`
}

/** What stands beside given hours: `, in reserve, visitor, dark time`. */
export function termsInWords(
  line: Pick<NightsLine, 'isReserve' | 'service' | 'evenings' | 'conditions'>,
): string {
  return [
    line.isReserve ? 'in reserve' : '',
    line.service === 'visitor' ? `visitor on ${line.evenings}` : '',
    line.conditions,
  ]
    .filter(Boolean)
    .map((term) => `, ${term}`)
    .join('')
}

/** While something is tried, what the line has as things stand, where that differs: `, was 12.0`. */
export function standsInWords(line: Pick<NightsLine, 'standsSeconds' | 'suggestedSeconds'>): string {
  if (line.standsSeconds === null || line.standsSeconds === line.suggestedSeconds) return ''
  return `, was ${line.standsSeconds === 0 ? 'none' : formatNumber(line.standsSeconds / 3600, 1)}`
}

/** `65.3 h to plan with: 22 % lost to weather, 10.0 h held back for the director.` */
export function plannedInWords(
  telescope: Pick<
    NightsView['telescopes'][number],
    'plannedSeconds' | 'visitSeconds' | 'heldSeconds' | 'heldReason'
  >,
  weather: NightsView['weather'],
): string {
  const { plannedSeconds, visitSeconds, heldSeconds, heldReason } = telescope
  const visits = visitSeconds > 0 ? `, ${formatHoursFromSeconds(visitSeconds)} for visits` : ''
  const lost =
    weather.lostShare > 0
      ? `${formatPercent(weather.lostShare)} of the dark time lost to weather`
      : weather.isRecorded
        ? 'no weather counted'
        : 'no weather on record'
  const held =
    heldSeconds > 0
      ? `, ${formatHoursFromSeconds(heldSeconds)} held back${heldReason ? `: ${heldReason}` : '.'}`
      : '.'
  return `${formatHoursFromSeconds(plannedSeconds)} to plan with: ${lost}${visits}${held}`
}

/** `, visit on 2027-05-03, one of two nights`: the nights suggested, and how many were asked for where these are fewer. */
export function visitSuggestedInWords(line: Pick<NightsLine, 'suggestedEvenings' | 'visit'>): string {
  const count = line.suggestedEvenings.split(', ').length
  const asked = line.visit?.nights ?? count
  const part =
    count < asked ? `, ${countInWords(count, 'of', 'of')} ${countInWords(asked, 'night', 'nights')}` : ''
  return `, visit on ${line.suggestedEvenings}${part}`
}
