import { lockAssignmentsOf, withdrawAssignment } from '@/db/queries/assignmentsRead'
import { recordConflict } from '@/db/queries/conflicts'
import type { Call } from '../calls/types'
import type { DeclaredKind } from '../conflicts/types'
import { writeToLeaders } from '../conflicts/writeToLeaders'
import type { ActingContext } from '../context'

/**
 * Bars a person from a proposal from this moment on, in the caller's transaction: the interest is kept as declared, and
 * what they were given of it is taken back as a recusal, finished or not, of which the panel's leaders are told. Says how
 * many assignments were taken back.
 */
export async function recuse(
  tx: ActingContext,
  call: Pick<Call, 'id' | 'slug' | 'number' | 'reviewsDueAt'>,
  interest: { proposalId: number; kind: DeclaredKind; reason: string },
): Promise<number> {
  const { personId } = tx.actor
  const { proposalId, kind, reason } = interest
  const held = await lockAssignmentsOf(tx.db, personId, call.id)
  await recordConflict(tx.db, { personId, proposalId, kind, source: 'declared', note: reason })
  const hit = held.filter((assignment) => assignment.proposalId === proposalId)
  for (const { id } of hit) await withdrawAssignment(tx.db, id, reason)
  await writeToLeaders(tx, call, hit)
  return hit.length
}
