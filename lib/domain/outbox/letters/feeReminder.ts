import { formatMoneyShort, formatUtcWithYear } from '@/lib/format'
import type { Letter } from '../letter'

/** To whoever leads a proposal whose fee is still owed: how much, until when, and what happens then. */
export function feeReminder(facts: {
  name: string
  reference: string
  title: string
  callNumber: number
  amountMinor: number
  currency: string
  dueAt: Date
  url: string
}): Letter {
  const amount = formatMoneyShort(facts.amountMinor, facts.currency)
  return {
    template: 'fee-reminder',
    subject: `${facts.reference}: the fee is still to be settled`,
    greeting: `Dear ${facts.name},`,
    paragraphs: [
      `“${facts.title}” is in, and its fee of ${amount} is still to be settled. Pay by card, have it invoiced to an institute, or ask for a waiver.`,
      `What is not settled by ${formatUtcWithYear(facts.dueAt)} lapses: the proposal then leaves call ${facts.callNumber}.`,
    ],
    action: { label: 'Settle the fee', url: facts.url },
  }
}
