import type { RecordUse } from '@/lib/domain/facility/types'
import { countInWords, formatCalendarDate } from '@/lib/format'

interface Change {
  use: RecordUse
  /** As typed; may be no date yet. */
  validFrom: string
  /** First evening of the newest version there is. */
  newestFrom: string
  today: string
}

function draftSentence({ callNumber, seasonFrom, count }: RecordUse['drafts'][number], validFrom: string) {
  const drafts = `${countInWords(count, 'draft', 'drafts', true)} of call ${callNumber}`
  const [compute, keep] = count === 1 ? ['computes', 'keeps'] : ['compute', 'keep']
  const season = `the season begins on ${formatCalendarDate(seasonFrom)}`
  return validFrom <= seasonFrom
    ? `${drafts} ${compute} with the new record at once: ${season}.`
    : `${drafts} ${keep} the old record: ${season}, before the first evening.`
}

/** What a new version changes, and for whom: one sentence each. */
export function effectSentences({ use, validFrom, newestFrom, today }: Change): string[] {
  const sentences = use.drafts.map((drafts) => draftSentence(drafts, validFrom))
  if (use.drafts.length === 0) sentences.push('No draft uses it now.')
  if (use.sent === 1) sentences.push('One sent proposal keeps the record it was sent with.')
  if (use.sent > 1)
    sentences.push(
      `${countInWords(use.sent, 'sent proposal', 'sent proposals', true)} keep the record they were sent with.`,
    )
  if (newestFrom > today && validFrom <= newestFrom)
    sentences.push(
      `The record due on ${formatCalendarDate(newestFrom)} is replaced before it comes into force.`,
    )
  return sentences
}
