import { approveDecision, openedAsTheyStand } from '@/db/queries/approvals'
import { standingDecisions } from '@/db/queries/decisions'
import { databaseNow } from '@/db/queries/clock'
import { refuse } from '@/lib/errors'
import { formatList } from '@/lib/format'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { approvableOf } from './approvableOf'
import { whyNotApproved } from './approval'
import { openForApproval } from './openForApproval'
import type { ApproveInput } from './schema'

/**
 * A second person stands behind prepared decisions, each at the version they have opened. Refused to whoever changed one
 * last; when one of them changed meanwhile, or was never opened, none is approved.
 */
export function approveDecisions(ctx: ActingContext, input: ApproveInput): Promise<{ approved: number }> {
  return inTransaction(ctx, async (tx) => {
    const desk = await openForApproval(tx, input.panelId)
    const decisions = await standingDecisions(
      tx.db,
      input.decisions.map(({ proposalId }) => proposalId),
    )
    const opened = await openedAsTheyStand(
      tx.db,
      [...decisions.values()].map(({ id }) => id),
      tx.actor.personId,
    )
    const numbers: string[] = []
    const unopened: string[] = []
    for (const { proposalId, version } of input.decisions) {
      const proposal = desk.proposals.find(({ id }) => id === proposalId)
      if (!proposal) throw refuse.notFound('proposal')
      const decision = decisions.get(proposalId)
      if (!decision) throw refuse.closed(`${proposal.reviewNumber} is not prepared yet.`)
      const why = whyNotApproved(approvableOf(decision), tx.actor.personId)
      if (why) throw refuse.closed(`${proposal.reviewNumber}: ${why}`)
      if (decision.version === version && !opened.has(decision.id)) {
        unopened.push(proposal.reviewNumber)
        continue
      }
      if (decision.version !== version || !(await approveDecision(tx.db, decision, tx.actor.personId)))
        throw refuse.stale({
          changedBy: 'Someone else on the panel',
          changedAt: (await databaseNow(tx.db)).toISOString(),
          version: decision.version,
          theirs: { statement: decision.statement, outcome: decision.outcome },
        })
      numbers.push(proposal.reviewNumber)
    }
    if (unopened.length > 0)
      throw refuse.closed(
        `You have not opened ${formatList(unopened)} as ${unopened.length === 1 ? 'it stands' : 'they stand'}. Nothing was approved; read what is left first.`,
      )
    await writeLogbook(tx, {
      action: 'decision.approve',
      subject: { kind: 'panel', id: desk.panelId },
      actingAs: desk.actingAs,
      after: { reviewNumbers: numbers },
    })
    return { approved: numbers.length }
  })
}
