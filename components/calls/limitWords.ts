import type { CallKind } from '@/lib/domain/calls/types'
import { countInWords, formatList, formatNumber } from '@/lib/format'

/** How long a justification may be: `at most four pages, 2,400 words and six figures of justification`. */
export function limitWords(kind: Pick<CallKind, 'pageLimit' | 'wordLimit' | 'figureLimit'>): string {
  const limits = [
    countInWords(kind.pageLimit, 'page'),
    ...(kind.wordLimit === null ? [] : [`${formatNumber(kind.wordLimit, 0)} words`]),
    ...(kind.figureLimit === null ? [] : [countInWords(kind.figureLimit, 'figure')]),
  ]
  return `${formatList(limits)} of justification`
}
