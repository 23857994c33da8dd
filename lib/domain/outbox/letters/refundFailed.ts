import { formatMoney } from '@/lib/format'
import { paths } from '@/lib/paths'
import type { Letter } from '../letter'

/** To the office: the payment firm could not give money back. */
export function refundFailed(facts: {
  name: string
  reference: string
  amountMinor: number
  currency: string
  failure: string
  origin: string
}): Letter {
  const amount = formatMoney(facts.amountMinor, facts.currency)
  return {
    template: 'refund-failed',
    subject: `${facts.reference}: a refund failed`,
    greeting: `Dear ${facts.name},`,
    paragraphs: [
      `The payment firm could not give ${amount} back for ${facts.reference}.`,
      ...(facts.failure ? [`It says: ${facts.failure}`] : []),
      'The money is still with us. Try again from the page of fees, or find another way with the payer.',
    ],
    action: { label: 'See the fee', url: `${facts.origin}${paths.officeFee(facts.reference)}` },
  }
}
