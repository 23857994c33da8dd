import { panelTexts } from '@/db/queries/panelTexts'
import { standingAwards, standingDecisions } from '@/db/queries/decisions'
import { rankingEntries } from '@/db/queries/rankings'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import type { PanelKeyInput } from '../panels/schema'
import { visibleOrder } from '../rankings/order'
import { draftDecision } from './draftDecision'
import { openDecisions } from './openDecisions'
import { outcomeOf } from './rules'
import { statementFrom } from './statementFrom'

/** Prepares a decision for every proposal: the outcome its hours make, and a first statement where there is none yet. */
export function prepareDecisions(ctx: ActingContext, input: PanelKeyInput): Promise<{ prepared: number }> {
  return inTransaction(ctx, async (tx) => {
    const { desk, ranking } = await openDecisions(tx, input.panelId)
    const shown = new Set(desk.proposals.filter(({ state }) => state === 'under-review').map(({ id }) => id))
    const entries = await rankingEntries(tx.db, ranking.id)
    const order = visibleOrder(
      entries.map((entry) => entry.proposal_id),
      desk.hidden,
    ).filter((id) => shown.has(id))
    const [before, awards, texts] = await Promise.all([
      standingDecisions(tx.db, order),
      standingAwards(tx.db, order),
      panelTexts(tx.db, order),
    ])
    for (const proposalId of order) {
      const standing = before.get(proposalId)
      const comments = texts.filter(
        (text) =>
          text.proposalId === proposalId && text.audience === 'investigators' && text.withheldReason === null,
      )
      await draftDecision(tx, desk, proposalId, standing?.version ?? 0, {
        outcome: outcomeOf(awards.filter((line) => line.proposalId === proposalId)),
        statement: standing?.statement || statementFrom(comments.map(({ body }) => body)),
      })
    }
    await writeLogbook(tx, {
      action: 'decision.prepare',
      subject: { kind: 'panel', id: desk.panel.id },
      actingAs: 'chair',
      after: { prepared: order.length },
    })
    return { prepared: order.length }
  })
}
