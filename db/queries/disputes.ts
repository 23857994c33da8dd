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

export type DisputeDecision = NonNullable<DisputesRow['decision']>

/** A dispute by its key, locked; null where there is none. */
export async function lockDisputeById(db: Database, id: number): Promise<DisputesRow | null> {
  return (await db('disputes').where({ id }).forUpdate().first()) ?? null
}

/** The fee and the proposal a dispute is about. */
export async function placeOfDispute(
  db: Database,
  id: number,
): Promise<{ feeId: number; proposalId: number } | null> {
  const row = await db('disputes as d')
    .join('payments as p', 'p.id', 'd.payment_id')
    .join('fees as f', 'f.id', 'p.fee_id')
    .where('d.id', id)
    .first<{ feeId: number; proposalId: number } | undefined>({ feeId: 'f.id', proposalId: 'f.proposal_id' })
  return row ?? null
}

/** Keeps what the office made of a lost dispute; false when it was decided, or won, before. */
export async function keepDecision(
  db: Database,
  id: number,
  outcome: { decision: DisputeDecision; note: string; decidedBy: number },
): Promise<boolean> {
  const count = await db('disputes')
    .where({ id, state: 'lost' })
    .whereNull('decision')
    .update({
      decision: outcome.decision,
      decision_note: outcome.note,
      decided_by: outcome.decidedBy,
      decided_at: utcNow(db),
    })
  return count === 1
}

export interface UndecidedDispute {
  reference: string
  title: string
  callNumber: number
  amountMinor: number
  currency: string
  lostAt: Date
}

/** Lost disputes the office has not decided on, of all calls, the oldest first. */
export function undecidedDisputes(db: Database): Promise<UndecidedDispute[]> {
  return db('disputes as d')
    .join('payments as y', 'y.id', 'd.payment_id')
    .join('fees as f', 'f.id', 'y.fee_id')
    .join('proposals as p', 'p.id', 'f.proposal_id')
    .join('calls as c', 'c.id', 'p.call_id')
    .where('d.state', 'lost')
    .whereNull('d.decision')
    .orderBy('d.id')
    .select({
      reference: 'p.reference',
      title: 'p.title',
      callNumber: 'c.number',
      amountMinor: 'd.amount_minor',
      currency: 'f.currency',
      lostAt: 'd.closed_at',
    }) as unknown as Promise<UndecidedDispute[]>
}
