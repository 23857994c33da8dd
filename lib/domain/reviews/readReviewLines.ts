import { standingAssignments, type AssignmentFacts } from '@/db/queries/assignmentsRead'
import { callCriteria, findCall } from '@/db/queries/calls'
import { databaseNow } from '@/db/queries/clock'
import { declarationOf, lastLateArrival } from '@/db/queries/conflicts'
import { standingScores } from '@/db/queries/reviews'
import { modeNames, snapshotHeads } from '@/db/queries/snapshotHeads'
import { callPhase } from '../calls/rules'
import type { Call, CallCriterion } from '../calls/types'
import { barredFrom } from '../conflicts/barredPairs'
import { declarationHolds } from '../conflicts/policy'
import type { ActingContext } from '../context'
import { instrumentWords } from './instrumentWords'
import { canSeeReview } from './policy'
import { reviewState, weightedMean } from './rules'
import { readScaleUse } from './readScaleUse'
import type { ReviewLine, ScaleUse } from './types'

export interface ReviewsOfCall {
  call: Pick<Call, 'slug' | 'number' | 'title' | 'reviewsDueAt' | 'panelMeetsAt'>
  declaredAt: Date | null
  hasDeclared: boolean
  /** Shown before the declaration, when nothing else is. */
  assigned: number
  lines: ReviewLine[]
  /** Null before the declaration. */
  scale: ScaleUse | null
  now: Date
}

interface OneCall {
  call: Call
  hasDeclared: boolean
  assignments: AssignmentFacts[]
}

async function linesOf(ctx: ActingContext, { call, assignments }: OneCall): Promise<ReviewLine[]> {
  const proposalIds = assignments.map((assignment) => assignment.proposalId)
  const [heads, scores, criteria] = await Promise.all([
    snapshotHeads(ctx.db, proposalIds),
    standingScores(
      ctx.db,
      assignments.map(({ id }) => id),
    ),
    callCriteria(ctx.db, call.id),
  ])
  const modes = await modeNames(
    ctx.db,
    [...heads.values()].flatMap((head) => head.modeIds),
  )
  const sheetOf = (id: number, all: readonly CallCriterion[]) =>
    all.map(({ id: criterion, weight }) => ({ weight, halfPoints: scores.get(id)?.get(criterion) ?? null }))
  return assignments.flatMap((assignment) => {
    const head = heads.get(assignment.proposalId)
    if (!head) return []
    const score = weightedMean(sheetOf(assignment.id, criteria))
    return [
      {
        assignmentId: assignment.id,
        callSlug: call.slug,
        callNumber: call.number,
        reviewNumber: head.reviewNumber ?? '',
        title: head.title,
        askedSeconds: head.askedSeconds,
        instruments: instrumentWords(head.modeIds.flatMap((id) => modes.get(id) ?? [])),
        verdict: head.verdict,
        score,
        state: reviewState(assignment.finishedAt, score !== null),
        dueAt: call.reviewsDueAt.toISOString(),
      },
    ]
  })
}

/** The reviewer's own assignments, call by call, the newest first. Whoever has not declared interests sees none. */
export async function readReviewLines(ctx: ActingContext): Promise<ReviewsOfCall[]> {
  const me = ctx.actor.personId
  const [all, now] = await Promise.all([standingAssignments(ctx.db, me), databaseNow(ctx.db)])
  const calls: ReviewsOfCall[] = []
  for (const callId of [...new Set(all.map((assignment) => assignment.callId))].sort((a, b) => b - a)) {
    const call = await findCall(ctx.db, callId)
    if (!call) continue
    const [barred, declaredAt, late] = await Promise.all([
      barredFrom(ctx.db, me, callId),
      declarationOf(ctx.db, me, callId),
      lastLateArrival(ctx.db, callId),
    ])
    const hasDeclared = declarationHolds(declaredAt, late)
    const assignments = all.filter(
      (assignment) =>
        assignment.callId === callId &&
        canSeeReview(ctx.actor, {
          assignment,
          call,
          proposalState: assignment.proposalState,
          isBarred: barred.has(assignment.proposalId),
          hasDeclared,
          now,
        }).allowed,
    )
    if (assignments.length === 0) continue
    calls.push({
      call: {
        slug: call.slug,
        number: call.number,
        title: call.title,
        reviewsDueAt: call.reviewsDueAt,
        panelMeetsAt: call.panelMeetsAt,
      },
      declaredAt,
      hasDeclared,
      assigned: assignments.length,
      now,
      scale: hasDeclared ? await readScaleUse(ctx, callPhase(call, now), assignments, barred) : null,
      lines: hasDeclared ? await linesOf(ctx, { call, hasDeclared, assignments }) : [],
    })
  }
  return calls
}
