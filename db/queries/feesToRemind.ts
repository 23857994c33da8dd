import type { Database } from '../client.ts'

export interface OwedFee {
  feeId: number
  closesAt: Date
  dueAt: Date
  /** Since when it is owed: since it was billed, its invoice was taken back, or a lost dispute was decided. */
  owedSince: Date
}

/**
 * Fees that are owed by proposals in the running, of one call or of all, with the moments reminders hang on. Where a
 * waiver is asked for, it is the office's turn, so nobody is reminded.
 */
export async function feesToRemind(db: Database, callId?: number): Promise<OwedFee[]> {
  const all = db('fees as f')
    .join('proposals as p', 'p.id', 'f.proposal_id')
    .join('call_kinds as k', 'k.id', 'p.call_kind_id')
    .join('calls as c', 'c.id', 'p.call_id')
    .where('f.state', 'due')
    .whereIn('p.state', ['submitted', 'under-review'])
    .whereNotExists(db('waivers').select('id').whereRaw("fee_id = f.id AND state = 'asked'"))
    .orderBy('f.id')
  const rows = await (callId === undefined ? all : all.where('c.id', callId)).select(
    'f.id',
    'f.due_at',
    db.raw(`GREATEST(f.created_at,
      COALESCE((SELECT MAX(i.closed_at) FROM invoices i WHERE i.fee_id = f.id AND i.state = 'cancelled'), f.created_at),
      COALESCE((SELECT MAX(d.decided_at) FROM disputes d JOIN payments y ON y.id = d.payment_id WHERE y.fee_id = f.id), f.created_at)
    ) AS owed_since`),
    'k.closes_at as kind_closes_at',
    'c.closes_at',
  )
  return rows.map((row) => ({
    feeId: row.id,
    closesAt: row.kind_closes_at ?? row.closes_at,
    dueAt: row.due_at,
    owedSince: row.owed_since,
  }))
}
