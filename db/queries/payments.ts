import type { Database } from '../client.ts'
import type { PaymentsRow } from '../tables.ts'

export interface NewPayment {
  feeId: number
  idempotencyKey: string
  amountMinor: number
  currency: string
  startedBy: number
}

export async function insertPayment(db: Database, payment: NewPayment): Promise<number> {
  const [id] = await db('payments').insert({
    fee_id: payment.feeId,
    idempotency_key: payment.idempotencyKey,
    amount_minor: payment.amountMinor,
    currency: payment.currency,
    started_by: payment.startedBy,
  })
  return Number(id)
}

export async function findPayment(db: Database, id: number): Promise<PaymentsRow | null> {
  return (await db('payments').where({ id }).first()) ?? null
}

export async function lockPayment(db: Database, id: number): Promise<PaymentsRow | null> {
  return (await db('payments').where({ id }).forUpdate().first()) ?? null
}

/** The payment a notice speaks of: by session, by payment, or by the key sent along with it. */
export async function findPaymentOf(
  db: Database,
  sign: { sessionId: string | null; paymentId: string | null; reference: string | null },
): Promise<PaymentsRow | null> {
  const tries: Partial<PaymentsRow>[] = [
    ...(sign.sessionId ? [{ provider_session_id: sign.sessionId }] : []),
    ...(sign.paymentId ? [{ provider_payment_id: sign.paymentId }] : []),
    ...(sign.reference ? [{ idempotency_key: sign.reference }] : []),
  ]
  for (const where of tries) {
    const row = await db('payments').where(where).first()
    if (row) return row
  }
  return null
}

export function paymentsOf(db: Database, feeId: number): Promise<PaymentsRow[]> {
  return db('payments').where({ fee_id: feeId }).orderBy('id')
}

/** Payments begun and not ended, the oldest first, for the job that asks after them. */
export function unfinishedPayments(db: Database, limit: number): Promise<PaymentsRow[]> {
  return db('payments')
    .whereIn('state', ['created', 'open'])
    .whereNotNull('provider_session_id')
    .orderBy('id')
    .limit(limit)
}

export async function updatePayment(
  db: Database,
  id: number,
  changes: Partial<
    Pick<
      PaymentsRow,
      | 'state'
      | 'provider_session_id'
      | 'provider_payment_id'
      | 'checkout_url'
      | 'card_last4'
      | 'failure'
      | 'succeeded_at'
    >
  >,
): Promise<void> {
  await db('payments').where({ id }).update(changes)
}

export interface NewPaymentEvent {
  providerEventId: string
  eventType: string
  paymentId: number | null
  payload: string
  effect: string
  providerCreatedAt: Date
}

export async function isKnownEvent(db: Database, providerEventId: string): Promise<boolean> {
  const row = await db('payment_events').where({ provider_event_id: providerEventId }).first('id')
  return row !== undefined
}

export async function insertPaymentEvent(db: Database, event: NewPaymentEvent): Promise<void> {
  await db('payment_events').insert({
    provider_event_id: event.providerEventId,
    event_type: event.eventType,
    payment_id: event.paymentId,
    payload: event.payload,
    effect: event.effect,
    provider_created_at: event.providerCreatedAt,
  })
}
