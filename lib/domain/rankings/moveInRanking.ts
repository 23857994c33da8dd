import { changeRanking, insertMove, writePlaces } from '@/db/queries/rankings'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { visibleProposal } from '../panels/openPanel'
import { openList, staleList } from './openList'
import { moveTo, visibleOrder } from './order'
import type { MoveInput } from './schema'

/** Moves a proposal to another rank by hand; the reason is kept beside it and in the logbook. */
export function moveInRanking(ctx: ActingContext, input: MoveInput): Promise<void> {
  return inTransaction(ctx, async (tx) => {
    const { desk, ranking, order } = await openList(tx, input)
    const proposal = visibleProposal(desk, input.proposalId)
    const shown = visibleOrder(order, desk.hidden)
    const from = shown.indexOf(proposal.id) + 1
    if (from === 0) throw refuse.notFound('proposal')
    if (input.place > shown.length) throw refuse.field('place', `The last rank is ${shown.length}.`)
    if (input.place === from) throw refuse.field('place', `It stands at rank ${from} already.`)
    const next = moveTo(order, desk.hidden, proposal.id, input.place)
    if (!(await changeRanking(tx.db, ranking, {}))) throw staleList(desk, ranking)
    await writePlaces(tx.db, ranking.id, next)
    await insertMove(tx.db, {
      rankingId: ranking.id,
      proposalId: proposal.id,
      from: order.indexOf(proposal.id) + 1,
      to: next.indexOf(proposal.id) + 1,
      reason: input.reason,
      by: tx.actor.personId,
    })
    await writeLogbook(tx, {
      action: 'ranking.move',
      subject: { kind: 'proposal', id: proposal.reviewNumber },
      actingAs: 'chair',
      before: { place: order.indexOf(proposal.id) + 1 },
      after: { place: next.indexOf(proposal.id) + 1, reason: input.reason },
    })
  })
}
