import { panelAssignments } from '@/db/queries/assignments'
import type { AssignmentFacts } from '@/db/queries/assignmentsRead'
import { panelLeaders } from '@/db/queries/roleHolders'
import { paths } from '@/lib/paths'
import type { Call } from '../calls/types'
import type { ActingContext } from '../context'
import { readerLost } from '../outbox/letters/readerLost'
import { queueLetter } from '../outbox/queueLetter'
import { barredFrom } from './barredPairs'

/**
 * Tells the leaders of each panel that what they assigned has lost its reader, in the caller's transaction. Nobody is
 * told of a proposal in which they have an interest themselves: whoever leads the panel beside them is.
 */
export async function writeToLeaders(
  tx: ActingContext,
  call: Pick<Call, 'id' | 'slug' | 'number' | 'reviewsDueAt'>,
  withdrawn: readonly AssignmentFacts[],
): Promise<void> {
  for (const panelId of new Set(withdrawn.map((assignment) => assignment.panelId))) {
    const standing = await panelAssignments(tx.db, panelId)
    for (const leader of await panelLeaders(tx.db, panelId)) {
      const hidden = await barredFrom(tx.db, leader.personId, call.id)
      const theirs = withdrawn.filter((one) => one.panelId === panelId && !hidden.has(one.proposalId))
      if (theirs.length === 0) continue
      const letter = readerLost({
        name: leader.name,
        reviewer: tx.actor.name,
        callNumber: call.number,
        proposals: theirs.map(({ proposalId, reviewNumber }) => ({
          reviewNumber: reviewNumber ?? '',
          readersLeft: standing.filter((one) => one.proposalId === proposalId).length,
        })),
        dueAt: call.reviewsDueAt,
        url: tx.request.origin + paths.panel(call.slug, 'assignments', panelId),
      })
      await queueLetter(tx, leader, letter, `reader-lost:${panelId}:${tx.request.id}`)
    }
  }
}
