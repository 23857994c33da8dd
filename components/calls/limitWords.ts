import type { CallKind } from '@/lib/domain/calls/types'
import { countInWords, formatNumber } from '@/lib/format'

/** How long a justification may be: `2,000 words of justification with six figures, or 4 pages as a PDF`. */
export function limitWords(kind: Pick<CallKind, 'pageLimit' | 'wordLimit' | 'figureLimit'>): string {
  const figures = kind.figureLimit === null ? '' : ` with ${countInWords(kind.figureLimit, 'figure')}`
  return `${formatNumber(kind.wordLimit)} words of justification${figures}, or ${kind.pageLimit} pages as a PDF`
}
