import { constraintSetsOf, insertObservation } from '@/db/queries/observations'
import { touchProposal } from '@/db/queries/proposals'
import { insertTarget, removedTarget, targetsOf } from '@/db/queries/targets'
import { refuse } from '@/lib/errors'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { openForEditing } from '../proposals/openProposal'
import type { RemoveTargetInput } from './removeTarget'
import { requireFreeName, requireRoom } from './targetRules'

/** Puts a target back that was taken out, with its observations, as the logbook remembers them. */
export async function restoreTarget(ctx: Context, input: RemoveTargetInput): Promise<{ id: number }> {
  return inTransaction(ctx, async (tx) => {
    const { row } = await openForEditing(tx, input.reference)
    const removed = await removedTarget(tx.db, input.reference, input.id)
    if (!removed) throw refuse.notFound('target')
    const present = await targetsOf(tx.db, row.id)
    requireRoom(present.length, 1)
    requireFreeName(present, removed.target.name, null)
    const id = await insertTarget(tx.db, row.id, removed.target)
    const sets = await constraintSetsOf(tx.db, row.id)
    for (const observation of removed.observations) {
      const set = sets.find((one) => one.id === observation.constraintSetId) ?? sets[0]
      if (!set) throw refuse.integrity('The conditions of its observations are gone.')
      await insertObservation(tx.db, row.id, { ...observation, targetId: id, constraintSetId: set.id })
    }
    await touchProposal(tx.db, row.id)
    await writeLogbook(tx, {
      action: 'target.restore',
      subject: { kind: 'proposal', id: input.reference },
      actingAs: 'investigator',
      after: { targetId: id, ...removed },
    })
    return { id }
  })
}
