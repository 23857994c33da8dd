import { formatMoneyShort, formatUtcWithYear } from '@/lib/format'
import type { Letter } from '../letter'

/** The office's answer to a request to waive a fee. */
export function waiverDecided(facts: {
  name: string
  reference: string
  title: string
  amountMinor: number
  currency: string
  dueAt: Date
  decision: 'granted' | 'refused'
  note: string
  url: string
}): Letter {
  const amount = formatMoneyShort(facts.amountMinor, facts.currency)
  const isGranted = facts.decision === 'granted'
  return {
    template: 'waiver-decided',
    subject: `${facts.reference}: the fee ${isGranted ? 'is waived' : 'is not waived'}`,
    greeting: `Dear ${facts.name},`,
    paragraphs: [
      isGranted
        ? `The fee of ${amount} for “${facts.title}” is waived. Nothing is owed.`
        : `The fee of ${amount} for “${facts.title}” is not waived. It is to be settled by ${formatUtcWithYear(facts.dueAt)}.`,
      ...(facts.note ? [`The office writes: ${facts.note}`] : []),
    ],
    action: { label: isGranted ? 'See the proposal' : 'Settle the fee', url: facts.url },
  }
}
