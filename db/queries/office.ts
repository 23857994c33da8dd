import type { Database } from '../client.ts'
import type { FeesRow, ProposalsRow } from '../tables.ts'
import { askedTime } from './askedTime.ts'

export interface OfficeProposal {
  reference: string
  reviewNumber: string | null
  title: string
  state: ProposalsRow['state']
  isReopened: boolean
  kind: string
  lead: string
  arrivedAt: Date | null
  versionNumber: number | null
  askedSeconds: number
  feeState: FeesRow['state'] | null
  feeMinor: number | null
  paidMinor: number
  refundedMinor: number
  waiverAsked: boolean
  waiverId: number | null
  waiverReason: string | null
}

interface Row {
  id: number
  reference: string
  review_number: string | null
  title: string
  state: ProposalsRow['state']
  is_reopened: 0 | 1
  kind: string
  lead: string | null
  arrived_at: Date | null
  version_number: number | null
  fee_state: FeesRow['state'] | null
  fee_minor: number | null
  paid: string | null
  refunded: string | null
  waiver_id: number | null
  waiver_reason: string | null
}

/** Proposals of a call as the office sees them: who sent what and when, and what was paid. Two queries. */
export async function proposalsOfCall(db: Database, callId: number): Promise<OfficeProposal[]> {
  const rows = await db('proposals as p')
    .join('call_kinds as k', 'k.id', 'p.call_kind_id')
    .leftJoin('proposal_people as q', (on) =>
      on.on('q.proposal_id', 'p.id').andOn('q.role', db.raw('?', ['pi'])),
    )
    .leftJoin('proposal_versions as v', (on) => on.on('v.proposal_id', 'p.id').andOnNull('v.superseded_at'))
    .leftJoin('fees as f', 'f.proposal_id', 'p.id')
    .leftJoin('waivers as w', (on) => on.on('w.fee_id', 'f.id').andOn('w.state', db.raw('?', ['asked'])))
    .where('p.call_id', callId)
    .orderBy('p.id')
    .select<Row[]>(
      'p.id',
      'p.reference',
      'p.review_number',
      'p.title',
      'p.state',
      'p.is_reopened',
      'k.title as kind',
      'q.name as lead',
      'v.arrived_at',
      'v.version_number',
      'f.state as fee_state',
      'f.amount_minor as fee_minor',
      'w.id as waiver_id',
      'w.reason as waiver_reason',
      db.raw(
        "(SELECT SUM(m.amount_minor) FROM payments m WHERE m.fee_id = f.id AND m.state = 'succeeded') AS paid",
      ),
      db.raw(
        "(SELECT SUM(r.amount_minor) FROM refunds r JOIN payments m ON m.id = r.payment_id WHERE m.fee_id = f.id AND r.state = 'succeeded') AS refunded",
      ),
    )
  const asked = await askedTime(
    db,
    rows.map(({ id }) => id),
  )
  return rows.map((row) => ({
    reference: row.reference,
    reviewNumber: row.review_number,
    title: row.title,
    state: row.state,
    isReopened: row.is_reopened === 1,
    kind: row.kind,
    lead: row.lead ?? '',
    arrivedAt: row.arrived_at,
    versionNumber: row.version_number,
    askedSeconds: asked.get(row.id) ?? 0,
    feeState: row.fee_state,
    feeMinor: row.fee_minor,
    paidMinor: Number(row.paid ?? 0),
    refundedMinor: Number(row.refunded ?? 0),
    waiverAsked: row.waiver_id !== null,
    waiverId: row.waiver_id,
    waiverReason: row.waiver_reason,
  }))
}
