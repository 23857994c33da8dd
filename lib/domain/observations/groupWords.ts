import { countInWords, formatHoursFromSeconds } from '@/lib/format'
import type { GroupComputation } from './types'

const inWords = (count: number) => countInWords(count, '', '').trim()
const capital = (text: string) => text.charAt(0).toUpperCase() + text.slice(1)
const are = (count: number) => (count === 1 ? 'is' : 'are')

/** What a group wants: 'three of five wanted'. */
function wantedWords({ rule, atLeast, size }: GroupComputation): string {
  if (rule === 'backup') return 'used only when the others cannot be'
  if (rule === 'at-least') return `${inWords(atLeast ?? 1)} of ${inWords(size)} wanted`
  return size === 1 ? 'the one in it is wanted' : `all ${inWords(size)} wanted`
}

/** How its targets stand: 'four are feasible, one is marginal'. */
function standingWords({ size, feasible, marginal, unasked }: GroupComputation): string {
  const first =
    feasible === size && size > 1
      ? `all are feasible`
      : feasible === 0
        ? 'none is feasible'
        : `${inWords(feasible)} ${are(feasible)} feasible`
  return [
    first,
    ...(marginal > 0 ? [`${inWords(marginal)} ${are(marginal)} marginal`] : []),
    ...(unasked > 0 ? [`${inWords(unasked)} ${are(unasked)} not observed yet`] : []),
  ].join(', ')
}

/** How a group stands, to go on with: 'three of five wanted, four are feasible'. */
export const groupInBrief = (group: GroupComputation): string =>
  group.size === 0 ? 'nothing in it yet' : `${wantedWords(group)}, ${standingWords(group)}`

/** How a group stands, in a sentence: 'Three of five wanted; four are feasible.' */
export const groupSentence = (group: GroupComputation): string =>
  group.size === 0 ? 'Nothing is in it yet.' : `${capital(wantedWords(group))}; ${standingWords(group)}.`

/** How the hours of a group count, in a sentence. */
export function groupHoursSentence({
  rule,
  hoursFor,
  atLeast,
  size,
  askedSeconds,
}: GroupComputation): string {
  const hours = formatHoursFromSeconds(askedSeconds)
  if (rule === 'backup') return 'It adds nothing to the hours asked.'
  if (rule === 'at-least' && hoursFor === 'at-least' && (atLeast ?? 1) < size)
    return `${hours} asked, for ${inWords(atLeast ?? 1)} of them: those that take longest, so that any will fit.`
  return size === 1 ? `${hours} asked.` : `${hours} asked, for all ${inWords(size)}.`
}
