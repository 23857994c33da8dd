import { panelMembers, type PanelMember } from '@/db/queries/panel'
import { refuse } from '@/lib/errors'
import { barredPairs } from '../conflicts/barredPairs'
import type { ActingContext } from '../context'
import { visibleProposal, type PanelDesk } from '../panels/openPanel'
import { whyNotAssigned } from './rules'

/** Refuses the first pair that may not be made, with its reason at `field(index)`. Gives the panel's members. */
export async function demandPairs(
  tx: ActingContext,
  desk: PanelDesk,
  pairs: readonly { proposalId: number; personId: number }[],
  field: (index: number) => string,
): Promise<PanelMember[]> {
  const members = await panelMembers(tx.db, desk.panel.id)
  const people = [...new Set(pairs.map((pair) => pair.personId))]
  const barred = await barredPairs(tx.db, desk.call.id, people)
  for (const [index, pair] of pairs.entries()) {
    const proposal = visibleProposal(desk, pair.proposalId)
    const why = whyNotAssigned({
      phase: desk.phase,
      state: proposal.state,
      reviewNumber: proposal.reviewNumber,
      reviewer: members.find(({ personId }) => personId === pair.personId) ?? null,
      interest:
        barred.find(
          ({ personId, proposalId }) => personId === pair.personId && proposalId === pair.proposalId,
        ) ?? null,
    })
    if (why) throw refuse.field(field(index), why)
  }
  return members
}
