import type { Database } from '../client.ts'
import type { AwardLinesRow, DecisionsRow } from '../tables.ts'
import { releaseHalves } from './visits.ts'

const now = (db: Database) => db.raw('UTC_TIMESTAMP(3)') as unknown as Date

/** The call's row, locked: awards of all its panels are given one after another. */
export async function lockCall(db: Database, callId: number): Promise<void> {
  await db('calls').where({ id: callId }).forUpdate().first('id')
}

/** Standing decisions, prepared or released, by proposal. */
export async function standingDecisions(
  db: Database,
  proposalIds: readonly number[],
): Promise<Map<number, DecisionsRow>> {
  const rows = await db('decisions').whereIn('proposal_id', proposalIds).whereNull('superseded_at')
  return new Map(rows.map((row) => [row.proposal_id, row]))
}

export async function insertDecision(
  db: Database,
  given: { proposalId: number; outcome: DecisionsRow['outcome']; statement: string; by: number },
): Promise<number> {
  const last = await db('decisions')
    .where({ proposal_id: given.proposalId })
    .max({ v: 'decision_version' })
    .first()
  const [id] = await db('decisions').insert({
    proposal_id: given.proposalId,
    decision_version: Number(last?.v ?? 0) + 1,
    outcome: given.outcome,
    statement: given.statement,
    decided_by: given.by,
    changed_by: given.by,
  })
  return Number(id)
}

/** Changes a prepared decision that still stands at `version`; false when someone was first or it is released. */
export async function changeDecision(
  db: Database,
  decision: { id: number; version: number },
  change: Partial<Pick<DecisionsRow, 'outcome' | 'statement'>>,
  by: number,
): Promise<boolean> {
  const count = await db('decisions')
    .where({ id: decision.id, version: decision.version })
    .whereNull('released_at')
    .whereNull('superseded_at')
    .update({ ...change, changed_by: by, version: decision.version + 1 })
  return count === 1
}

/** Makes a prepared decision known; false when it was made known before. */
export async function releaseDecision(db: Database, id: number): Promise<boolean> {
  const count = await db('decisions')
    .where({ id })
    .whereNull('released_at')
    .whereNull('superseded_at')
    .update({ released_at: now(db), version: db.raw('version + 1') as unknown as number })
  return count === 1
}

export interface StandingAward {
  id: number
  proposalId: number
  instrumentId: number
  instrument: string
  telescopeId: number
  telescope: string
  seconds: number
  service: AwardLinesRow['service']
  conditions: string
  isReserve: boolean
  givenAt: Date
}

/** Standing award lines of the standing decisions of some proposals. */
export async function standingAwards(db: Database, proposalIds: readonly number[]): Promise<StandingAward[]> {
  const rows = await db('award_lines as a')
    .join('decisions as d', 'd.id', 'a.decision_id')
    .join('instruments as i', 'i.id', 'a.instrument_id')
    .join('telescopes as t', 't.id', 'i.telescope_id')
    .whereIn('d.proposal_id', proposalIds)
    .whereNull('d.superseded_at')
    .whereNull('a.superseded_at')
    .orderBy(['d.proposal_id', 'a.instrument_id'])
    .select<(Omit<StandingAward, 'isReserve'> & { isReserve: number })[]>({
      id: 'a.id',
      proposalId: 'd.proposal_id',
      instrumentId: 'a.instrument_id',
      instrument: 'i.name',
      telescopeId: 't.id',
      telescope: 't.name',
      seconds: 'a.seconds',
      service: 'a.service',
      conditions: 'a.conditions',
      isReserve: 'a.is_reserve',
      givenAt: 'a.created_at',
    })
  return rows.map((row) => ({ ...row, isReserve: Boolean(row.isReserve) }))
}

/** Retires the lines of a decision, and gives the nights of their visits back; they stay on record. */
export async function supersedeAwards(db: Database, decisionId: number): Promise<void> {
  await releaseHalves(db, decisionId)
  await db('award_lines')
    .where({ decision_id: decisionId })
    .whereNull('superseded_at')
    .update({ superseded_at: now(db) })
}

