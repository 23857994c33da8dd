import { formatMoneyShort, formatUtcWithYear } from '@/lib/format'
import type { Letter } from '../letter'

/** To the office: someone asks that a fee be waived, and why. */
export function waiverAsked(facts: {
  name: string
  reference: string
  title: string
  askedBy: string
  reason: string
  amountMinor: number
  currency: string
  dueAt: Date
  url: string
}): Letter {
  const amount = formatMoneyShort(facts.amountMinor, facts.currency)
  return {
    template: 'waiver-asked',
    subject: `${facts.reference}: a waiver of the fee is asked for`,
    greeting: `Dear ${facts.name},`,
    paragraphs: [
      `${facts.askedBy} asks that the fee of ${amount} for “${facts.title}” be waived, and writes:`,
      facts.reason,
      'Until you decide, the proposal does not lapse for its fee.',
    ],
    facts: [
      ['Reference', facts.reference],
      ['Fee', amount],
      ['Due', formatUtcWithYear(facts.dueAt)],
    ],
    action: { label: 'Decide it', url: facts.url },
  }
}
