import type { Database } from '../client.ts'
import type { CreditNotesRow, InvoicesRow } from '../tables.ts'
import { utcNow } from '../utcNow.ts'

export interface NewInvoice {
  number: string
  feeId: number
  institute: string
  address: string
  billingRecordId: number
  purchaseOrder: string
  sendTo: string
  amountMinor: number
  currency: string
  dueAt: Date
  askedBy: number
}

export async function insertInvoice(db: Database, invoice: NewInvoice): Promise<number> {
  const [id] = await db('invoices').insert({
    number: invoice.number,
    fee_id: invoice.feeId,
    institute: invoice.institute,
    address: invoice.address,
    billing_record_id: invoice.billingRecordId,
    purchase_order: invoice.purchaseOrder,
    send_to: invoice.sendTo,
    amount_minor: invoice.amountMinor,
    currency: invoice.currency,
    due_at: invoice.dueAt,
    asked_by: invoice.askedBy,
  })
  return Number(id)
}

export async function findInvoice(db: Database, number: string): Promise<InvoicesRow | null> {
  return (await db('invoices').where({ number }).first()) ?? null
}

export async function findInvoiceById(db: Database, id: number): Promise<InvoicesRow | null> {
  return (await db('invoices').where({ id }).first()) ?? null
}

/** Invoices of a fee, the oldest first. */
export function invoicesOfFee(db: Database, feeId: number): Promise<InvoicesRow[]> {
  return db('invoices').where({ fee_id: feeId }).orderBy('id')
}

/** Ends an open invoice; false when someone was first. */
export async function closeInvoice(
  db: Database,
  invoice: Pick<InvoicesRow, 'id' | 'version'>,
  outcome:
    | { state: 'settled'; settledOn: string; reference: string; closedBy: number }
    | { state: 'cancelled'; closedBy: number | null },
): Promise<boolean> {
  const settled =
    outcome.state === 'settled' ? { settled_on: outcome.settledOn, settled_reference: outcome.reference } : {}
  const count = await db('invoices')
    .where({ id: invoice.id, version: invoice.version, state: 'open' })
    .update({
      state: outcome.state,
      closed_by: outcome.closedBy,
      closed_at: utcNow(db),
      version: invoice.version + 1,
      ...settled,
    })
  return count === 1
}

export interface NewCreditNote {
  number: string
  feeId: number
  invoiceId: number | null
  refundId: number | null
  creditedTo: string
  address: string
  billingRecordId: number | null
  amountMinor: number
  currency: string
  reason: string
}

export async function insertCreditNote(db: Database, note: NewCreditNote): Promise<void> {
  await db('credit_notes').insert({
    number: note.number,
    fee_id: note.feeId,
    invoice_id: note.invoiceId,
    refund_id: note.refundId,
    credited_to: note.creditedTo,
    address: note.address,
    billing_record_id: note.billingRecordId,
    amount_minor: note.amountMinor,
    currency: note.currency,
    reason: note.reason.slice(0, 300),
  })
}

export async function findCreditNote(db: Database, number: string): Promise<CreditNotesRow | null> {
  return (await db('credit_notes').where({ number }).first()) ?? null
}

/** Credit notes of a fee, the oldest first. */
export function creditNotesOfFee(db: Database, feeId: number): Promise<CreditNotesRow[]> {
  return db('credit_notes').where({ fee_id: feeId }).orderBy('id')
}
