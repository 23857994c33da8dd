import { changeDecision, insertDecision, standingDecisions } from '@/db/queries/decisions'
import type { DecisionsRow } from '@/db/tables'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import type { PanelDesk } from '../panels/openPanel'

/**
 * Changes the prepared decision of a proposal, or begins one. `version` is what was on screen (0: none): when it is not
 * what stands, someone was first.
 */
export async function draftDecision(
  tx: ActingContext,
  desk: PanelDesk,
  proposalId: number,
  version: number,
  change: Partial<Pick<DecisionsRow, 'outcome' | 'statement'>>,
): Promise<number> {
  const standing = (await standingDecisions(tx.db, [proposalId])).get(proposalId)
  if (standing?.released_at) throw refuse.closed('This decision has been made known; it stands.')
  const stale = () =>
    refuse.stale({
      changedBy: 'Someone else on the panel',
      changedAt: desk.now.toISOString(),
      version: standing?.version ?? 0,
      theirs: { statement: standing?.statement ?? '', outcome: standing?.outcome ?? 'declined' },
    })
  if ((standing?.version ?? 0) !== version) throw stale()
  if (!standing)
    return insertDecision(tx.db, {
      proposalId,
      outcome: change.outcome ?? 'declined',
      statement: change.statement ?? '',
      by: tx.actor.personId,
    })
  if (!(await changeDecision(tx.db, standing, change, tx.actor.personId))) throw stale()
  return standing.id
}
