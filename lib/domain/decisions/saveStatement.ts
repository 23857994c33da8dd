import { standingAwards } from '@/db/queries/decisions'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { visibleProposal } from '../panels/openPanel'
import { draftDecision } from './draftDecision'
import { openDecisions } from './openDecisions'
import { outcomeOf } from './rules'

/** Stores what the panel says to the investigators, from the discussion or from the decisions. */
export function saveStatement(
  ctx: ActingContext,
  input: { panelId: number; proposalId: number; version: number; statement: string },
): Promise<{ version: number }> {
  return inTransaction(ctx, async (tx) => {
    const { desk } = await openDecisions(tx, input.panelId)
    const proposal = visibleProposal(desk, input.proposalId)
    await draftDecision(tx, desk, proposal.id, input.version, {
      outcome: outcomeOf(await standingAwards(tx.db, [proposal.id])),
      statement: input.statement,
    })
    await writeLogbook(tx, {
      action: 'decision.statement',
      subject: { kind: 'proposal', id: proposal.reviewNumber },
      actingAs: 'chair',
      after: { characters: [...input.statement].length },
    })
    return { version: input.version + 1 }
  })
}
