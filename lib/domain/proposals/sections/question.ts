import { countInWords, formatNumber } from '@/lib/format'
import { paths } from '@/lib/paths'
import type { ProposalContents } from '../types'
import type { Finding, Missing } from './finding'

/** Title, abstract within its limit, category. */
export function questionFinding(contents: ProposalContents): Finding {
  const { title, abstract, category, kind, reference } = contents
  const length = [...abstract].length
  const href = paths.proposalSection(reference, 'question')
  const lacks = (field: string, sentence: string): Missing => ({ section: 'question', field, sentence, href })
  const missing: Missing[] = []
  if (title === '') missing.push(lacks('title', 'Give the proposal a title.'))
  if (abstract.trim() === '') missing.push(lacks('abstract', 'Write the abstract.'))
  if (length > kind.abstractLimit) {
    const over = countInWords(length - kind.abstractLimit, 'character')
    missing.push(lacks('abstract', `Shorten the abstract by ${over}.`))
  }
  if (category === '') missing.push(lacks('category', 'Choose a category.'))
  const there = [
    title === '' ? '' : 'title',
    length > 0 ? `abstract of ${formatNumber(length)} characters` : '',
    category === '' ? '' : 'category',
  ].filter(Boolean)
  const detail = there.length > 0 ? there.join(', ') : 'Title, abstract, category'
  return {
    begun: abstract !== '' || category !== '',
    detail: detail.charAt(0).toUpperCase() + detail.slice(1),
    missing,
    wrong: length > kind.abstractLimit,
  }
}
