import type { PanelAssignment } from '@/db/queries/assignments'
import { callCriteria } from '@/db/queries/calls'
import { standingScores, type ScoreRound } from '@/db/queries/reviews'
import { weightedScore, type Score } from '@/lib/panel/statistics'
import type { ActingContext } from '../context'

/** Weighted scores of a round, before discussion as a rule, of the finished reviews among these assignments. */
export async function panelScores(
  ctx: Pick<ActingContext, 'db'>,
  callId: number,
  assignments: readonly PanelAssignment[],
  round: ScoreRound = 'before-discussion',
): Promise<Score[]> {
  const finished = assignments.filter((a) => a.finishedAt !== null)
  if (finished.length === 0) return []
  const criteria = await callCriteria(ctx.db, callId)
  const sheets = await standingScores(
    ctx.db,
    finished.map(({ id }) => id),
    round,
  )
  return finished.flatMap((assignment) => {
    const sheet = sheets.get(assignment.id)
    const score = weightedScore(
      criteria.map(({ id, weight }) => ({ weight, halfPoints: sheet?.get(id) ?? null })),
    )
    return score === null ? [] : [{ proposal: assignment.proposalId, reviewer: assignment.personId, score }]
  })
}
