import { billingRecord } from '@/db/queries/billing'
import { insertCreditNote } from '@/db/queries/invoices'
import type { FeesRow, InvoicesRow } from '@/db/tables'
import { paths } from '@/lib/paths'
import type { Context } from '../context'
import { creditNoteIssued } from '../outbox/letters/creditNoteIssued'
import { queueLetter } from '../outbox/queueLetter'
import type { ProposalContents } from '../proposals/types'
import { drawPaperNumber } from './drawPaperNumber'

export interface CreditNoteWish {
  contents: ProposalContents
  fee: FeesRow
  /** The invoice it takes back or whose money is given back; null for a card payment. */
  invoice: InvoicesRow | null
  refundId: number | null
  amountMinor: number
  reason: string
  /** Who paid by card, where no institute did. */
  payer: string
}

/** Writes a credit note with the next number and mails it, all in the caller's transaction. */
export async function issueCreditNote(tx: Context, wish: CreditNoteWish): Promise<string> {
  const { contents, fee, invoice } = wish
  const number = await drawPaperNumber(tx, 'credit-notes')
  await insertCreditNote(tx.db, {
    number,
    feeId: fee.id,
    invoiceId: invoice?.id ?? null,
    refundId: wish.refundId,
    creditedTo: invoice?.institute ?? wish.payer,
    address: invoice?.address ?? '',
    billingRecordId: (await billingRecord(tx.db))?.id ?? null,
    amountMinor: wish.amountMinor,
    currency: fee.currency,
    reason: wish.reason,
  })
  const facts = {
    number,
    invoiceNumber: invoice?.number ?? null,
    reference: contents.reference,
    title: contents.title,
    amountMinor: wish.amountMinor,
    currency: fee.currency,
    isMoney: wish.refundId !== null,
    url: `${tx.request.origin}${paths.proposalSent(contents.reference)}`,
  }
  const leads = contents.people.filter(({ role }) => role === 'pi')
  const readers = invoice
    ? [...leads, { personId: null, email: invoice.send_to, name: invoice.institute }]
    : leads
  for (const reader of readers)
    await queueLetter(tx, reader, creditNoteIssued({ name: reader.name, ...facts }), `credit-note:${number}`)
  return number
}
