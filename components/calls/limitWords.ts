import type { CallKind } from '@/lib/domain/calls/types'
import { countInWords, formatList, formatNumber } from '@/lib/format'

/** Words and figures of a justification, where a kind limits them. */
export function alsoLimited(kind: Pick<CallKind, 'wordLimit' | 'figureLimit'>): string[] {
  return [
    ...(kind.wordLimit === null ? [] : [`${formatNumber(kind.wordLimit, 0)} words`]),
    ...(kind.figureLimit === null ? [] : [countInWords(kind.figureLimit, 'figure')]),
  ]
}

/** How long a justification may be: `Four pages, 2,400 words and six figures of justification`. */
export function limitWords(kind: Pick<CallKind, 'pageLimit' | 'wordLimit' | 'figureLimit'>): string {
  const pages = countInWords(kind.pageLimit, 'page', 'pages', true)
  return `${formatList([pages, ...alsoLimited(kind)])} of justification`
}
