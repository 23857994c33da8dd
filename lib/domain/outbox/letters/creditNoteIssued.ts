import { formatMoney } from '@/lib/format'
import type { Letter } from '../letter'

/** A credit note, to those who lead the proposal and to the institute that had the invoice. */
export function creditNoteIssued(facts: {
  name: string
  number: string
  /** Of the invoice it takes back, or whose money is given back. */
  invoiceNumber: string | null
  reference: string
  title: string
  amountMinor: number
  currency: string
  /** Money has gone back; else an invoice is taken back and nothing was paid. */
  isMoney: boolean
  url: string
}): Letter {
  const amount = formatMoney(facts.amountMinor, facts.currency)
  return {
    template: 'credit-note',
    subject: `Credit note ${facts.number} for ${facts.reference}`,
    greeting: `Dear ${facts.name},`,
    paragraphs: [
      facts.isMoney
        ? `${amount} of the fee for “${facts.title}” has been given back. The credit note is attached.`
        : `Invoice ${facts.invoiceNumber ?? ''} for “${facts.title}” is taken back: nothing is to be paid on it. The credit note is attached.`,
    ],
    facts: [
      ['Credit note', facts.number],
      ...(facts.invoiceNumber ? [['Invoice', facts.invoiceNumber] as const] : []),
      ['Proposal', facts.reference],
      ['Amount', amount],
    ],
    action: { label: 'See the proposal', url: facts.url },
    attachment: facts.number,
  }
}
