import type { Database } from '../client.ts'
import type { AssessmentsRow, PanelMembersRow, ProposalsRow } from '../tables.ts'

export interface LedPanel {
  id: number
  name: string
  quorum: number
  seat: PanelMembersRow['seat']
}

/** Panels of a call on which a person has a seat now, in the order they were made. */
export function seatsHeld(db: Database, callId: number, personId: number): Promise<LedPanel[]> {
  return db('panel_members as m')
    .join('panels as p', 'p.id', 'm.panel_id')
    .where({ 'p.call_id': callId, 'm.person_id': personId })
    .whereNull('m.left_at')
    .orderBy('p.id')
    .select<LedPanel[]>('p.id', 'p.name', 'p.quorum', 'm.seat')
}

/** The panel's row, locked: verbs of one panel run one after another. */
export async function lockPanel(db: Database, panelId: number): Promise<{ callId: number } | null> {
  const row = await db('panels').where({ id: panelId }).forUpdate().first('call_id')
  return row ? { callId: row.call_id } : null
}

export interface PanelProposal {
  id: number
  reviewNumber: string
  state: ProposalsRow['state']
  kind: string
}

const judged = ['submitted', 'under-review', 'awarded', 'reserve', 'declined'] as const

/** Sent proposals a panel judges, by review number. */
export function panelProposals(db: Database, panelId: number): Promise<PanelProposal[]> {
  return db('proposals as p')
    .join('call_kinds as k', 'k.id', 'p.call_kind_id')
    .where('p.panel_id', panelId)
    .whereIn('p.state', judged)
    .orderBy('p.review_number')
    .select<PanelProposal[]>({
      id: 'p.id',
      reviewNumber: 'p.review_number',
      state: 'p.state',
      kind: 'k.title',
    })
}

export interface RequestLine {
  proposalId: number
  instrumentId: number
  instrument: string
  telescopeId: number
  telescope: string
  askedSeconds: number
}

/**
 * Time asked of each instrument, as the standing versions of the proposals say. A version that was frozen before
 * targets could be backups does not say how often an observation counts: once.
 */
export async function requestLines(db: Database, proposalIds: readonly number[]): Promise<RequestLine[]> {
  if (proposalIds.length === 0) return []
  const [rows] = (await db.raw(
    `SELECT v.proposal_id AS proposalId, i.id AS instrumentId, i.name AS instrument, t.id AS telescopeId,
            t.name AS telescope, SUM(o.asked * COALESCE(c.times, 1)) AS askedSeconds
       FROM proposal_versions v
       JOIN JSON_TABLE(v.snapshot, '$.contents.observations[*]'
              COLUMNS (id INT PATH '$.id', mode INT PATH '$.modeId', asked INT PATH '$.askedSeconds')) o
       LEFT JOIN JSON_TABLE(v.snapshot, '$.computation.observations[*]'
              COLUMNS (id INT PATH '$.observationId', times INT PATH '$.times')) c ON c.id = o.id
       JOIN instrument_modes m ON m.id = o.mode
       JOIN instruments i ON i.id = m.instrument_id
       JOIN telescopes t ON t.id = i.telescope_id
      WHERE v.proposal_id IN (${proposalIds.map(() => '?').join(', ')}) AND v.superseded_at IS NULL
      GROUP BY v.proposal_id, i.id ORDER BY v.proposal_id, i.id`,
    [...proposalIds],
  )) as [(Omit<RequestLine, 'askedSeconds'> & { askedSeconds: string })[]]
  return rows.map((row) => ({ ...row, askedSeconds: Number(row.askedSeconds) }))
}

export interface AssessedLine {
  proposalId: number
  instrumentId: number
  verdict: AssessmentsRow['verdict']
  trueSeconds: number
  reason: string
  panelNote: string
}

/** Standing assessments of the instrument scientists. */
export async function assessedLines(db: Database, proposalIds: readonly number[]): Promise<AssessedLine[]> {
  if (proposalIds.length === 0) return []
  return db('assessments as a')
    .join('assessment_requests as r', 'r.id', 'a.request_id')
    .whereIn('r.proposal_id', proposalIds)
    .whereNull('a.superseded_at')
    .orderBy(['r.proposal_id', 'r.instrument_id'])
    .select<AssessedLine[]>({
      proposalId: 'r.proposal_id',
      instrumentId: 'r.instrument_id',
      verdict: 'a.verdict',
      trueSeconds: 'a.true_seconds',
      reason: 'a.reason',
      panelNote: 'a.panel_note',
    })
}

export interface OfferedBlock {
  telescopeId: number
  telescope: string
  /** 'YYYY-MM' and which half of the month. */
  month: string
  half: 1 | 2
  seconds: number
}

/** Dark time on offer for science, by telescope and half-month. */
export async function offeredTime(db: Database, callId: number): Promise<OfferedBlock[]> {
  const [rows] = (await db.raw(
    `SELECT b.telescope_id AS telescopeId, t.name AS telescope, DATE_FORMAT(b.evening_date, '%Y-%m') AS month,
            IF(DAY(b.evening_date) < 16, 1, 2) AS half, SUM(b.dark_seconds) AS seconds
       FROM night_blocks b JOIN telescopes t ON t.id = b.telescope_id
      WHERE b.call_id = ? AND b.use_for = 'science'
      GROUP BY b.telescope_id, month, half ORDER BY b.telescope_id, month, half`,
    [callId],
  )) as [(Omit<OfferedBlock, 'seconds' | 'half'> & { seconds: string; half: number })[]]
  return rows.map((row) => ({ ...row, half: row.half === 1 ? 1 : 2, seconds: Number(row.seconds) }))
}

export interface PanelMember {
  personId: number
  number: number
  name: string
  email: string
  seat: PanelMembersRow['seat']
  /** Holds the reviewer's role for this panel now, and the account is open. */
  mayReview: boolean
}

/** Who sits on the panel, by number. */
export async function panelMembers(db: Database, panelId: number): Promise<PanelMember[]> {
  const granted = db('role_grants as g')
    .where('g.role', 'reviewer')
    .whereNull('g.revoked_at')
    .andWhere('g.from_at', '<=', db.raw('UTC_TIMESTAMP(3)'))
    .andWhere((q) => q.whereNull('g.until_at').orWhere('g.until_at', '>', db.raw('UTC_TIMESTAMP(3)')))
    .andWhere((q) => q.whereNull('g.panel_id').orWhere('g.panel_id', panelId))
    .andWhere((q) =>
      q.whereNull('g.call_id').orWhere('g.call_id', db('panels').where('id', panelId).select('call_id')),
    )
    .select('g.person_id')
  const rows = await db('panel_members as m')
    .join('people as a', 'a.id', 'm.person_id')
    .where('m.panel_id', panelId)
    .whereNull('m.left_at')
    .orderBy('m.number')
    .select<(Omit<PanelMember, 'mayReview'> & { shut: Date | null })[]>({
      personId: 'm.person_id',
      number: 'm.number',
      name: 'a.name',
      email: 'a.email',
      seat: 'm.seat',
      shut: 'a.disabled_at',
    })
  const may = new Set((await granted).map((row) => row.person_id))
  return rows.map(({ shut, ...row }) => ({ ...row, mayReview: shut === null && may.has(row.personId) }))
}
