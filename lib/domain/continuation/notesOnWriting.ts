import { countInWords, formatNumber } from '@/lib/format'
import { countWords } from '@/lib/writing/countWords'
import { parseText } from '@/lib/writing/parseText'
import type { ProposalContents } from '../proposals/types'
import type { CarriedNote } from './types'

/** A justification that was written here came along; what it may be long, and figures it names that did not. */
export function notesOnWriting(old: ProposalContents, now: ProposalContents): CarriedNote[] {
  const notes: CarriedNote[] = []
  const { text } = now.writings.justification
  if (text === '') return notes
  const isFile = now.papers.some(({ kind }) => kind === 'justification')
  if (!isFile && text === old.writings.justification.text)
    notes.push({
      section: 'papers',
      sentence: `The justification is the one written for call ${old.call.number}.`,
      todo: 'Read it through: season, hours and results may have moved on since.',
    })
  const limit = now.kind.wordLimit
  if (limit !== old.kind.wordLimit) {
    const over = countWords(parseText(text)) - limit
    notes.push({
      section: 'papers',
      sentence: `A justification written here has at most ${formatNumber(limit)} words in this call; it was ${formatNumber(old.kind.wordLimit)}.`,
      todo: over > 0 ? `Shorten it by ${countInWords(over, 'word')}.` : 'Yours fits.',
    })
  }
  for (const { label } of old.figures)
    if (text.includes(`@fig:${label}`) && !now.figures.some((figure) => figure.label === label))
      notes.push({
        section: 'papers',
        sentence: `The figure “${label}” of call ${old.call.number} is not here, and the text names it.`,
        todo: 'Add it anew.',
      })
  return notes
}
