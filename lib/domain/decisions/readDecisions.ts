import { currentRanking } from '@/db/queries/rankings'
import type { ActingContext } from '../context'
import { openPanel } from '../panels/openPanel'
import { decisionRows } from './decisionRows'
import type { DecisionsView } from './decisionsView'
import { whyNotReleased } from './rules'

/** The decisions being prepared, or made known, as their reader may see them. */
export async function readDecisions(
  ctx: ActingContext,
  key: { callSlug: string; panelId?: number },
): Promise<DecisionsView> {
  const desk = await openPanel(ctx, key)
  const ranking = await currentRanking(ctx.db, desk.panel.id)
  const rows = await decisionRows(ctx, { ...desk, callId: desk.call.id, panelId: desk.panel.id, ranking })
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
      unapproved: rows.filter((row) => row.approval !== 'approved').length,
    }),
    isReleased: rows.length > 0 && rows.every((row) => row.releasedAt !== null),
  }
}
