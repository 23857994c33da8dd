import type { Call, CallCriterion, CallKind } from '../../lib/domain/calls/types.ts'
import type { Database } from '../client.ts'
import type { CallKindsRow, CallsRow } from '../tables.ts'

function callOf(row: CallsRow): Call {
  return {
    id: row.id,
    number: row.number,
    slug: row.slug,
    title: row.title,
    summary: row.summary,
    siteId: row.site_id,
    stage: row.stage,
    seasonFrom: row.season_from,
    seasonTo: row.season_to,
    opensAt: row.opens_at,
    closesAt: row.closes_at,
    graceUntil: row.grace_until,
    assessmentsDueAt: row.assessments_due_at,
    reviewsDueAt: row.reviews_due_at,
    panelMeetsAt: row.panel_meets_at,
    lettersAt: row.letters_at,
    currency: row.currency,
    version: row.version,
  }
}

export async function findCall(db: Database, id: number): Promise<Call | null> {
  const row = await db('calls').where({ id }).first()
  return row ? callOf(row) : null
}

export async function findCallBySlug(db: Database, slug: string): Promise<Call | null> {
  const row = await db('calls').where({ slug }).first()
  return row ? callOf(row) : null
}

/** All calls, the newest first. */
export async function listCalls(db: Database): Promise<Call[]> {
  return (await db('calls').orderBy('number', 'desc')).map(callOf)
}

function kindOf(row: CallKindsRow): CallKind {
  return {
    id: row.id,
    kind: row.kind,
    title: row.title,
    closesAt: row.closes_at,
    pageLimit: row.page_limit,
    wordLimit: row.word_limit,
    abstractLimit: row.abstract_limit,
    figureLimit: row.figure_limit,
    maxSeconds: row.max_seconds,
    feeMinor: row.fee_minor,
    panelId: row.panel_id,
    needsStudent: row.needs_student === 1,
    targetLimit: row.target_limit,
    takesAwaited: row.takes_awaited === 1,
    needsCadence: row.needs_cadence === 1,
    needsLastNight: row.needs_last_night === 1,
  }
}

/** Kinds of proposal a call takes, in the order they were written. */
export async function callKinds(db: Database, callId: number): Promise<CallKind[]> {
  const rows = await db('call_kinds').where({ call_id: callId }).orderBy('id')
  return rows.map(kindOf)
}

/** A kind and the call it belongs to; null when there is none. */
export async function findCallOfKind(
  db: Database,
  kindId: number,
): Promise<{ call: Call; kind: CallKind } | null> {
  const row = await db('call_kinds').where({ id: kindId }).first()
  const call = row ? await findCall(db, row.call_id) : null
  return row && call ? { call, kind: kindOf(row) } : null
}

/** What proposals are judged by, in the order of the sheet. */
export async function callCriteria(db: Database, callId: number): Promise<CallCriterion[]> {
  const rows = await db('call_criteria').where({ call_id: callId }).orderBy('position')
  return rows.map((row) => ({
    id: row.id,
    position: row.position,
    title: row.title,
    prompt: row.prompt,
    weight: row.weight,
    criterionVersion: row.criterion_version,
  }))
}
