import type { PdfText } from './pdfText'

/**
 * Words on the pages of a document, captions and references with them. Numbers and signs between them do not count,
 * and a word parted at the end of a line counts once.
 */
export function wordsIn({ pages }: Pick<PdfText, 'pages'>): number {
  const text = pages.join('\n').replace(/(\p{Ll})[-\u00AD]\s*\n\s*(?=\p{Ll})/gu, '$1')
  return text.match(/[\p{L}\p{N}][\p{L}\p{N}\p{M}'’.-]*/gu)?.filter((word) => /\p{L}/u.test(word)).length ?? 0
}
