import { layOnTable, tableOfPanel } from '@/db/queries/discussion'
import { panelMembers } from '@/db/queries/panel'
import { currentRanking, rankingEntries } from '@/db/queries/rankings'
import { refuse } from '@/lib/errors'
import { barredPairs } from '../conflicts/barredPairs'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { openPanel, visibleProposal } from '../panels/openPanel'
import { whyNotOnTable } from './rules'
import type { DiscussInput } from './schema'

/**
 * Puts a proposal on the panel's table, or clears it. Whoever has an interest in it sees nothing until it is over, and
 * does not count towards the quorum.
 */
export function discussNow(ctx: ActingContext, input: DiscussInput): Promise<void> {
  return inTransaction(ctx, async (tx) => {
    const desk = await openPanel(tx, { panelId: input.panelId, lock: true })
    const { panel, call } = desk
    const table = await tableOfPanel(tx.db, panel.id)
    const proposal = input.proposalId === null ? null : visibleProposal(desk, input.proposalId)
    if (proposal) {
      const ranking = await currentRanking(tx.db, panel.id)
      const entries = ranking ? await rankingEntries(tx.db, ranking.id) : []
      const members = (await panelMembers(tx.db, panel.id)).map(({ personId }) => personId)
      const barred = await barredPairs(tx.db, call.id, members)
      const apart = new Set(
        barred.filter(({ proposalId }) => proposalId === proposal.id).map(({ personId }) => personId),
      )
      const why = whyNotOnTable({
        phase: desk.phase,
        hasRanking: ranking !== null,
        reviewNumber: proposal.reviewNumber,
        isSetAside: Boolean(entries.find((entry) => entry.proposal_id === proposal.id)?.set_aside_at),
        quorum: panel.quorum,
        voices: members.filter((id) => table.present.has(id) && !apart.has(id)).length,
      })
      if (why) throw refuse.closed(why)
    }
    await layOnTable(tx.db, panel.id, proposal?.id ?? null)
    await writeLogbook(tx, {
      action: proposal ? 'panel.discuss' : 'panel.end-discussion',
      subject: { kind: 'panel', id: panel.id },
      actingAs: 'chair',
      after: { reviewNumber: proposal?.reviewNumber ?? null },
    })
  })
}
