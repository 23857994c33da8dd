import { lockCall } from '@/db/queries/decisions'
import { currentRanking } from '@/db/queries/rankings'
import type { RankingsRow } from '@/db/tables'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { openPanel, type PanelDesk } from '../panels/openPanel'
import { whyNotRanked } from '../panels/stages'

/** The panel, locked with its call, while decisions are being prepared. */
export async function openDecisions(
  tx: ActingContext,
  panelId: number,
): Promise<{ desk: PanelDesk; ranking: RankingsRow }> {
  const first = await openPanel(tx, { panelId, lock: true })
  await lockCall(tx.db, first.call.id)
  // Read again behind the lock: another panel's act may have moved the call on.
  const desk = await openPanel(tx, { panelId, lock: true })
  const ranking = await currentRanking(tx.db, desk.panel.id)
  const why = whyNotRanked(desk.phase, ranking !== null)
  if (why || !ranking) throw refuse.closed(why ?? 'Begin the ranking first.')
  return { desk, ranking }
}
