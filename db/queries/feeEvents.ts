import type { Database } from '../client.ts'

export interface PaymentNoticeRow {
  type: string
  at: Date
  payload: string
  effect: string
}

/** Notices of the firm about the payments of a fee, the oldest first. */
export async function noticesOfFee(db: Database, feeId: number): Promise<PaymentNoticeRow[]> {
  const rows = await db('payment_events as n')
    .join('payments as p', 'p.id', 'n.payment_id')
    .where('p.fee_id', feeId)
    .orderBy('n.id')
    .select('n.event_type', 'n.provider_created_at', 'n.payload', 'n.effect')
  return rows.map((row) => ({
    type: row.event_type,
    at: row.provider_created_at,
    payload: row.payload,
    effect: row.effect,
  }))
}

export interface FeeLetter {
  template: string
  toName: string
  at: Date
}

/** Letters about a fee that were sent, by what caused them, the oldest first. */
export async function lettersAbout(db: Database, causes: readonly string[]): Promise<FeeLetter[]> {
  if (causes.length === 0) return []
  const rows = await db('outbox')
    .where('state', 'sent')
    .andWhere((q) => {
      for (const cause of causes) void q.orWhere('dedupe_key', 'like', `${cause}:%`)
    })
    .orderBy('id')
    .select('template', 'to_name', 'sent_at', 'created_at')
  return rows.map((row) => ({
    template: row.template,
    toName: row.to_name,
    at: row.sent_at ?? row.created_at,
  }))
}

export interface BegunPaymentRow {
  at: Date
  by: string | null
}

/** When each attempt to pay was begun, and by whom. */
export async function attemptsOfFee(db: Database, feeId: number): Promise<BegunPaymentRow[]> {
  const rows = await db('payments as p')
    .leftJoin('people as a', 'a.id', 'p.started_by')
    .where('p.fee_id', feeId)
    .orderBy('p.id')
    .select('p.created_at', 'a.name')
  return rows.map((row) => ({ at: row.created_at, by: row.name }))
}
