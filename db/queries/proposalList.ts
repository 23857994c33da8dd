import type { Database } from '../client.ts'
import type { CallsRow, ProposalsRow } from '../tables.ts'
import { askedTime } from './askedTime.ts'

export interface ListedProposal {
  reference: string
  title: string
  state: ProposalsRow['state']
  isReopened: boolean
  withdrawnReason: string | null
  closesAt: Date | null
  updatedAt: Date
  call: Pick<CallsRow, 'number' | 'slug' | 'title' | 'stage' | 'opens_at' | 'closes_at'>
  kind: { title: string; closesAt: Date | null }
  askedSeconds: number
  targets: number
  lead: string
  isLead: boolean
  hasAgreed: boolean
  /** May speak for it: leads it or is its deputy, and has agreed. */
  maySpeak: boolean
  callId: number
  /** Calls in which its programme has a proposal. */
  programmeCalls: number[]
}

interface Row {
  id: number
  reference: string
  title: string
  state: ProposalsRow['state']
  is_reopened: 0 | 1
  withdrawn_reason: string | null
  closes_at: Date | null
  updated_at: Date
  number: number
  slug: string
  call_title: string
  stage: CallsRow['stage']
  opens_at: Date
  call_closes_at: Date
  kind_title: string
  kind_closes_at: Date | null
  targets: string
  lead: string | null
  role: string
  access: string
  call_id: number
  programme_calls: string | null
  confirmed_at: Date | null
}

/** Every proposal that names this person, by account or by proved address; the last changed first, 500 at most. */
export async function proposalsNaming(
  db: Database,
  person: { id: number; email: string },
): Promise<ListedProposal[]> {
  const rows = await db('proposal_people as q')
    .join('proposals as p', 'p.id', 'q.proposal_id')
    .join('calls as c', 'c.id', 'p.call_id')
    .join('call_kinds as k', 'k.id', 'p.call_kind_id')
    .where((named) =>
      named
        .where('q.person_id', person.id)
        .orWhere((byAddress) => byAddress.whereNull('q.person_id').andWhere('q.email', person.email)),
    )
    .orderBy('p.updated_at', 'desc')
    .limit(500)
    .select<Row[]>(
      'p.id',
      'p.reference',
      'p.title',
      'p.state',
      'p.is_reopened',
      'p.withdrawn_reason',
      'p.closes_at',
      'p.updated_at',
      'c.number',
      'c.slug',
      'c.title as call_title',
      'c.stage',
      'c.opens_at',
      'c.closes_at as call_closes_at',
      'k.title as kind_title',
      'k.closes_at as kind_closes_at',
      'q.role',
      'q.access',
      'p.call_id',
      db.raw(
        "(SELECT GROUP_CONCAT(DISTINCT o.call_id) FROM proposals o WHERE o.programme_id = p.programme_id AND o.state <> 'withdrawn') AS programme_calls",
      ),
      'q.confirmed_at',
      db.raw('(SELECT COUNT(*) FROM targets t WHERE t.proposal_id = p.id) AS targets'),
      db.raw(
        "(SELECT l.name FROM proposal_people l WHERE l.proposal_id = p.id AND l.role = 'pi' LIMIT 1) AS lead",
      ),
    )
  const asked = await askedTime(
    db,
    rows.map(({ id }) => id),
  )
  return rows.map((row) => ({
    reference: row.reference,
    title: row.title,
    state: row.state,
    isReopened: row.is_reopened === 1,
    withdrawnReason: row.withdrawn_reason,
    closesAt: row.closes_at,
    updatedAt: row.updated_at,
    call: {
      number: row.number,
      slug: row.slug,
      title: row.call_title,
      stage: row.stage,
      opens_at: row.opens_at,
      closes_at: row.call_closes_at,
    },
    kind: { title: row.kind_title, closesAt: row.kind_closes_at },
    askedSeconds: asked.get(row.id) ?? 0,
    targets: Number(row.targets),
    lead: row.lead ?? '',
    isLead: row.role === 'pi',
    hasAgreed: row.confirmed_at !== null,
    maySpeak: row.confirmed_at !== null && (row.role === 'pi' || row.access === 'deputy'),
    callId: row.call_id,
    programmeCalls: (row.programme_calls ?? '').split(',').filter(Boolean).map(Number),
  }))
}
