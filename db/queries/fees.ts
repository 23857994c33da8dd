import type { Database } from '../client.ts'
import { atNow } from './clock.ts'
import type { FeesRow, WaiversRow } from '../tables.ts'

export type FeeState = FeesRow['state']

/** The fee of a proposal; null where there is none. */
export async function feeOf(db: Database, proposalId: number): Promise<FeesRow | null> {
  return (await db('fees').where({ proposal_id: proposalId }).first()) ?? null
}

export async function findFee(db: Database, id: number): Promise<FeesRow | null> {
  return (await db('fees').where({ id }).first()) ?? null
}

/** The fee of a proposal by its reference, unlocked; null where there is none. */
export async function feeByReference(db: Database, reference: string): Promise<FeesRow | null> {
  const row = await db('fees as f')
    .join('proposals as p', 'p.id', 'f.proposal_id')
    .where('p.reference', reference)
    .first('f.*')
  return (row as FeesRow | undefined) ?? null
}

/** Moves the day a fee that is owed is to be settled by. */
export async function setDueAt(
  db: Database,
  fee: Pick<FeesRow, 'id' | 'version'>,
  dueAt: Date,
): Promise<void> {
  await db('fees')
    .where({ id: fee.id, version: fee.version, state: 'due' })
    .update({ due_at: dueAt, version: fee.version + 1, settled_at: null })
}

/** A fee locked until the transaction ends: whatever settles or cancels it begins here. */
export async function lockFee(db: Database, id: number): Promise<FeesRow | null> {
  return (await db('fees').where({ id }).forUpdate().first()) ?? null
}

/**
 * The fee of a proposal by its reference, locked as the first thing a transaction reads: of two people who press
 * Pay together the second then sees what the first wrote. Null where there is none.
 */
export async function lockFeeOf(db: Database, reference: string): Promise<FeesRow | null> {
  const row = await db('fees as f')
    .join('proposals as p', 'p.id', 'f.proposal_id')
    .where('p.reference', reference)
    .forUpdate()
    .first('f.*')
  return (row as FeesRow | undefined) ?? null
}

export async function insertFee(
  db: Database,
  fee: {
    proposalId: number
    amountMinor: number
    currency: string
    dueAt: Date
    affiliationClass: FeesRow['affiliation_class']
    lateMinor: number
  },
): Promise<number> {
  const [id] = await db('fees').insert({
    proposal_id: fee.proposalId,
    amount_minor: fee.amountMinor,
    currency: fee.currency,
    due_at: fee.dueAt,
    affiliation_class: fee.affiliationClass,
    late_minor: fee.lateMinor,
  })
  return Number(id)
}

/** Moves a fee to another state if it still stands as read; false when someone was first. */
export async function updateFee(
  db: Database,
  fee: Pick<FeesRow, 'id' | 'version' | 'state'>,
  state: FeeState,
): Promise<boolean> {
  const count = await db('fees')
    .where({ id: fee.id, version: fee.version, state: fee.state })
    .update({ state, version: fee.version + 1, settled_at: atNow(db) })
  return count === 1
}

/** Fees whose grace is over, that nobody has been asked to waive, of proposals still in the running. */
export async function feesPastGrace(
  db: Database,
  now: Date,
): Promise<{ feeId: number; proposalId: number; reference: string }[]> {
  return db('fees as f')
    .join('proposals as p', 'p.id', 'f.proposal_id')
    .where('f.state', 'due')
    .andWhere('f.due_at', '<=', now)
    .whereIn('p.state', ['submitted', 'under-review'])
    .whereNotExists(db('waivers').select('id').whereRaw("fee_id = f.id AND state = 'asked'"))
    .orderBy('f.id')
    .select({ feeId: 'f.id', proposalId: 'p.id', reference: 'p.reference' })
}

export async function insertWaiver(
  db: Database,
  waiver: { feeId: number; reason: string; askedBy: number },
): Promise<number> {
  const [id] = await db('waivers').insert({
    fee_id: waiver.feeId,
    reason: waiver.reason,
    asked_by: waiver.askedBy,
  })
  return Number(id)
}

export async function findWaiver(db: Database, id: number): Promise<WaiversRow | null> {
  return (await db('waivers').where({ id }).first()) ?? null
}

/** The last request to waive a fee. */
export async function latestWaiver(db: Database, feeId: number): Promise<WaiversRow | null> {
  return (await db('waivers').where({ fee_id: feeId }).orderBy('id', 'desc').first()) ?? null
}

/** Decides a request that is still open; false when it was decided before. */
export async function closeWaiver(
  db: Database,
  id: number,
  outcome: { state: 'granted' | 'refused'; note: string; decidedBy: number },
): Promise<boolean> {
  const count = await db('waivers')
    .where({ id, state: 'asked' })
    .update({
      state: outcome.state,
      decision_note: outcome.note,
      decided_by: outcome.decidedBy,
      decided_at: atNow(db),
    })
  return count === 1
}
