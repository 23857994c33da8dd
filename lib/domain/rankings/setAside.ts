import { changeRanking, writeSetAside } from '@/db/queries/rankings'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { visibleProposal } from '../panels/openPanel'
import { openList, staleList } from './openList'
import type { SetAsideInput } from './schema'

/** Sets proposals aside as not to be discussed, or brings them back. Their places stay. */
export function setAside(ctx: ActingContext, input: SetAsideInput): Promise<void> {
  return inTransaction(ctx, async (tx) => {
    const { desk, ranking } = await openList(tx, input)
    const chosen = input.proposalIds.map((id) => visibleProposal(desk, id))
    if (!(await changeRanking(tx.db, ranking, {}))) throw staleList(desk, ranking)
    await writeSetAside(tx.db, ranking.id, input.proposalIds, input.aside)
    await writeLogbook(tx, {
      action: input.aside ? 'ranking.set-aside' : 'ranking.bring-back',
      subject: { kind: 'ranking', id: ranking.id },
      actingAs: 'chair',
      after: { reviewNumbers: chosen.map((proposal) => proposal.reviewNumber) },
    })
  })
}
