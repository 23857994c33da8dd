import { countInWords, formatNumber } from '@/lib/format'
import { paths } from '@/lib/paths'
import type { ProposalContents } from '../types'
import type { Finding, Missing } from './finding'

/** The justification, within the pages the kind allows. */
export function papersFinding({ papers, kind, reference }: ProposalContents): Finding {
  const href = paths.proposalSection(reference, 'papers')
  const justification = papers.find((paper) => paper.kind === 'justification')
  const expertise = papers.find((paper) => paper.kind === 'team-expertise')
  const lacks = (sentence: string): Missing => ({ section: 'papers', field: 'justification', sentence, href })
  if (!justification) {
    const limit = countInWords(kind.pageLimit, 'page')
    return {
      begun: Boolean(expertise),
      detail: `The justification as a PDF, at most ${limit}`,
      missing: [lacks('Add the justification.')],
    }
  }
  const isLong = justification.pages > kind.pageLimit
  const isWordy = kind.wordLimit !== null && (justification.words ?? 0) > kind.wordLimit
  return {
    begun: true,
    detail: `${justification.fileName}, ${justification.pages} of ${countInWords(kind.pageLimit, 'page')}${expertise ? '; the team’s expertise' : ''}`,
    missing: [
      ...(isLong ? [lacks(`Shorten the justification to ${countInWords(kind.pageLimit, 'page')}.`)] : []),
      ...(isWordy ? [lacks(`Shorten the justification to ${formatNumber(kind.wordLimit ?? 0, 0)} words.`)] : []),
    ],
    wrong: isLong || isWordy,
  }
}
