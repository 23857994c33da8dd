import { formatMoney } from '@/lib/format'
import { paths } from '@/lib/paths'
import type { Letter } from '../letter'

const words = {
  open: {
    subject: 'a payment is disputed',
    text: 'The holder of the card disputes this payment with the bank. The firm holds the amount until the bank has decided; answer on its pages. Meanwhile nothing of it can be given back from here.',
  },
  won: {
    subject: 'the dispute is won',
    text: 'The bank has decided: the payment stands, and the amount is released.',
  },
  lost: {
    subject: 'the dispute is lost',
    text: 'The bank has decided for the holder of the card: the amount is gone. What becomes of the proposal is for the office to say.',
  },
} as const

/** To the office: a card payment is disputed, or the bank has decided. */
export function disputeTold(facts: {
  name: string
  reference: string
  amountMinor: number
  currency: string
  status: keyof typeof words
  origin: string
}): Letter {
  const { subject, text } = words[facts.status]
  return {
    template: 'fee-dispute',
    subject: `${facts.reference}: ${subject}`,
    greeting: `Dear ${facts.name},`,
    paragraphs: [text],
    facts: [
      ['Proposal', facts.reference],
      ['Amount', formatMoney(facts.amountMinor, facts.currency)],
    ],
    action: { label: 'See the fee', url: `${facts.origin}${paths.officeFee(facts.reference)}` },
  }
}