/** Seconds given on each telescope of a call by standing lines, reserve not counted. */
export async function givenByTelescope(db: Database, callId: number): Promise<Map<number, number>> {
  const rows = await db('award_lines as a')
    .join('decisions as d', 'd.id', 'a.decision_id')
    .join('proposals as p', 'p.id', 'd.proposal_id')
    .join('instruments as i', 'i.id', 'a.instrument_id')
    .where({ 'p.call_id': callId, 'a.is_reserve': 0 })
    .whereNull('d.superseded_at')
    .whereNull('a.superseded_at')
    .groupBy('i.telescope_id')
    .select('i.telescope_id as telescopeId')
    .sum<{ telescopeId: number; seconds: string }[]>({ seconds: 'a.seconds' })
  return new Map(rows.map((row) => [row.telescopeId, Number(row.seconds)]))
}

export interface NewAward {
  decisionId: number
  instrumentId: number
  seconds: number
  service: AwardLinesRow['service']
  conditions: string
  isReserve: boolean
}

/**
 * Gives time, unless the telescope's science hours of the call, less those held back, would then be exceeded: the same promise that the
 * invariants check, held by the statement itself. Its key; null when nothing was given.
 */
export async function insertAward(db: Database, callId: number, award: NewAward): Promise<number | null> {
  const [result] = (await db.raw(
    `INSERT INTO award_lines (decision_id, instrument_id, seconds, service, conditions, is_reserve)
     SELECT ?, i.id, ?, ?, ?, ? FROM instruments i
      WHERE i.id = ? AND (? = 1 OR ? +
        COALESCE((SELECT SUM(a.seconds) FROM award_lines a JOIN decisions d ON d.id = a.decision_id
                    JOIN proposals p ON p.id = d.proposal_id JOIN instruments j ON j.id = a.instrument_id
                   WHERE p.call_id = ? AND j.telescope_id = i.telescope_id AND a.is_reserve = 0
                     AND a.superseded_at IS NULL AND d.superseded_at IS NULL), 0)
        <= COALESCE((SELECT SUM(b.dark_seconds) FROM night_blocks b
                      WHERE b.call_id = ? AND b.telescope_id = i.telescope_id AND b.use_for = 'science'), 0)
         - COALESCE((SELECT SUM(k.seconds) FROM held_hours k
                      WHERE k.call_id = ? AND k.telescope_id = i.telescope_id AND k.superseded_at IS NULL), 0))`,
    [
      award.decisionId,
      award.seconds,
      award.service,
      award.conditions,
      award.isReserve ? 1 : 0,
      award.instrumentId,
      award.isReserve ? 1 : 0,
      award.seconds,
      callId,
      callId,
      callId,
    ],
  )) as [{ affectedRows: number; insertId: number }]
  return result.affectedRows === 1 ? result.insertId : null
}

export interface ToDecide {
  proposalId: number
  reference: string
}

/** Every proposal of a panel that waits for its decision, locked. */
export function lockUndecided(db: Database, panelId: number): Promise<ToDecide[]> {
  return db('proposals')
    .where({ panel_id: panelId, state: 'under-review' })
    .orderBy('id')
    .forUpdate()
    .select<ToDecide[]>({ proposalId: 'id', reference: 'reference' })
}

/** Gives a proposal the state of its decision; false when it was not under review. */
export async function decideProposal(
  db: Database,
  proposalId: number,
  outcome: DecisionsRow['outcome'],
): Promise<boolean> {
  const count = await db('proposals')
    .where({ id: proposalId, state: 'under-review' })
    .update({
      state: outcome,
      version: db.raw('version + 1') as unknown as number,
      updated_at: now(db),
    })
  return count === 1
}

/** Proposals of a call that still wait for a decision, on any panel. */
export async function undecidedIn(db: Database, callId: number): Promise<number> {
  const row = await db('proposals')
    .where({ call_id: callId })
    .whereIn('state', ['submitted', 'under-review'])
    .count({ n: '*' })
    .first()
  return Number(row?.n ?? 0)
}

export interface Correspondent {
  personId: number | null
  email: string
  name: string
}

/** Everyone who has agreed to be named on a proposal, in order. */
export function correspondents(db: Database, proposalId: number): Promise<Correspondent[]> {
  return db('proposal_people')
    .where({ proposal_id: proposalId })
    .whereNotNull('confirmed_at')
    .orderBy('position')
    .select<Correspondent[]>({ personId: 'person_id', email: 'email', name: 'name' })
}
