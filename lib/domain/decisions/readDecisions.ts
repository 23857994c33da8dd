import { standingAwards, standingDecisions } from '@/db/queries/decisions'
import { currentRanking, rankingEntries } from '@/db/queries/rankings'
import { snapshotHeads } from '@/db/queries/snapshotHeads'
import type { ActingContext } from '../context'
import { openPanel } from '../panels/openPanel'
import { visibleLine, visibleOrder } from '../rankings/order'
import type { DecisionRow, DecisionsView } from './decisionsView'
import { outcomeOf, whyNotReleased } from './rules'

/** The decisions being prepared, or made known, as their reader may see them. */
export async function readDecisions(
  ctx: ActingContext,
  key: { callSlug: string; panelId?: number },
): Promise<DecisionsView> {
  const desk = await openPanel(ctx, key)
  const ranking = await currentRanking(ctx.db, desk.panel.id)
  const entries = ranking ? await rankingEntries(ctx.db, ranking.id) : []
  const full = entries.map((entry) => entry.proposal_id)
  const shown = new Set(desk.proposals.map(({ id }) => id))
  const order = visibleOrder(full, desk.hidden).filter((id) => shown.has(id))
  const line = visibleLine(full, desk.hidden, ranking?.line_after ?? 0)
  const [heads, decisions, awards] = await Promise.all([
    snapshotHeads(ctx.db, order),
    standingDecisions(ctx.db, order),
    standingAwards(ctx.db, order),
  ])
  const rows = order.map((id, index): DecisionRow => {
    const decision = decisions.get(id)
    const lines = awards.filter((award) => award.proposalId === id)
    return {
      proposalId: id,
      reviewNumber: desk.proposals.find((proposal) => proposal.id === id)?.reviewNumber ?? '',
      title: heads.get(id)?.title ?? '',
      rank: index + 1,
      isAbove: index < line,
      outcome: decision?.released_at ? decision.outcome : outcomeOf(lines),
      lines,
      askedSeconds: heads.get(id)?.askedSeconds ?? 0,
      statement: decision?.statement ?? '',
      version: decision?.version ?? 0,
      isPrepared: Boolean(decision?.statement.trim()),
      releasedAt: decision?.released_at?.toISOString() ?? null,
    }
  })
  const undecided = desk.proposals.filter(({ state }) => state === 'under-review').length
  return {
    panelId: desk.panel.id,
    callNumber: desk.call.number,
    callSlug: desk.call.slug,
    phase: desk.phase,
    lettersAt: desk.call.lettersAt.toISOString(),
    hasRanking: ranking !== null,
    isFrozen: Boolean(ranking?.frozen_at),
    rows,
    whyNot: whyNotReleased({
      phase: desk.phase,
      isFrozen: Boolean(ranking?.frozen_at),
      undecided,
      unready: rows.filter((row) => !row.isPrepared).length,
    }),
    isReleased: rows.length > 0 && rows.every((row) => row.releasedAt !== null),
  }
}
