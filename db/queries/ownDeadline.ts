import type { Database } from '../client.ts'

/** Gives one proposal a deadline of its own. Its version stays: what it says is not touched. */
export async function setOwnDeadline(db: Database, proposalId: number, closesAt: Date): Promise<void> {
  await db('proposals').where({ id: proposalId }).update({ closes_at: closesAt })
}

/**
 * The last moment ahead at which a proposal of the call may be sent by a deadline of its own or of its kind, begun or
 * not; null for none.
 */
export async function lastOwnDeadline(db: Database, callId: number): Promise<Date | null> {
  const row = (await db('proposals as p')
    .join('call_kinds as k', 'k.id', 'p.call_kind_id')
    .where('p.call_id', callId)
    .whereIn('p.state', ['draft', 'submitted'])
    .andWhereRaw('COALESCE(p.closes_at, k.closes_at) > UTC_TIMESTAMP(3)')
    .max({ last: db.raw('COALESCE(p.closes_at, k.closes_at)') })
    .first()) as { last: Date | null } | undefined
  const kind = (await db('call_kinds')
    .where({ call_id: callId })
    .andWhereRaw('closes_at > UTC_TIMESTAMP(3)')
    .max({ last: 'closes_at' })
    .first()) as { last: Date | null } | undefined
  const ahead = [row?.last, kind?.last].flatMap((last) => (last ? [last.getTime()] : []))
  return ahead.length > 0 ? new Date(Math.max(...ahead)) : null
}
