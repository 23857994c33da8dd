import { findAssignment, type AssignmentFacts } from '@/db/queries/assignmentsRead'
import { findCall } from '@/db/queries/calls'
import { databaseNow } from '@/db/queries/clock'
import { declarationOf, lastLateArrival } from '@/db/queries/conflicts'
import { refuse } from '@/lib/errors'
import type { Call } from '../calls/types'
import { barredFrom } from '../conflicts/barredPairs'
import { declarationHolds } from '../conflicts/policy'
import type { ActingContext } from '../context'
import type { ReviewFacts } from './policy'

export interface FullReviewFacts extends ReviewFacts {
  assignment: AssignmentFacts
  call: Call
  declaredAt: Date | null
}

/** Everything a policy asks about a review. With `lock`, the assignment stays as it is until the transaction ends. */
export async function reviewFacts(
  ctx: ActingContext,
  assignmentId: number,
  lock: boolean,
): Promise<FullReviewFacts> {
  const assignment = await findAssignment(ctx.db, assignmentId, lock)
  // Someone else's assignment is not looked into any further.
  if (!assignment || assignment.personId !== ctx.actor.personId) throw refuse.notFound('review')
  const call = await findCall(ctx.db, assignment.callId)
  if (!call) throw refuse.notFound('review')
  const me = ctx.actor.personId
  const [barred, declaredAt, late, now] = await Promise.all([
    barredFrom(ctx.db, me, call.id),
    declarationOf(ctx.db, me, call.id),
    lastLateArrival(ctx.db, call.id),
    databaseNow(ctx.db),
  ])
  return {
    assignment,
    call,
    proposalState: assignment.proposalState,
    isBarred: barred.has(assignment.proposalId),
    hasDeclared: declarationHolds(declaredAt, late),
    declaredAt,
    now,
  }
}
