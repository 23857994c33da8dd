import type { Database } from '../client.ts'
import { newest } from './newest.ts'

/** Draws the next number of a series; the row stays locked until the transaction ends, so that none is left out. */
export async function drawNumber(db: Database, series: string): Promise<number> {
  await newest(
    db,
    'INSERT INTO counters (name, last_number) VALUES (?, 1) ON DUPLICATE KEY UPDATE last_number = last_number + 1',
    [series],
  )
  const row = await db('counters').where({ name: series }).first()
  if (!row) throw new Error(`the counter ${series} is gone`)
  return row.last_number
}

export async function insertReceipt(
  db: Database,
  receipt: { number: string; feeId: number; paymentId: number; payer: string },
): Promise<void> {
  await db('receipts').insert({
    number: receipt.number,
    fee_id: receipt.feeId,
    payment_id: receipt.paymentId,
    payer: receipt.payer,
  })
}

/** A receipt with what was paid. */
export interface Receipt {
  number: string
  payer: string
  paidAt: Date
  amountMinor: number
  currency: string
  cardLast4: string | null
}

/** The receipt of a fee; the last one where a fee was paid twice. */
export async function receiptOfFee(db: Database, feeId: number): Promise<Receipt | null> {
  const row = await db('receipts as r')
    .join('payments as p', 'p.id', 'r.payment_id')
    .where({ 'r.fee_id': feeId })
    .orderBy('r.id', 'desc')
    .first(
      'r.number',
      'r.payer',
      'r.created_at',
      'p.succeeded_at',
      'p.amount_minor',
      'p.currency',
      'p.card_last4',
    )
  if (!row) return null
  return {
    number: row.number,
    payer: row.payer,
    paidAt: row.succeeded_at ?? row.created_at,
    amountMinor: row.amount_minor,
    currency: row.currency,
    cardLast4: row.card_last4,
  }
}
