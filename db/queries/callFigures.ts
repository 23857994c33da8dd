import type { Database } from '../client.ts'

export interface ArrivalRow {
  callId: number
  /** Of the first version. */
  arrivedAt: Date
}

/** When each proposal of these calls first arrived, whatever became of it later, in that order. */
export async function firstArrivals(db: Database, callIds: readonly number[]): Promise<ArrivalRow[]> {
  return (await db('proposal_versions as v')
    .join('proposals as p', 'p.id', 'v.proposal_id')
    .whereIn('p.call_id', [...callIds])
    .where('v.version_number', 1)
    .orderBy('v.arrived_at')
    .select({ callId: 'p.call_id', arrivedAt: 'v.arrived_at' })) as ArrivalRow[]
}

/** Proposals of a call that were sent and stand, drafts, withdrawn and lapsed ones apart. */
export async function standingProposals(db: Database, callId: number): Promise<number[]> {
  return db('proposals')
    .where({ call_id: callId })
    .whereNotIn('state', ['draft', 'withdrawn', 'lapsed'])
    .orderBy('id')
    .pluck('id')
}

export interface CallSums {
  callId: number
  proposals: number
  askedSeconds: number
  offeredSeconds: number
}

/** Proposals that stand, the time they ask, and the science time on offer, by call. */
export async function sumsOfCalls(db: Database, callIds: readonly number[]): Promise<CallSums[]> {
  const rows = (await db('calls as c')
    .whereIn('c.id', [...callIds])
    .select({
      callId: 'c.id',
      proposals: db('proposals as p')
        .whereRaw('p.call_id = c.id')
        .whereNotIn('p.state', ['draft', 'withdrawn', 'lapsed'])
        .count('*'),
      askedSeconds: db('proposal_versions as v')
        .join('proposals as p', 'p.id', 'v.proposal_id')
        .whereRaw('p.call_id = c.id')
        .whereNotIn('p.state', ['draft', 'withdrawn', 'lapsed'])
        .whereNull('v.superseded_at')
        .sum(db.raw("JSON_VALUE(v.snapshot, '$.computation.askedSeconds')")),
      offeredSeconds: db('night_blocks as n')
        .whereRaw('n.call_id = c.id')
        .where('n.use_for', 'science')
        .sum('n.dark_seconds'),
    })) as Record<keyof CallSums, number | string | null>[]
  return rows.map((row) => ({
    callId: Number(row.callId),
    proposals: Number(row.proposals ?? 0),
    askedSeconds: Number(row.askedSeconds ?? 0),
    offeredSeconds: Number(row.offeredSeconds ?? 0),
  }))
}

/** Those who lead the standing proposals of a call, each person once, by career stage as it was when they sent. */
export async function leadsByStage(
  db: Database,
  callId: number,
): Promise<{ stage: string | null; count: number }[]> {
  const rows = (await db('proposal_version_people as q')
    .join('proposal_versions as v', 'v.id', 'q.proposal_version_id')
    .join('proposals as p', 'p.id', 'v.proposal_id')
    .where({ 'p.call_id': callId, 'q.role': 'pi' })
    .whereNotIn('p.state', ['draft', 'withdrawn', 'lapsed'])
    .whereNull('v.superseded_at')
    .groupBy('q.career_stage')
    .select({ stage: 'q.career_stage' })
    .countDistinct({ count: db.raw('COALESCE(q.person_id, q.name)') })) as unknown as {
    stage: string | null
    count: number | string
  }[]
  return rows.map(({ stage, count }) => ({ stage, count: Number(count) }))
}
