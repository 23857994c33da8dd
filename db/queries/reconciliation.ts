import type { Database } from '../client.ts'
import type { PaymentsRow } from '../tables.ts'

export interface PaymentForFirm {
  id: number
  reference: string
  state: PaymentsRow['state']
  key: string
  sessionId: string | null
  paymentId: string | null
  amountMinor: number
  currency: string
  succeededAt: Date | null
  refundedMinor: number
  isDisputed: boolean
}

/** Every payment the firm has been asked for, with what was given back and whether it is disputed; one query. */
export async function paymentsForFirm(db: Database): Promise<PaymentForFirm[]> {
  const rows = await db('payments as m')
    .join('fees as f', 'f.id', 'm.fee_id')
    .join('proposals as p', 'p.id', 'f.proposal_id')
    .whereNotNull('m.provider_session_id')
    .orderBy('m.id')
    .select(
      'm.*',
      'p.reference',
      db.raw(
        "COALESCE((SELECT SUM(r.amount_minor) FROM refunds r WHERE r.payment_id = m.id AND r.state = 'succeeded'), 0) AS refunded",
      ),
      db.raw('EXISTS (SELECT 1 FROM disputes d WHERE d.payment_id = m.id) AS is_disputed'),
    )
  return rows.map((row) => ({
    id: row.id,
    reference: row.reference,
    state: row.state,
    key: row.idempotency_key,
    sessionId: row.provider_session_id,
    paymentId: row.provider_payment_id,
    amountMinor: row.amount_minor,
    currency: row.currency,
    succeededAt: row.succeeded_at,
    refundedMinor: Number((row as { refunded?: string }).refunded ?? 0),
    isDisputed: Number((row as { is_disputed?: number }).is_disputed ?? 0) === 1,
  }))
}

export interface LoggedDifference {
  at: Date
  name: string | null
  subjectKind: string
  subjectId: string
  after: string | null
}

/** Differences that were found and put into the logbook, the newest first. */
export async function loggedDifferences(db: Database, limit: number): Promise<LoggedDifference[]> {
  const rows = await db('logbook as l')
    .leftJoin('people as a', 'a.id', 'l.person_id')
    .where('l.action', 'fee.reconcile')
    .orderBy('l.id', 'desc')
    .limit(limit)
    .select('l.at', 'a.name', 'l.subject_kind', 'l.subject_id', 'l.after_value')
  return rows.map((row) => ({
    at: row.at,
    name: row.name,
    subjectKind: row.subject_kind,
    subjectId: row.subject_id,
    after: row.after_value,
  }))
}
