import type { Database } from '../client.ts'
import type { DisputesRow } from '../tables.ts'
import { utcNow } from '../utcNow.ts'

/** Disputes about the payments of a fee, the oldest first. */
export function disputesOfFee(db: Database, feeId: number): Promise<DisputesRow[]> {
  return db('disputes as d')
    .join('payments as p', 'p.id', 'd.payment_id')
    .where('p.fee_id', feeId)
    .orderBy('d.id')
    .select('d.*') as unknown as Promise<DisputesRow[]>
}

/** The dispute of this number at the firm, locked. */
export async function lockDispute(db: Database, providerDisputeId: string): Promise<DisputesRow | null> {
  return (await db('disputes').where({ provider_dispute_id: providerDisputeId }).forUpdate().first()) ?? null
}

export async function insertDispute(
  db: Database,
  dispute: { paymentId: number; providerDisputeId: string; amountMinor: number; reason: string },
): Promise<number> {
  const [id] = await db('disputes').insert({
    payment_id: dispute.paymentId,
    provider_dispute_id: dispute.providerDisputeId,
    amount_minor: dispute.amountMinor,
    reason: dispute.reason.slice(0, 60),
  })
  return Number(id)
}

export async function closeDispute(db: Database, id: number, state: 'won' | 'lost'): Promise<void> {
  await db('disputes')
    .where({ id })
    .update({ state, closed_at: utcNow(db) })
}
