import type { SubjectEntry } from '@/db/queries/logbook'
import { formatMoney } from '@/lib/format'
import type { FeeEvent } from './feeEvents'

type Facts = Record<string, unknown>

const factsOf = (value: unknown): Facts =>
  typeof value === 'object' && value !== null ? (value as Facts) : {}

const text = (value: unknown): string =>
  typeof value === 'string' || typeof value === 'number' ? String(value) : ''

const disputeWords: Record<string, string> = {
  'ask-again': 'Lost dispute: the fee is asked for again',
  waive: 'Lost dispute: the fee is waived',
  withdraw: 'Lost dispute: the proposal is withdrawn',
  accept: 'Lost dispute: the loss is taken',
}

type Told = readonly [words: string, tone?: FeeEvent['tone']]

/** What each entry of the logbook means for a fee; a sentence of the amount, the numbers and the reason given. */
const told: Record<string, (after: Facts, before: Facts, amount: string) => Told> = {
  'proposal.send': () => ['Proposal sent', 'settled'],
  'proposal.reopen': () => ['Proposal reopened'],
  'proposal.withdraw': (after) => [`Proposal withdrawn: ${text(after.reason)}`, 'refused'],
  'proposal.lapse': () => ['Not settled within the grace: the proposal lapsed', 'refused'],
  'fee.pay': (after, _, amount) => [
    after.meaning === 'settles the fee'
      ? `${amount} paid; receipt ${text(after.receipt)}`
      : `${amount} ${text(after.meaning)}; receipt ${text(after.receipt)}, and it goes back`,
    'settled',
  ],
  'fee.ask-waiver': () => ['A waiver was asked for'],
  'fee.decide-waiver': (after) =>
    after.decision === 'granted'
      ? ['Waiver granted', 'settled']
      : [`Waiver refused: ${text(after.note)}`, 'refused'],
  'fee.invoice': (after, _, amount) => [
    `Invoice ${text(after.invoice)} over ${amount} to ${text(after.institute)}`,
  ],
  'fee.settle-invoice': (after, before, amount) => [
    `${amount} reached the bank on invoice ${text(before.invoice)}; ${text(after.bank)}`,
    'settled',
  ],
  'fee.cancel-invoice': (after, before) => [
    `Invoice ${text(before.invoice)} taken back by credit note ${text(after.creditNote)}: ${text(after.reason)}`,
  ],
  'fee.decide-refund': (after, _, amount) => [`Refund of ${amount} decided: ${text(after.reason)}`],
  'fee.refund': (after, _, amount) =>
    after.state === 'failed'
      ? [`Refund of ${amount} failed: ${text(after.failure) || 'the firm gives no reason'}`, 'refused']
      : [`${amount} given back; credit note ${text(after.creditNote)}`, 'settled'],
  'fee.dispute': (after, _, amount) =>
    after.state === 'open'
      ? [`The card holder disputes ${amount} with the bank`, 'refused']
      : after.state === 'won'
        ? [`Dispute over ${amount} won`, 'settled']
        : [`Dispute over ${amount} lost`, 'refused'],
  'fee.decide-dispute': (after, _, amount) => [
    `${disputeWords[text(after.decision)] ?? 'Dispute decided'}, ${amount}: ${text(after.note)}`,
  ],
  'fee.remind': () => ['Reminder written'],
  'fee.reconcile': (after) => [
    `Held against the firm’s list: ${text(after.repaired) || text(after.difference)}`,
  ],
}

/** An entry of the logbook as an event of a fee; null where it has nothing to do with it. */
export function loggedEvent(entry: SubjectEntry, currency: string): FeeEvent | null {
  const after = factsOf(entry.after)
  const amount =
    typeof after.amountMinor === 'number' ? formatMoney(after.amountMinor, currency) : 'The amount'
  const found = told[entry.action]?.(after, factsOf(entry.before), amount)
  if (!found) return null
  const [words, tone = 'plain'] = found
  // A notice may arrive in somebody's own request; the firm, not they, did it.
  const who = entry.actingAs === 'payment firm' || entry.actingAs === 'clock' ? null : entry.name
  return { at: entry.at, words, who, tone }
}
