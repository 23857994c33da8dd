import type { Database } from '../client.ts'
import type { NightChoicesRow } from '../tables.ts'

const now = (db: Database) => db.raw('UTC_TIMESTAMP(3)') as unknown as Date

export interface StandingChoice {
  choice: NightChoicesRow['choice']
  reason: string
}

/** What the chair has laid down, by proposal. */
export async function standingChoices(
  db: Database,
  proposalIds: readonly number[],
): Promise<Map<number, StandingChoice>> {
  const rows = await db('night_choices').whereIn('proposal_id', proposalIds).whereNull('superseded_at')
  return new Map(rows.map(({ proposal_id, choice, reason }) => [proposal_id, { choice, reason }]))
}

/** Puts a choice in the place of the one that stands; null takes that back. */
export async function replaceChoice(
  db: Database,
  given: { proposalId: number; choice: NightChoicesRow['choice'] | null; reason: string; by: number },
): Promise<void> {
  await db('night_choices')
    .where({ proposal_id: given.proposalId })
    .whereNull('superseded_at')
    .update({ superseded_at: now(db) })
  if (given.choice !== null)
    await db('night_choices').insert({
      proposal_id: given.proposalId,
      choice: given.choice,
      reason: given.reason,
      made_by: given.by,
    })
}

export interface HeldTime {
  seconds: number
  reason: string
}

/** Time held back in a call, by telescope. */
export async function heldTime(db: Database, callId: number): Promise<Map<number, HeldTime>> {
  const rows = await db('held_hours').where({ call_id: callId }).whereNull('superseded_at')
  return new Map(rows.map(({ telescope_id, seconds, reason }) => [telescope_id, { seconds, reason }]))
}

/** Puts a time held back in the place of the one that stands; 0 takes that back. */
export async function replaceHeld(
  db: Database,
  given: { callId: number; telescopeId: number; seconds: number; reason: string; by: number },
): Promise<void> {
  await db('held_hours')
    .where({ call_id: given.callId, telescope_id: given.telescopeId })
    .whereNull('superseded_at')
    .update({ superseded_at: now(db) })
  if (given.seconds > 0)
    await db('held_hours').insert({
      call_id: given.callId,
      telescope_id: given.telescopeId,
      seconds: given.seconds,
      reason: given.reason,
      made_by: given.by,
    })
}

export interface StandingLeast {
  proposalId: number
  instrumentId: number
  seconds: number
  reason: string
}

/** Least useful awards the chair has set. */
export async function standingLeasts(db: Database, proposalIds: readonly number[]): Promise<StandingLeast[]> {
  const rows = await db('least_awards').whereIn('proposal_id', proposalIds).whereNull('superseded_at')
  return rows.map(({ proposal_id, instrument_id, seconds, reason }) => ({
    ...{ proposalId: proposal_id, instrumentId: instrument_id },
    ...{ seconds, reason },
  }))
}

/** Puts a least useful award in the place of the one that stands; 0 takes that back. */
export async function replaceLeast(db: Database, given: StandingLeast & { by: number }): Promise<void> {
  const which = { proposal_id: given.proposalId, instrument_id: given.instrumentId }
  await db('least_awards')
    .where(which)
    .whereNull('superseded_at')
    .update({ superseded_at: now(db) })
  if (given.seconds > 0)
    await db('least_awards').insert({
      ...which,
      ...{ seconds: given.seconds, reason: given.reason, made_by: given.by },
    })
}
