import { formatDayWithYear, formatMoney } from '@/lib/format'
import type { Letter } from '../letter'

/** An invoice, to the institute that is to pay it and to whoever leads the proposal. */
export function invoiceIssued(facts: {
  name: string
  number: string
  institute: string
  purchaseOrder: string
  reference: string
  title: string
  amountMinor: number
  currency: string
  dueAt: Date
  /** Where it is paid to, on one line. */
  payTo: string
  url: string
}): Letter {
  const amount = formatMoney(facts.amountMinor, facts.currency)
  return {
    template: 'fee-invoice',
    subject: `Invoice ${facts.number} for ${facts.reference}`,
    greeting: `Dear ${facts.name},`,
    paragraphs: [
      `The fee for “${facts.title}” goes to ${facts.institute} by invoice; it is attached. While the invoice is open, the proposal stays in.`,
      `Pay to: ${facts.payTo}. Name the number of the invoice.`,
    ],
    facts: [
      ['Invoice', facts.number],
      ['Amount', amount],
      ['To be paid by', formatDayWithYear(facts.dueAt)],
      ...(facts.purchaseOrder ? [['Purchase order', facts.purchaseOrder] as const] : []),
    ],
    action: { label: 'See the proposal', url: facts.url },
    attachment: facts.number,
  }
}
