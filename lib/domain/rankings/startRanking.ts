import { moveStage, panelAssignments } from '@/db/queries/assignments'
import { panelProposals, requestLines } from '@/db/queries/panel'
import { allPanelsRanked, currentRanking, insertRanking } from '@/db/queries/rankings'
import { refuse } from '@/lib/errors'
import { lineByHours } from '@/lib/panel/nights/lineByHours'
import { rawScores } from '@/lib/panel/statistics'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { openPanel } from '../panels/openPanel'
import type { PanelKeyInput } from '../panels/schema'
import { whyNotStartRanking } from '../panels/stages'
import { panelOffer } from '../sharing/panelOffer'
import { panelScores } from './panelScores'

/**
 * Begins a panel's ranking: all its proposals by raw mean, those without a review last, the line where its hours end.
 * The call goes on to its ranking stage when every panel has begun.
 */
export function startRanking(ctx: ActingContext, input: PanelKeyInput): Promise<void> {
  return inTransaction(ctx, async (tx) => {
    const desk = await openPanel(tx, { panelId: input.panelId, lock: true })
    const standing = await panelAssignments(tx.db, desk.panel.id)
    const why = whyNotStartRanking(
      desk.phase,
      (await currentRanking(tx.db, desk.panel.id)) !== null,
      standing.filter((a) => a.finishedAt).length,
    )
    if (why) throw refuse.closed(why)
    const scores = await panelScores(tx, desk.call.id, standing)
    const raw = rawScores(scores)
    const all = (await panelProposals(tx.db, desk.panel.id)).filter(({ state }) => state === 'under-review')
    const means = new Map(raw.map((one) => [one.proposal, one.mean]))
    const order = all.map(({ id }) => id).sort((a, b) => (means.get(b) ?? -1) - (means.get(a) ?? -1) || a - b)
    const asked = await requestLines(tx.db, order)
    const line = lineByHours(
      order.map((id) =>
        asked
          .filter((one) => one.proposalId === id)
          .map((one) => ({
            proposal: id,
            instrument: one.instrumentId,
            telescope: one.telescopeId,
            seconds: one.askedSeconds,
            least: one.askedSeconds,
            possible: true,
          })),
      ),
      await panelOffer(tx.db, desk.call.id, desk.panel.id),
    )
    await insertRanking(tx.db, {
      panelId: desk.panel.id,
      entries: order.map((id) => ({ proposalId: id, rawMean: means.get(id) ?? null, setAsideAt: null })),
      lineAfter: line,
      madeBy: tx.actor.personId,
    })
    if (await allPanelsRanked(tx.db, desk.call.id)) await moveStage(tx.db, desk.call.id, 'review', 'ranking')
    await writeLogbook(tx, {
      action: 'ranking.begin',
      subject: { kind: 'panel', id: desk.panel.id },
      actingAs: 'chair',
      after: { proposals: order.length, scores: scores.length, lineAfter: line },
    })
  })
}
