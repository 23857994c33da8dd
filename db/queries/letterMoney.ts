import type { BillingFacts } from '../../lib/domain/billing/types.ts'
import type { Database } from '../client.ts'
import type { DisputesRow, FeesRow, WaiversRow } from '../tables.ts'
import { billingRecordOf } from './billing.ts'
import { creditNotesOfFee, findInvoiceById, invoicesOfFee } from './invoices.ts'
import { disputesOfFee } from './disputes.ts'
import { refundsOfFee } from './refunds.ts'

/** What letters tell of the money of one proposal; of several of a kind, the newest. */
export interface LetterMoney {
  fee: { amountMinor: number; currency: string; dueAt: Date; state: FeesRow['state'] } | null
  receipt: {
    number: string
    amountMinor: number
    currency: string
    cardLast4: string | null
    paidAt: Date
  } | null
  waiver: { reason: string; state: WaiversRow['state']; note: string; askedBy: string } | null
  invoice: {
    number: string
    institute: string
    purchaseOrder: string
    amountMinor: number
    currency: string
    dueAt: Date
    isSettled: boolean
    billing: BillingFacts | null
  } | null
  creditNote: {
    number: string
    invoiceNumber: string | null
    amountMinor: number
    currency: string
    isMoney: boolean
  } | null
  failedRefund: { amountMinor: number; currency: string; failure: string } | null
  dispute: {
    amountMinor: number
    currency: string
    status: DisputesRow['state']
    decision: DisputesRow['decision']
    note: string
  } | null
}

const none: LetterMoney = {
  fee: null,
  receipt: null,
  waiver: null,
  invoice: null,
  creditNote: null,
  failedRefund: null,
  dispute: null,
}

/** The money of a proposal as letters tell it. */
export async function moneyOfLetter(db: Database, proposalId: number): Promise<LetterMoney> {
  const fee = await db('fees').where({ proposal_id: proposalId }).first()
  if (!fee) return none
  const [receipt, waiver, papers, trouble] = await Promise.all([
    receiptOf(db, fee.id),
    waiverOf(db, fee.id),
    papersOf(db, fee),
    troubleOf(db, fee),
  ])
  return {
    fee: { amountMinor: fee.amount_minor, currency: fee.currency, dueAt: fee.due_at, state: fee.state },
    receipt: receipt ?? null,
    waiver: waiver ?? null,
    ...papers,
    ...trouble,
  }
}

const receiptOf = (db: Database, feeId: number) =>
  db('receipts as r')
    .join('payments as p', 'p.id', 'r.payment_id')
    .where('r.fee_id', feeId)
    .whereNotNull('p.succeeded_at')
    .orderBy('r.id', 'desc')
    .first<NonNullable<LetterMoney['receipt']> | undefined>({
      number: 'r.number',
      amountMinor: 'p.amount_minor',
      currency: 'p.currency',
      cardLast4: 'p.card_last4',
      paidAt: 'p.succeeded_at',
    })

const waiverOf = (db: Database, feeId: number) =>
  db('waivers as w')
    .join('people as a', 'a.id', 'w.asked_by')
    .where('w.fee_id', feeId)
    .orderBy('w.id', 'desc')
    .first<NonNullable<LetterMoney['waiver']> | undefined>({
      reason: 'w.reason',
      state: 'w.state',
      note: 'w.decision_note',
      askedBy: 'a.name',
    })

async function papersOf(db: Database, fee: FeesRow): Promise<Pick<LetterMoney, 'invoice' | 'creditNote'>> {
  const [invoices, notes] = await Promise.all([invoicesOfFee(db, fee.id), creditNotesOfFee(db, fee.id)])
  const invoice = invoices.at(-1)
  const note = notes.at(-1)
  const credited = note?.invoice_id ? await findInvoiceById(db, note.invoice_id) : null
  return {
    invoice: invoice
      ? {
          number: invoice.number,
          institute: invoice.institute,
          purchaseOrder: invoice.purchase_order,
          amountMinor: invoice.amount_minor,
          currency: invoice.currency,
          dueAt: invoice.due_at,
          isSettled: invoice.state === 'settled',
          billing: (await billingRecordOf(db, invoice.billing_record_id))?.facts ?? null,
        }
      : null,
    creditNote: note
      ? {
          number: note.number,
          invoiceNumber: credited?.number ?? null,
          amountMinor: note.amount_minor,
          currency: note.currency,
          isMoney: note.refund_id !== null,
        }
      : null,
  }
}

async function troubleOf(db: Database, fee: FeesRow): Promise<Pick<LetterMoney, 'failedRefund' | 'dispute'>> {
  const [refunds, disputes] = await Promise.all([refundsOfFee(db, fee.id), disputesOfFee(db, fee.id)])
  const failed = refunds.findLast(({ state }) => state === 'failed')
  const dispute = disputes.at(-1)
  const { currency } = fee
  return {
    failedRefund: failed ? { amountMinor: failed.amount_minor, currency, failure: failed.failure } : null,
    dispute: dispute
      ? {
          amountMinor: dispute.amount_minor,
          currency,
          status: dispute.state,
          decision: dispute.decision,
          note: dispute.decision_note,
        }
      : null,
  }
}
