import { changeMerged, insertMergeMove, writeMergedPlaces } from '@/db/queries/mergedLists'
import { refuse } from '@/lib/errors'
import { moveBetween } from '@/lib/panel/sharing/moveBetween'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { changeable, openMerged, staleMerged } from './openMerged'
import { whyNotMoved } from './rules'
import type { MergeMoveInput } from './schema'

/** Moves a proposal near the lines to another place, as the meeting of the panels decided; the reason is kept. */
export function moveInMerged(ctx: ActingContext, input: MergeMoveInput): Promise<void> {
  return inTransaction(ctx, async (tx) => {
    const open = await openMerged(tx, input)
    const { hidden } = open.desk
    const facts = new Map(
      open.lists.flatMap(({ panelId, proposals }) =>
        proposals.map(({ id, reviewNumber }) => [id, { panelId, reviewNumber }] as const),
      ),
    )
    const panelOf = (id: number) => facts.get(id)?.panelId ?? 0
    const shown = open.entries
      .filter((entry) => !hidden.has(entry.proposal_id))
      .map((entry) => ({
        id: entry.proposal_id,
        panelId: panelOf(entry.proposal_id),
        reviewNumber: facts.get(entry.proposal_id)?.reviewNumber ?? '',
        isNear: Boolean(entry.is_near),
      }))
    const from = shown.findIndex(({ id }) => id === input.proposalId) + 1
    if (from === 0) throw refuse.notFound('proposal')
    const why = whyNotMoved(shown, from, input.place)
    if (why) throw refuse.field('place', why)
    const order = open.entries.map((entry) => entry.proposal_id)
    const next = moveBetween(order, panelOf, input.proposalId, shown[input.place - 1]?.id ?? 0)
    const list = await changeable(tx, open)
    if (!(await changeMerged(tx.db, list))) throw await staleMerged(tx, list)
    await writeMergedPlaces(tx.db, list.id, next)
    const places = { from: order.indexOf(input.proposalId) + 1, to: next.indexOf(input.proposalId) + 1 }
    await insertMergeMove(tx.db, {
      ...{ listId: list.id, proposalId: input.proposalId, reason: input.reason },
      ...places,
      by: tx.actor.personId,
    })
    await writeLogbook(tx, {
      action: 'panels.move',
      subject: { kind: 'proposal', id: shown[from - 1]?.reviewNumber ?? '' },
      actingAs: 'chair',
      before: { place: places.from },
      after: { place: places.to, reason: input.reason },
    })
  })
}
