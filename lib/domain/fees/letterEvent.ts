import type { FeeLetter } from '@/db/queries/feeEvents'
import type { FeeEvent } from './feeEvents'

const names: Record<string, string> = {
  'fee-receipt': 'Receipt',
  'fee-invoice': 'Invoice',
  'invoice-settled': 'Word of the payment',
  'credit-note': 'Credit note',
  'waiver-asked': 'Request for a waiver',
  'waiver-decided': 'Answer about the waiver',
  'fee-reminder': 'Reminder',
  'fee-dispute': 'Word of the dispute',
  'dispute-decided': 'Word of the decision',
  'refund-failed': 'Word of the failed refund',
  'proposal-lapsed': 'Word of the lapse',
}

/** A letter that was sent, as an event of a fee. */
export function letterEvent(letter: FeeLetter): FeeEvent | null {
  const name = names[letter.template]
  return name ? { at: letter.at, words: `${name} sent to ${letter.toName}`, who: null, tone: 'plain' } : null
}
