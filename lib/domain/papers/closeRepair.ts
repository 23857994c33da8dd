import type { z } from 'zod'
import { repairsOf, takeBackRepair } from '@/db/queries/paperRepairs'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import { mayManageCalls } from '../calls/policy'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { lockContents } from '../submission/lockContents'
import type { takeBackRepairSchema } from './repairSchema'

/** Closes a paper the office opened, before anybody replaced it. */
export async function closeRepair(
  ctx: ActingContext,
  input: z.output<typeof takeBackRepairSchema>,
): Promise<void> {
  authorize(mayManageCalls(ctx.actor))
  await inTransaction(ctx, async (tx) => {
    const { row, contents } = await lockContents(tx, input.reference)
    const repair = (await repairsOf(tx.db, row.id)).find(({ id }) => id === input.repairId)
    if (!repair) throw refuse.notFound('paper to repair')
    if (!(await takeBackRepair(tx.db, repair.id)))
      throw refuse.closed('It has been replaced or closed already. Load the page again.')
    await writeLogbook(tx, {
      action: 'papers.close-repair',
      subject: { kind: 'proposal', id: contents.reference },
      actingAs: 'office',
      before: { kind: repair.kind, reason: repair.reason, openUntil: repair.openUntil },
    })
  })
}
