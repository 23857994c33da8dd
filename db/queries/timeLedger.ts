import type { Database } from '../client.ts'
import type { TimeEntriesRow } from '../tables.ts'

export type TimeAccount = TimeEntriesRow['account']

export interface TimeMovement {
  proposalId: number
  observationId?: number
  from: TimeAccount
  to: TimeAccount
  /** Whole seconds, more than none. */
  seconds: number
  reason: string
  madeBy: number | null
}

/** Moves time from one account of a proposal to another: two entries that sum to zero. */
export async function moveTime(db: Database, movement: TimeMovement): Promise<void> {
  if (movement.seconds === 0) return
  const [id] = await db('time_transfers').insert({
    proposal_id: movement.proposalId,
    observation_id: movement.observationId ?? null,
    reason: movement.reason,
    made_by: movement.madeBy,
  })
  await db('time_entries').insert([
    { transfer_id: Number(id), account: movement.from, seconds: -movement.seconds },
    { transfer_id: Number(id), account: movement.to, seconds: movement.seconds },
  ])
}

/** What stands on an account of a proposal, in seconds. */
export async function timeBalance(db: Database, proposalId: number, account: TimeAccount): Promise<number> {
  const row = await db('time_entries as e')
    .join('time_transfers as t', 't.id', 'e.transfer_id')
    .where({ 't.proposal_id': proposalId, 'e.account': account })
    .sum({ seconds: 'e.seconds' })
    .first()
  return Number(row?.seconds ?? 0)
}
