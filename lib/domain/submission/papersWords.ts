import { countInWords, formatBytes, formatNumber } from '@/lib/format'
import { countWords } from '@/lib/writing/countWords'
import { parseText } from '@/lib/writing/parseText'
import type { ProposalContents } from '../proposals/types'
import { readBibtex } from '../writings/readBibtex'

/** The justification in a line: the document, or what is written here. */
export function papersWords(
  contents: Pick<ProposalContents, 'papers' | 'writings' | 'figures' | 'kind'>,
): string {
  const { papers, writings, figures, kind } = contents
  const paper = papers.find((one) => one.kind === 'justification')
  if (paper)
    return `${paper.fileName}, ${paper.pages} of ${countInWords(kind.pageLimit, 'page')}, ${formatBytes(paper.sizeBytes)}`
  const words = countWords(parseText(writings.justification.text))
  if (words === 0) return 'Nothing yet'
  const { references } = readBibtex(writings.references.text)
  return [
    `${formatNumber(words)} of ${formatNumber(kind.wordLimit)} words`,
    figures.length > 0 ? countInWords(figures.length, 'figure') : '',
    references.length > 0 ? countInWords(references.length, 'reference') : '',
  ]
    .filter(Boolean)
    .join(', ')
}
