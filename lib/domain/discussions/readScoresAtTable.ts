import type { PanelAssignment } from '@/db/queries/assignments'
import { callCriteria } from '@/db/queries/calls'
import { standingScores } from '@/db/queries/reviews'
import { weightedScore } from '@/lib/panel/statistics'
import type { ActingContext } from '../context'
import { meanAfter } from './rules'
import type { TableView } from './tableView'

/** Scores of the proposal on the table, first and later, and the reader's own sheet. */
export async function readScoresAtTable(
  ctx: ActingContext,
  callId: number,
  assignments: readonly PanelAssignment[],
  numberOf: ReadonlyMap<number, number>,
): Promise<Pick<TableView, 'scores' | 'meanBefore' | 'meanAfter' | 'own'>> {
  const finished = assignments.filter((one) => one.finishedAt !== null)
  const ids = finished.map(({ id }) => id)
  const [criteria, first, later] = await Promise.all([
    callCriteria(ctx.db, callId),
    standingScores(ctx.db, ids),
    standingScores(ctx.db, ids, 'after-discussion'),
  ])
  const scoreOf = (id: number, isAfter: boolean) => {
    const sheet = later.get(id)
    const isTouched = [...(sheet?.values() ?? [])].some((half) => half !== null)
    if (isAfter && !isTouched) return null
    return weightedScore(
      criteria.map(({ id: criterion, weight }) => ({
        weight,
        halfPoints: (isAfter ? sheet?.get(criterion) : null) ?? first.get(id)?.get(criterion) ?? null,
      })),
    )
  }
  const scores = finished
    .map((one) => ({
      reviewer: numberOf.get(one.personId) ?? 0,
      before: scoreOf(one.id, false),
      after: scoreOf(one.id, true),
    }))
    .sort((a, b) => a.reviewer - b.reviewer)
  const own = finished.find((one) => one.personId === ctx.actor.personId)
  return {
    scores,
    meanBefore: meanAfter(scores.map(({ before }) => ({ before, after: null }))),
    meanAfter: scores.some(({ after }) => after !== null) ? meanAfter(scores) : null,
    own: own
      ? {
          assignmentId: own.id,
          criteria: criteria.map(({ id, title, prompt, weight }) => ({
            id,
            title,
            prompt,
            weight,
            before: first.get(own.id)?.get(id) ?? null,
            after: later.get(own.id)?.get(id) ?? null,
          })),
        }
      : null,
  }
}
