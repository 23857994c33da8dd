import type { Audience, SheetText } from '../../lib/domain/reviews/types.ts'
import type { Database } from '../client.ts'
import { utcNow } from '../utcNow.ts'

/** Scores given before the panel met, or while it discussed: never mixed. */
export type ScoreRound = 'before-discussion' | 'after-discussion'

/** The scores of a round that stand, by assignment and criterion: the last event of each counts. */
export async function standingScores(
  db: Database,
  assignmentIds: readonly number[],
  round: ScoreRound = 'before-discussion',
): Promise<Map<number, Map<number, number | null>>> {
  const newest = db('score_events')
    .whereIn('assignment_id', assignmentIds)
    .where({ round })
    .groupBy('assignment_id', 'criterion_id')
    .max('id')
  const rows = await db('score_events')
    .whereIn('id', newest)
    .select('assignment_id', 'criterion_id', 'half_points')
  const scores = new Map<number, Map<number, number | null>>()
  for (const row of rows) {
    const sheet = scores.get(row.assignment_id) ?? new Map<number, number | null>()
    scores.set(row.assignment_id, sheet.set(row.criterion_id, row.half_points))
  }
  return scores
}

export async function insertScoreEvent(
  db: Database,
  event: {
    assignmentId: number
    criterionId: number
    criterionVersion: number
    halfPoints: number | null
    round?: ScoreRound
  },
): Promise<void> {
  await db('score_events').insert({
    assignment_id: event.assignmentId,
    criterion_id: event.criterionId,
    criterion_version: event.criterionVersion,
    round: event.round ?? 'before-discussion',
    half_points: event.halfPoints,
  })
}

export async function reviewTexts(
  db: Database,
  assignmentId: number,
): Promise<(SheetText & { savedAt: Date })[]> {
  const rows = await db('review_texts').where({ assignment_id: assignmentId })
  return rows.map((row) => ({
    audience: row.audience,
    body: row.body,
    version: row.version,
    savedAt: row.saved_at,
  }))
}

/** Writes a text that still stands at `version` (0: none yet); false when another window was first. */
export async function writeReviewText(
  db: Database,
  given: { assignmentId: number; audience: Audience; body: string; version: number },
): Promise<boolean> {
  const savedAt = utcNow(db)
  const where = { assignment_id: given.assignmentId, audience: given.audience }
  if (given.version === 0) {
    if (await db('review_texts').where(where).first('id')) return false
    await db('review_texts').insert({ ...where, body: given.body, saved_at: savedAt })
    return true
  }
  const count = await db('review_texts')
    .where({ ...where, version: given.version })
    .update({ body: given.body, version: given.version + 1, saved_at: savedAt })
  return count === 1
}

/** When anything on a sheet was last stored; null while it is blank. */
export async function lastSaved(db: Database, assignmentId: number): Promise<Date | null> {
  const scored = await db('score_events')
    .where({ assignment_id: assignmentId })
    .max<{ at: Date | null } | undefined>({ at: 'created_at' })
    .first()
  const written = await db('review_texts')
    .where({ assignment_id: assignmentId })
    .max<{ at: Date | null } | undefined>({ at: 'saved_at' })
    .first()
  const times = [scored?.at, written?.at].filter((at): at is Date => at instanceof Date)
  return times.length === 0 ? null : new Date(Math.max(...times.map((at) => at.getTime())))
}
