import { formatMoney } from '@/lib/format'
import type { Letter } from '../letter'

/** To whoever leads the proposal: the institute has paid its invoice. */
export function invoiceSettled(facts: {
  name: string
  number: string
  institute: string
  reference: string
  title: string
  amountMinor: number
  currency: string
  url: string
}): Letter {
  return {
    template: 'invoice-settled',
    subject: `Invoice ${facts.number} for ${facts.reference} is paid`,
    greeting: `Dear ${facts.name},`,
    paragraphs: [
      `${facts.institute} has paid ${formatMoney(facts.amountMinor, facts.currency)} on invoice ${facts.number}. The fee for “${facts.title}” is settled; nothing more is owed.`,
    ],
    action: { label: 'See the proposal', url: facts.url },
  }
}
