import { choiceWords } from '@/lib/domain/decisions/choiceWords'
import type { NightsView } from '@/lib/domain/decisions/nightsView'
import { formatList, formatNumber, formatSigned } from '@/lib/format'
import { trialChanges } from './trialChanges'

/** What a trial asks for proposals, and what it would change: `In: 14-071. Out: 14-083.` */
export function changesInWords(view: NightsView): string {
  const { comeIn, goOut, differ } = trialChanges(view.rows)
  const tried = view.rows.flatMap(({ reviewNumber, tried: choice }) =>
    choice ? [`${reviewNumber}: ${choiceWords[choice]}.`] : [],
  )
  const gained = differ.reduce((sum, { seconds }) => sum + seconds, 0) / 3600
  const others = differ.map(
    ({ reviewNumber, seconds }) => `${reviewNumber} ${formatSigned(seconds / 3600, 1)}\u00a0h`,
  )
  const sentences = [
    ...tried,
    ...(comeIn.length > 0 ? [`In: ${formatList(comeIn)}.`] : []),
    ...(goOut.length > 0 ? [`Out: ${formatList(goOut)}.`] : []),
    ...(others.length > 4
      ? [`${others.length} others change by ${formatNumber(gained, 1)}\u00a0h in all.`]
      : others.length > 0
        ? [`Otherwise: ${formatList(others)}.`]
        : []),
  ]
  return comeIn.length + goOut.length + differ.length > 0
    ? sentences.join(' ')
    : [...sentences, 'The suggestion stays as it is.'].join(' ')
}
