import { currentMerged, insertMerged, mergedEntries } from '@/db/queries/mergedLists'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import { nearLines } from '@/lib/panel/sharing/nearLines'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { isStale } from './isStale'
import { openCallPanels } from './openCallPanels'
import { orderByRule } from './orderByRule'
import { panelLists } from './panelLists'
import { maySitAtMerge } from './policy'
import { whyNotTogether } from './rules'
import type { BringTogetherInput } from './schema'
import { sharedTime } from './sharedTime'

/** Begins the meeting of the panels: their frozen lists as one, in the order the rule gives, to be ordered near the lines. */
export function bringTogether(ctx: ActingContext, input: BringTogetherInput): Promise<void> {
  return inTransaction(ctx, async (tx) => {
    const { call, phase, panels, led } = await openCallPanels(tx, input)
    authorize(maySitAtMerge(led.length > 0))
    const lists = await panelLists(tx.db, panels)
    const why = whyNotTogether(
      phase,
      lists.map(({ name, list, proposals }) => ({ name, list, proposals: proposals.length })),
    )
    if (why) throw refuse.closed(why)
    const standing = await currentMerged(tx.db, call.id)
    if (standing && !isStale(await mergedEntries(tx.db, standing.id), lists))
      throw refuse.closed('The lists are brought together already.')
    const { shares, rule } = await sharedTime(tx.db, call.id, lists)
    const merged = orderByRule(lists, shares)
    const near = nearLines(merged)
    const rankingOf = new Map(lists.map(({ panelId, rankingId }) => [panelId, rankingId]))
    await insertMerged(tx.db, {
      callId: call.id,
      entries: merged.map(({ proposal, panel, used }, index) => ({
        proposalId: proposal,
        rankingId: rankingOf.get(panel) ?? 0,
        usedShare: Number.isFinite(used) ? used : null,
        isNear: near[index] ?? false,
      })),
      madeBy: tx.actor.personId,
    })
    await writeLogbook(tx, {
      action: 'panels.bring-together',
      subject: { kind: 'call', id: call.number },
      actingAs: 'chair',
      after: {
        rule,
        lists: lists.flatMap(({ name, listVersion, order }) =>
          order.length > 0 ? [{ panel: name, version: listVersion }] : [],
        ),
      },
    })
  })
}
