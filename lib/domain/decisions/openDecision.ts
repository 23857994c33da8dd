import { recordOpening } from '@/db/queries/approvals'
import { databaseNow } from '@/db/queries/clock'
import { standingDecisions } from '@/db/queries/decisions'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { openForApproval } from './openForApproval'
import type { OpenInput } from './schema'

/**
 * Keeps that a second person has a decision before them, at the version on their screen: what was not opened cannot be
 * approved. Kept by the opening itself, so no row of the logbook is written.
 */
export function openDecision(ctx: ActingContext, input: OpenInput): Promise<void> {
  return inTransaction(ctx, async (tx) => {
    const desk = await openForApproval(tx, input.panelId)
    if (!desk.proposals.some(({ id }) => id === input.proposalId)) throw refuse.notFound('proposal')
    const decision = (await standingDecisions(tx.db, [input.proposalId])).get(input.proposalId)
    if (!decision) throw refuse.notFound('decision')
    if (decision.version !== input.version)
      throw refuse.stale({
        changedBy: 'Someone else on the panel',
        changedAt: (await databaseNow(tx.db)).toISOString(),
        version: decision.version,
        theirs: { statement: decision.statement, outcome: decision.outcome },
      })
    await recordOpening(tx.db, decision, tx.actor.personId)
  })
}
