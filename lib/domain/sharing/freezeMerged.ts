import { changeMerged } from '@/db/queries/mergedLists'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { openMerged, staleMerged } from './openMerged'
import type { MergedKeyInput } from './schema'

/** Freezes the order of all panels as it stands: the nights follow it. A later move makes a new version beside it. */
export function freezeMerged(ctx: ActingContext, input: MergedKeyInput): Promise<void> {
  return inTransaction(ctx, async (tx) => {
    const { desk, list } = await openMerged(tx, input)
    if (list.frozen_at) throw refuse.closed('This version is frozen already.')
    if (!(await changeMerged(tx.db, list, { freeze: true }))) throw await staleMerged(tx, list)
    await writeLogbook(tx, {
      action: 'panels.freeze',
      subject: { kind: 'call', id: desk.call.number },
      actingAs: 'chair',
      after: { listVersion: list.list_version },
    })
  })
}
