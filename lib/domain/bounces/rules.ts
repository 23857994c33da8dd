import type { OutboxRow } from '@/db/tables'
import type { DeliveryReport, ReportedRecipient } from './readReport'

/**
 * What a report means for the letter. `bounced`: the address was refused for good. `parked`: the servers gave up for
 * another reason. `noted`: it may still arrive. `known`: that was heard before.
 */
export type BounceOutcome = 'bounced' | 'parked' | 'noted' | 'known'

/** A letter has one recipient, so the worst of what is reported is about it. */
export function worstOf(report: DeliveryReport): ReportedRecipient | null {
  const rank = ({ action, status }: ReportedRecipient) =>
    action === 'failed' ? (status.startsWith('5') ? 3 : 2) : action === 'delayed' ? 1 : 0
  const [worst] = report.recipients.toSorted((a, b) => rank(b) - rank(a))
  return worst && rank(worst) > 0 ? worst : null
}

/** What becomes of a letter; null where the report brings nothing new about it. */
export function outcomeOf(state: OutboxRow['state'], worst: ReportedRecipient): BounceOutcome {
  // A later try, or a stop by the office, is newer than a report about an earlier one.
  if (state !== 'sent') return 'known'
  if (worst.action === 'delayed') return 'noted'
  return worst.status.startsWith('5') ? 'bounced' : 'parked'
}

/** As it is kept with the letter: `5.1.1: No such mailbox`. */
export const saidWords = ({ status, said }: ReportedRecipient): string =>
  `${status}${said ? `: ${said}` : ''}`.replace(/[^\P{Cc}]/gu, ' ').slice(0, 300)
