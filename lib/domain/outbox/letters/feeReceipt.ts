import { formatMoney, formatUtcInstant } from '@/lib/format'
import type { Letter } from '../letter'

export interface ReceiptFacts {
  name: string
  reference: string
  title: string
  number: string
  amountMinor: number
  currency: string
  cardLast4: string | null
  paidAt: Date
  meaning: 'settles the fee' | 'came too late' | 'came twice'
  url: string
}

const sentences = {
  'settles the fee': 'The fee is settled. Nothing more is owed.',
  'came too late':
    'It came when the fee was no longer owed, so it goes back in full to the card it came from.',
  'came twice': 'The fee had been paid already, so this payment goes back in full to the card it came from.',
} as const

/** The receipt of a payment, with what it means for the fee. */
export function feeReceipt(facts: ReceiptFacts): Letter {
  const amount = formatMoney(facts.amountMinor, facts.currency)
  return {
    template: 'fee-receipt',
    subject: `Receipt ${facts.number} for ${facts.reference}`,
    greeting: `Dear ${facts.name},`,
    paragraphs: [`${amount} for “${facts.title}” reached us. ${sentences[facts.meaning]}`],
    facts: [
      ['Receipt', facts.number],
      ['Proposal', facts.reference],
      ['Paid', facts.cardLast4 ? `${amount}, card ending ${facts.cardLast4}` : amount],
      ['At', formatUtcInstant(facts.paidAt)],
    ],
    action: { label: 'See the receipt', url: facts.url },
  }
}
