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
  affiliationClass: FeesRow['affiliation_class'] | null
  disputedMinor: number
  lostMinor: number
  /** The invoice that is open. */
  invoice: { number: string; isOverdue: boolean } | null
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
  affiliation_class: FeesRow['affiliation_class'] | null
  disputed: string | null
  lost: string | null
  invoice: string | null
  is_overdue: 0 | 1 | null
  waiver_id: number | null
  waiver_reason: string | null
}

/** Money that came and went by fee, as the books have it. */
const moneyByFee = (db: Database) =>
  db.raw(`(SELECT fee_id,
      SUM(IF(movement LIKE 'paid:%' AND account = 'provider' OR movement LIKE 'settled:%' AND account = 'bank'
        OR movement LIKE 'paid-after-all:%' AND account = 'provider' OR movement LIKE 'dispute-decided:%' AND account = 'lost', amount_minor, 0)) AS paid,
      -SUM(IF(movement LIKE 'refunded:%' AND account IN ('provider', 'bank'), amount_minor, 0)) AS refunded,
      SUM(IF(account = 'disputed', amount_minor, 0)) AS disputed, SUM(IF(account = 'lost', amount_minor, 0)) AS lost
    FROM money_entries GROUP BY fee_id) AS e`)

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
    .leftJoin('invoices as i', (on) => on.on('i.fee_id', 'f.id').andOn('i.state', db.raw('?', ['open'])))
    .leftJoin(moneyByFee(db), 'e.fee_id', 'f.id')
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
      'f.affiliation_class',
      'i.number as invoice',
      db.raw('i.due_at <= UTC_TIMESTAMP(3) AS is_overdue'),
      db.raw('e.paid, e.refunded, e.disputed, e.lost'),
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
    affiliationClass: row.affiliation_class,
    disputedMinor: Number(row.disputed ?? 0),
    lostMinor: Number(row.lost ?? 0),
    invoice: row.invoice === null ? null : { number: row.invoice, isOverdue: row.is_overdue === 1 },
    waiverAsked: row.waiver_id !== null,
    waiverId: row.waiver_id,
    waiverReason: row.waiver_reason,
  }))
}
