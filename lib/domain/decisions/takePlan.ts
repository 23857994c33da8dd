import { standingAwards, standingDecisions, supersedeAwards } from '@/db/queries/decisions'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { giveLines } from './giveLines'
import { openDecisions } from './openDecisions'
import { planNights } from './planNights'
import { policyNames } from './nightsPolicySchema'
import type { PlanInput } from './schema'

/** Takes the suggestion over as the awards of every proposal of the list; what was given by hand before is superseded. */
export function takePlan(ctx: ActingContext, input: PlanInput): Promise<{ awarded: number }> {
  return inTransaction(ctx, async (tx) => {
    const { desk, ranking } = await openDecisions(tx, input.panelId)
    const { order, wanted, plan, policy } = await planNights(tx, desk, ranking, input.policy)
    const before = await standingDecisions(tx.db, order)
    const kept = await standingAwards(tx.db, order)
    // First free everything, so that one proposal's old award does not stand in another's way.
    for (const decision of before.values()) await supersedeAwards(tx.db, decision.id)
    for (const proposalId of order)
      await giveLines(tx, desk, wanted, {
        proposalId,
        version: before.get(proposalId)?.version ?? 0,
        lines: plan.given
          .filter((line) => line.proposal === proposalId)
          .map(({ instrument, seconds }) => {
            const old = kept.find(
              (line) => line.proposalId === proposalId && line.instrumentId === instrument,
            )
            return {
              instrumentId: instrument,
              seconds,
              isReserve: false,
              service: old?.service ?? 'queue',
              conditions: old?.conditions ?? '',
            }
          }),
      })
    await writeLogbook(tx, {
      action: 'decision.take-plan',
      subject: { kind: 'panel', id: desk.panel.id },
      actingAs: 'chair',
      after: {
        policy: policyNames[policy],
        given: plan.given.map(({ laid: _, ...line }) => line),
      },
    })
    return { awarded: new Set(plan.given.map((line) => line.proposal)).size }
  })
}
