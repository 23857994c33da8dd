import { standingAwards, standingDecisions } from '@/db/queries/decisions'
import { panelTexts, withholdText } from '@/db/queries/panelTexts'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { visibleProposal } from '../panels/openPanel'
import { draftDecision } from './draftDecision'
import { openDecisions } from './openDecisions'
import { outcomeOf } from './rules'
import type { WithholdInput } from './schema'

/**
 * Keeps a reviewer's comment from the investigators, with the reason, or lets them read it again. It stays on the
 * review as it was written, and whoever had approved the decision is asked again.
 */
export function withholdComment(ctx: ActingContext, input: WithholdInput): Promise<void> {
  return inTransaction(ctx, async (tx) => {
    const { desk } = await openDecisions(tx, input.panelId)
    const proposal = visibleProposal(desk, input.proposalId)
    const comment = (await panelTexts(tx.db, [proposal.id])).find(
      (text) => text.assignmentId === input.assignmentId && text.audience === 'investigators',
    )
    if (!comment) throw refuse.notFound('comment')
    const standing = (await standingDecisions(tx.db, [proposal.id])).get(proposal.id)
    await draftDecision(tx, desk, proposal.id, standing?.version ?? 0, {
      outcome: outcomeOf(await standingAwards(tx.db, [proposal.id])),
    })
    const reason = input.withhold ? input.reason : null
    await withholdText(tx.db, comment.assignmentId, tx.actor.personId, reason)
    await writeLogbook(tx, {
      action: input.withhold ? 'decision.withhold' : 'decision.show',
      subject: { kind: 'assignment', id: comment.assignmentId },
      actingAs: 'chair',
      before: { withheld: comment.withheldReason !== null },
      after: { withheld: input.withhold, reason },
    })
  })
}
