import { createElement } from 'react'
import { billingRecordOf } from '@/db/queries/billing'
import { findCreditNote, findInvoice, findInvoiceById } from '@/db/queries/invoices'
import { findFee } from '@/db/queries/fees'
import type { Database } from '@/db/client'
import { refuse } from '@/lib/errors'
import { formatDayWithYear, formatMoney } from '@/lib/format'
import { BillDocument, type BillData } from '@/pdf/bill/BillDocument'
import { render } from '@/pdf/render'
import { accountRows, issuerWords } from '../billing/onPaper'
import { readContents } from '../proposals/readContents'

/**
 * An invoice or a credit note as PDF, drawn from its row, which never changes. It checks no right: the caller has
 * asked its own policy, or is the relay.
 */
export async function renderPaper(
  db: Database,
  number: string,
): Promise<{ bytes: Uint8Array; fileName: string }> {
  const data = number.startsWith('QC-') ? await creditNoteData(db, number) : await invoiceData(db, number)
  const bytes = await render(() => createElement(BillDocument, { data }))
  return { bytes, fileName: `${number}.pdf` }
}

async function invoiceData(db: Database, number: string): Promise<BillData> {
  const invoice = await findInvoice(db, number)
  if (!invoice) throw refuse.notFound('invoice')
  const { line, observatory } = await subjectOf(db, invoice.fee_id)
  const billing = await billingRecordOf(db, invoice.billing_record_id)
  return {
    observatory,
    kind: 'Invoice',
    number,
    to: [invoice.institute, ...invoice.address.split('\n')],
    facts: [
      { term: 'Written', value: formatDayWithYear(invoice.created_at) },
      { term: 'To be paid by', value: formatDayWithYear(invoice.due_at), bold: true },
      ...(invoice.purchase_order ? [{ term: 'Purchase order', value: invoice.purchase_order }] : []),
    ],
    line,
    amount: formatMoney(invoice.amount_minor, invoice.currency),
    vat: formatMoney(0, invoice.currency),
    pay: billing ? accountRows(billing.facts, number) : [],
    closing: issuerWords(billing?.facts ?? null),
  }
}

async function creditNoteData(db: Database, number: string): Promise<BillData> {
  const note = await findCreditNote(db, number)
  if (!note) throw refuse.notFound('credit note')
  const invoice = note.invoice_id === null ? null : await findInvoiceById(db, note.invoice_id)
  const { line, observatory } = await subjectOf(db, note.fee_id)
  const billing = await billingRecordOf(db, note.billing_record_id)
  return {
    observatory,
    kind: 'Credit note',
    number,
    to: [note.credited_to, ...note.address.split('\n').filter((part) => part !== '')],
    facts: [
      { term: 'Written', value: formatDayWithYear(note.created_at) },
      ...(invoice ? [{ term: 'To invoice', value: invoice.number }] : []),
      ...(invoice?.purchase_order ? [{ term: 'Purchase order', value: invoice.purchase_order }] : []),
      { term: 'Why', value: note.reason },
    ],
    line,
    amount: formatMoney(note.amount_minor, note.currency),
    vat: formatMoney(0, note.currency),
    pay: [],
    closing: [
      note.refund_id === null
        ? 'The invoice is taken back: nothing is to be paid on it.'
        : 'This amount has been given back the way it was paid.',
      ...issuerWords(billing?.facts ?? null),
    ],
  }
}

async function subjectOf(db: Database, feeId: number): Promise<{ line: string; observatory: string }> {
  const fee = await findFee(db, feeId)
  if (!fee) throw refuse.integrity('The fee of this paper is missing.')
  const { reference, kind, call, site } = await readContents(db, fee.proposal_id)
  return {
    line: `Fee of proposal ${reference}: ${kind.title}, call ${call.number}`,
    observatory: `${site.name}, call ${call.number}`,
  }
}
