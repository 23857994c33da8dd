import { moveStage } from '@/db/queries/assignments'
import {
  correspondents,
  decideProposal,
  lockUndecided,
  releaseDecision,
  standingAwards,
  standingDecisions,
  undecidedIn,
} from '@/db/queries/decisions'
import { standingHalves } from '@/db/queries/visits'
import { snapshotHeads } from '@/db/queries/snapshotHeads'
import { refuse } from '@/lib/errors'
import { paths } from '@/lib/paths'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { decisionLetter } from '../outbox/letters/decision'
import { queueLetter } from '../outbox/queueLetter'
import { withEvenings } from '../visits/withEvenings'
import { approvableOf } from './approvableOf'
import { isApproved } from './approval'
import { moveTimeFor } from './moveTimeFor'
import { openDecisions } from './openDecisions'
import { outcomeOf, whyNotReleased } from './rules'
import type { ReleaseInput } from './schema'

/**
 * Makes the decisions of a panel known, all at once and once only: states, ledger and one letter to each investigator
 * in one transaction. Each was approved, as it stands, by someone who did not change it last. Decisions prepared by
 * the deputy go with the chair's, unseen.
 */
export function releaseDecisions(ctx: ActingContext, input: ReleaseInput): Promise<{ released: number }> {
  return inTransaction(ctx, async (tx) => {
    const { desk, ranking } = await openDecisions(tx, input.panelId)
    if (input.typed !== String(desk.call.number))
      throw refuse.field('typed', `Type the number of the call, ${desk.call.number}, to confirm.`)
    const waiting = await lockUndecided(tx.db, desk.panel.id)
    const ids = waiting.map(({ proposalId }) => proposalId)
    const decisions = await standingDecisions(tx.db, ids)
    const why = whyNotReleased({
      phase: desk.phase,
      isFrozen: ranking.frozen_at !== null,
      undecided: waiting.length,
      unready: ids.filter((id) => !decisions.get(id)?.statement.trim()).length,
      unapproved: ids.filter((id) => {
        const decision = decisions.get(id)
        return !decision || !isApproved(approvableOf(decision))
      }).length,
    })
    if (why) throw refuse.closed(why)
    const awards = withEvenings(await standingAwards(tx.db, ids), await standingHalves(tx.db, desk.call.id))
    const heads = await snapshotHeads(tx.db, ids)
    for (const proposal of waiting) {
      const decision = decisions.get(proposal.proposalId)
      const lines = awards.filter((line) => line.proposalId === proposal.proposalId)
      const outcome = outcomeOf(lines)
      if (!decision || decision.outcome !== outcome)
        throw refuse.closed('Hours were changed after a decision was prepared. Prepare the decisions again.')
      if (!(await releaseDecision(tx.db, decision.id)))
        throw refuse.closed('These decisions are made known already.')
      if (!(await decideProposal(tx.db, proposal.proposalId, outcome)))
        throw new Error('a locked proposal changed its state')
      await moveTimeFor(tx, proposal.proposalId, lines)
      for (const person of await correspondents(tx.db, proposal.proposalId))
        await queueLetter(
          tx,
          person,
          decisionLetter(
            person,
            {
              reference: proposal.reference,
              title: heads.get(proposal.proposalId)?.title ?? '',
              callNumber: desk.call.number,
              outcome,
              lines,
            },
            tx.request.origin + paths.proposalOutcome(proposal.reference),
          ),
          `decision:${proposal.proposalId}:${decision.decision_version}`,
        )
    }
    if ((await undecidedIn(tx.db, desk.call.id)) === 0)
      await moveStage(tx.db, desk.call.id, 'ranking', 'decided')
    await writeLogbook(tx, {
      action: 'decision.release',
      subject: { kind: 'panel', id: desk.panel.id },
      actingAs: 'chair',
      after: { decisions: ids.map((id) => ({ proposalId: id, outcome: decisions.get(id)?.outcome })) },
    })
    return { released: ids.filter((id) => !desk.hidden.has(id)).length }
  })
}
