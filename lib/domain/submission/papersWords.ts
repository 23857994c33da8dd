import { formatBytes, formatList } from '@/lib/format'
import type { Context } from '../context'
import { readPaperNames } from '../papers/readPaperNames'
import type { ProposalContents } from '../proposals/types'

/** The justification in a line, with what was found in it that a reviewer should not read. */
export async function papersWords(
  ctx: Pick<Context, 'storage'>,
  contents: ProposalContents,
): Promise<string> {
  const paper = contents.papers.find(({ kind }) => kind === 'justification')
  if (!paper) return 'Nothing yet'
  const size = `${paper.fileName}, ${paper.pages} of ${contents.kind.pageLimit} ${contents.kind.pageLimit === 1 ? 'page' : 'pages'}, ${formatBytes(paper.sizeBytes)}`
  const found = await readPaperNames(ctx, paper, contents.people)
  if (found === null) return size
  if (found.length === 0) return `${size}; no names found in text or properties`
  return `${size}; it names ${formatList(found.map(({ name }) => name))}`
}
