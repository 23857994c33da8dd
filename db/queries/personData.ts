import type { Database } from '../client.ts'

type Rows = Promise<Record<string, unknown>[]>

/** The account itself, without what only proves it. */
export const accountData = (db: Database, id: number): Rows =>
  db('people')
    .where({ id })
    .select(
      'email',
      'name',
      'institute_text as institute',
      'orcid',
      'orcid_verified_at',
      'career_stage',
      'time_zone',
      'email_confirmed_at',
      'disabled_at',
      'address_failed_at',
      'erasure_asked_at',
      'created_at',
    )

export const answersGiven = (db: Database, id: number): Rows =>
  db('demographics').where({ person_id: id }).select('purpose', 'answers', 'created_at')

export const rolesData = (db: Database, id: number): Rows =>
  db('role_grants as g')
    .leftJoin('calls as c', 'c.id', 'g.call_id')
    .leftJoin('panels as p', 'p.id', 'g.panel_id')
    .leftJoin('instruments as i', 'i.id', 'g.instrument_id')
    .where('g.person_id', id)
    .orderBy('g.id')
    .select(
      'g.role',
      'c.number as call',
      'p.name as panel',
      'i.name as instrument',
      'g.from_at',
      'g.until_at',
      'g.revoked_at',
    )

export const seatsData = (db: Database, id: number): Rows =>
  db('panel_members as m')
    .join('panels as p', 'p.id', 'm.panel_id')
    .join('calls as c', 'c.id', 'p.call_id')
    .where('m.person_id', id)
    .orderBy('m.id')
    .select('c.number as call', 'p.name as panel', 'm.seat', 'm.created_at as from_at', 'm.left_at')

export const proposalsData = (db: Database, id: number): Rows =>
  db('proposal_people as q')
    .join('proposals as p', 'p.id', 'q.proposal_id')
    .join('calls as c', 'c.id', 'p.call_id')
    .where('q.person_id', id)
    .orderBy('p.id')
    .select(
      'p.reference',
      'c.number as call',
      'p.title',
      'p.state',
      'q.name',
      'q.email',
      'q.institute',
      'q.orcid',
      'q.role',
      'q.access',
      'q.is_student',
      'q.confirmed_at',
    )

export const sentNamesData = (db: Database, id: number): Rows =>
  db('proposal_version_people as q')
    .join('proposal_versions as v', 'v.id', 'q.proposal_version_id')
    .join('proposals as p', 'p.id', 'v.proposal_id')
    .where('q.person_id', id)
    .orderBy('v.id')
    .select('p.reference', 'v.version_number', 'q.name', 'q.institute', 'q.career_stage', 'q.role')

export const reviewsData = (db: Database, id: number): Rows =>
  db('assignments as a')
    .join('proposals as p', 'p.id', 'a.proposal_id')
    .where('a.person_id', id)
    .orderBy('a.id')
    .select(
      'p.review_number',
      'a.seat',
      'a.assigned_at',
      'a.finished_at',
      'a.withdrawn_at',
      'a.withdrawn_reason',
    )

export const scoresData = (db: Database, id: number): Rows =>
  db('score_events as s')
    .join('assignments as a', 'a.id', 's.assignment_id')
    .join('proposals as p', 'p.id', 'a.proposal_id')
    .join('call_criteria as k', 'k.id', 's.criterion_id')
    .where('a.person_id', id)
    .orderBy('s.id')
    .select('p.review_number', 'k.title as criterion', 's.round', 's.half_points', 's.created_at')

export const reviewTextsData = (db: Database, id: number): Rows =>
  db('review_texts as t')
    .join('assignments as a', 'a.id', 't.assignment_id')
    .join('proposals as p', 'p.id', 'a.proposal_id')
    .where('a.person_id', id)
    .orderBy('t.id')
    .select('p.review_number', 't.audience', 't.body', 't.saved_at')

/** Only what the person declared: what was found by matching would tell of proposals that are not theirs to know. */
export const interestsData = (db: Database, id: number): Rows =>
  db('conflicts as c')
    .join('proposals as p', 'p.id', 'c.proposal_id')
    .join('calls as k', 'k.id', 'p.call_id')
    .where({ 'c.person_id': id, 'c.source': 'declared' })
    .distinct('k.number as call', 'c.kind', 'c.note', 'c.from_at', 'c.until_at')

export const expertiseData = (db: Database, id: number): Rows =>
  db('expertise').where({ person_id: id }).orderBy('id').select('kind', 'term', 'level', 'created_at')

export const assessmentsData = (db: Database, id: number): Rows =>
  db('assessments as a')
    .join('assessment_requests as r', 'r.id', 'a.request_id')
    .join('proposals as p', 'p.id', 'r.proposal_id')
    .where('a.assessed_by', id)
    .orderBy('a.id')
    .select('p.review_number', 'a.verdict', 'a.reason', 'a.panel_note', 'a.created_at')

export const waiversData = (db: Database, id: number): Rows =>
  db('waivers as w')
    .join('fees as f', 'f.id', 'w.fee_id')
    .join('proposals as p', 'p.id', 'f.proposal_id')
    .where('w.asked_by', id)
    .orderBy('w.id')
    .select('p.reference', 'w.reason', 'w.state', 'w.created_at', 'w.decided_at')

export const lettersData = (db: Database, id: number): Rows =>
  db('outbox')
    .where({ person_id: id })
    .orderBy('id')
    .select('template', 'to_email', 'to_name', 'subject', 'text_body', 'state', 'created_at', 'sent_at')

export const sessionsData = (db: Database, id: number): Rows =>
  db('sessions')
    .where({ person_id: id })
    .orderBy('created_at')
    .select('created_at', 'last_seen_at', 'expires_at', 'ended_at', 'user_agent')

export const deedsData = (db: Database, id: number): Rows =>
  db('logbook')
    .where({ person_id: id })
    .orderBy('id')
    .select('at', 'acting_as', 'action', 'subject_kind', 'subject_id', 'address')
