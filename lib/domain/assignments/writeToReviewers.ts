import { pagesToRead } from '@/db/queries/assignments'
import type { PanelMember } from '@/db/queries/panel'
import { paths } from '@/lib/paths'
import type { ActingContext } from '../context'
import { reviewsAssigned } from '../outbox/letters/reviewsAssigned'
import { queueLetter } from '../outbox/queueLetter'
import type { PanelDesk } from '../panels/openPanel'

/** One letter to each reviewer about everything assigned in this act, in the caller's transaction. */
export async function writeToReviewers(
  tx: ActingContext,
  desk: PanelDesk,
  members: readonly PanelMember[],
  pairs: readonly { proposalId: number; personId: number }[],
  urgent: boolean,
): Promise<void> {
  const pages = await pagesToRead(tx.db, [...new Set(pairs.map((pair) => pair.proposalId))])
  for (const member of members) {
    const own = pairs.filter((pair) => pair.personId === member.personId)
    if (own.length === 0) continue
    await queueLetter(
      tx,
      member,
      reviewsAssigned(
        member,
        {
          callNumber: desk.call.number,
          reviewNumbers: own
            .map((pair) => desk.proposals.find(({ id }) => id === pair.proposalId)?.reviewNumber ?? '')
            .sort(),
          pages: own.reduce((sum, pair) => sum + (pages.get(pair.proposalId) ?? 0), 0),
          dueAt: desk.call.reviewsDueAt,
          urgent,
        },
        tx.request.origin + paths.reviews(),
      ),
      `assigned:${desk.panel.id}:${tx.request.id}`,
    )
  }
}
