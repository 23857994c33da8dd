import { changeRanking, currentRanking } from '@/db/queries/rankings'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { openPanel } from '../panels/openPanel'
import { whyNotRanked } from '../panels/stages'
import { staleList } from './openList'
import type { ListKeyInput } from './schema'

/** Freezes the list as it stands. A later change makes a new version beside it. */
export function freezeRanking(ctx: ActingContext, input: ListKeyInput): Promise<void> {
  return inTransaction(ctx, async (tx) => {
    const desk = await openPanel(tx, { panelId: input.panelId, lock: true })
    const ranking = await currentRanking(tx.db, desk.panel.id)
    const why = whyNotRanked(desk.phase, ranking !== null)
    if (why || !ranking) throw refuse.closed(why ?? 'Begin the ranking first.')
    if (ranking.frozen_at) throw refuse.closed('This version is frozen already.')
    const isCurrent = ranking.id === input.rankingId && ranking.version === input.version
    if (!isCurrent || !(await changeRanking(tx.db, ranking, { freeze: true }))) throw staleList(desk, ranking)
    await writeLogbook(tx, {
      action: 'ranking.freeze',
      subject: { kind: 'ranking', id: ranking.id },
      actingAs: 'chair',
      after: { rankingVersion: ranking.ranking_version, lineAfter: ranking.line_after },
    })
  })
}
