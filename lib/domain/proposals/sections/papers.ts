import { countInWords, formatNumber } from '@/lib/format'
import { paths } from '@/lib/paths'
import { countWords } from '@/lib/writing/countWords'
import { parseText } from '@/lib/writing/parseText'
import { figuresAllowed, maxTeamWords } from '../../writings/limits'
import type { ProposalContents } from '../types'
import type { Finding, Missing } from './finding'

const words = (text: string) => countWords(parseText(text))

/** The justification, as a document within its pages or as a text within its words; a document comes first. */
export function papersFinding(contents: ProposalContents): Finding {
  const { papers, kind, writings, reference } = contents
  const href = paths.proposalSection(reference, 'papers')
  const lacks = (field: string, sentence: string): Missing => ({ section: 'papers', field, sentence, href })
  const justification = papers.find((paper) => paper.kind === 'justification')
  const expertise = papers.some((paper) => paper.kind === 'team-expertise')
  const written = words(writings.justification.text)
  const onTeam = expertise ? 0 : words(writings.team.text)
  const missing: Missing[] = []
  if (justification && justification.pages > kind.pageLimit)
    missing.push(
      lacks('justification', `Shorten the justification to ${countInWords(kind.pageLimit, 'page')}.`),
    )
  if (!justification && written > kind.wordLimit)
    missing.push(
      lacks(
        'justification',
        `Shorten the justification by ${countInWords(written - kind.wordLimit, 'word')}.`,
      ),
    )
  const tooMany = contents.figures.length - figuresAllowed(kind)
  if (!justification && tooMany > 0)
    missing.push(lacks('justification', `Take ${countInWords(tooMany, 'figure')} out of the justification.`))
  if (onTeam > maxTeamWords)
    missing.push(
      lacks('team', `Shorten the words on the team by ${countInWords(onTeam - maxTeamWords, 'word')}.`),
    )
  const wrong = missing.length > 0
  if (!justification && written === 0)
    missing.push(lacks('justification', 'Write the justification, or add it as a PDF.'))
  const team = expertise || onTeam > 0 ? '; the team’s expertise' : ''
  const begun = Boolean(justification) || written > 0 || team !== ''
  return { begun, detail: `${detailOf(contents, written)}${team}`, missing, wrong }
}

function detailOf({ papers, kind, figures }: ProposalContents, written: number): string {
  const paper = papers.find((one) => one.kind === 'justification')
  if (paper) return `${paper.fileName}, ${paper.pages} of ${countInWords(kind.pageLimit, 'page')}`
  const limit = formatNumber(kind.wordLimit)
  if (written === 0) return `The justification, ${limit} words or ${countInWords(kind.pageLimit, 'page')}`
  const pictures = figures.length > 0 ? `, ${countInWords(figures.length, 'figure')}` : ''
  return `${formatNumber(written)} of ${limit} words${pictures}`
}
