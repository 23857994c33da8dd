import type { Database } from '../client.ts'
import type { RefundsRow } from '../tables.ts'
import { utcNow } from '../utcNow.ts'

export interface NewRefund {
  /** One of the two: the card payment or the settled invoice it is a refund of. */
  paymentId: number | null
  invoiceId?: number | null
  idempotencyKey: string
  amountMinor: number
  /** Money that was never owed: it came twice, or too late. */
  isSurplus: boolean
  reason: string
  madeBy: number | null
  /** Known where it was made by hand at the firm. */
  providerRefundId?: string | null
}

export async function insertRefund(db: Database, refund: NewRefund): Promise<number> {
  const [id] = await db('refunds').insert({
    payment_id: refund.paymentId,
    invoice_id: refund.invoiceId ?? null,
    idempotency_key: refund.idempotencyKey,
    amount_minor: refund.amountMinor,
    is_surplus: refund.isSurplus ? 1 : 0,
    reason: refund.reason.slice(0, 300),
    made_by: refund.madeBy,
    provider_refund_id: refund.providerRefundId ?? null,
  })
  return Number(id)
}

/** Refunds to a card that are decided and not yet carried out by the payment firm. */
export function openRefunds(db: Database, limit: number): Promise<RefundsRow[]> {
  return db('refunds').where({ state: 'created' }).whereNotNull('payment_id').orderBy('id').limit(limit)
}

/** Refunds of card payments and invoices of a fee, the oldest first. */
export function refundsOfFee(db: Database, feeId: number): Promise<RefundsRow[]> {
  return db('refunds as r')
    .leftJoin('payments as p', 'p.id', 'r.payment_id')
    .leftJoin('invoices as i', 'i.id', 'r.invoice_id')
    .where('p.fee_id', feeId)
    .orWhere('i.fee_id', feeId)
    .orderBy('r.id')
    .select('r.*') as unknown as Promise<RefundsRow[]>
}

export async function lockRefund(db: Database, id: number): Promise<RefundsRow | null> {
  return (await db('refunds').where({ id }).forUpdate().first()) ?? null
}

/** The refund a firm speaks of: by its own number, or by the key it was asked for with. */
export async function findRefundOf(
  db: Database,
  sign: { refundId: string; key: string | null },
): Promise<RefundsRow | null> {
  const known = await db('refunds').where({ provider_refund_id: sign.refundId }).first()
  if (known || !sign.key) return known ?? null
  return (await db('refunds').where({ idempotency_key: sign.key }).first()) ?? null
}

/** Notes under which number the firm works on a refund that is not made yet. */
export async function noteRefundNumber(db: Database, id: number, providerRefundId: string): Promise<void> {
  await db('refunds').where({ id, state: 'created' }).update({ provider_refund_id: providerRefundId })
}

export async function closeRefund(
  db: Database,
  id: number,
  outcome: { state: 'succeeded' | 'failed'; providerRefundId: string | null; failure: string },
): Promise<void> {
  await db('refunds')
    .where({ id })
    .update({
      state: outcome.state,
      provider_refund_id: outcome.providerRefundId,
      failure: outcome.failure.slice(0, 200),
      closed_at: utcNow(db),
    })
}
